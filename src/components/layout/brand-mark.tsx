/** The mark: a groundsill under its posts, and the trough under both. */
export function BrandMark({ className }: { readonly className?: string }) {
  return (
    <svg width="26" height="20" viewBox="0 0 26 20" aria-hidden="true" className={className}>
      <path d="M1 6.5H25" className="stroke-ink" strokeWidth="3" />
      <path d="M5 6V1M13 6V1M21 6V1" className="stroke-ink" strokeWidth="1.4" />
      <path
        d="M1 10.5C7 10.5 8.5 18 13 18S19 10.5 25 10.5"
        className="fill-none stroke-clay"
        strokeWidth="1.8"
      />
    </svg>
  );
}
