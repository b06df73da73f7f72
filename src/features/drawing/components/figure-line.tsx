/** A figure of what is drawn beside its name. */
export function FigureLine({ label, value }: { readonly label: string; readonly value: string }) {
  return (
    <div className="flex min-h-row items-baseline justify-between gap-2 border-b border-hairline py-1 text-small">
      <dt className="min-w-0 break-words text-ink-2">{label}</dt>
      <dd className="flex-none">{value}</dd>
    </div>
  );
}
