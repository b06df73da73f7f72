/** Tells that a button opens something under it. */
export function Chevron() {
  return (
    <svg width="9" height="6" aria-hidden="true" className="flex-none text-ink-3">
      <path d="M1 1l3.5 3.5L8 1" className="fill-none stroke-current" strokeWidth="1.3" />
    </svg>
  );
}
