const CHAIN = '8 2.2 1.4 2.2';

/** What the lines of a designed line and its settlement stand for. */
export function LineLegend() {
  return (
    <ul className="flex flex-wrap gap-x-4 gap-y-0.5 border-t border-hairline pt-1.5 text-cap text-ink-2 max-md:hidden">
      <li className="flex items-center gap-1.5">
        <svg width="26" height="8" aria-hidden="true">
          <path d="M0 4h26" className="stroke-band-line" />
        </svg>
        Settlement, mm
      </li>
      <li className="flex items-center gap-1.5">
        <svg width="26" height="8" aria-hidden="true">
          <path d="M0 4h26" className="stroke-band-line" strokeDasharray="5 3" />
        </svg>
        1 mm
      </li>
      <li className="flex items-center gap-1.5">
        <svg width="26" height="10" aria-hidden="true">
          <path d="M0 1h26M0 9h26" className="stroke-ink" strokeDasharray="1 2" />
          <path d="M0 5h26" className="stroke-ink" strokeWidth="1.5" strokeDasharray={CHAIN} />
        </svg>
        Drive and its edges
      </li>
    </ul>
  );
}
