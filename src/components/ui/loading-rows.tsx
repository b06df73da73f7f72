/** Hairlines where rows will stand; who waits for more than a second is told so. */
export function LoadingRows({ what, rows = 5 }: { readonly what: string; readonly rows?: number }) {
  return (
    <div>
      <p role="status" className="appear-late h-row text-small leading-[30px] text-ink-3">
        Fetching {what}.
      </p>
      {Array.from({ length: rows }, (_, index) => (
        <div key={index} className="h-row border-b border-hairline first-of-type:border-t" />
      ))}
    </div>
  );
}
