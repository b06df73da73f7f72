/** A key of the keyboard, as it stands on it. */
export function KeyCap({ children }: { readonly children: string }) {
  return (
    <kbd className="rounded border border-b-2 border-rule bg-paper-raised px-1 py-0.5 font-sans text-micro leading-none font-medium text-ink-2">
      {children}
    </kbd>
  );
}
