import type { Range } from '../../../../shared/numerics/range.ts';
import { millimetres } from '../section-words.ts';

/** What the inked line and the band stand for, with the largest settlement of each. */
export function BracketLegend({ largest }: { readonly largest: Range }) {
  const { low, central, high } = largest;
  return (
    <>
      <span className="flex items-center gap-1.5">
        <svg width="22" height="10" aria-hidden="true">
          <path d="M0 5h22" className="stroke-ink" strokeWidth="1.8" />
        </svg>
        central {millimetres(central)} mm
      </span>
      {low !== high && (
        <span className="flex items-center gap-1.5">
          <svg width="22" height="12" aria-hidden="true">
            <path d="M0 1h22v10h-22z" className="fill-band opacity-75" />
            <path d="M0 1h22" className="stroke-band-line" strokeDasharray="1 3" />
            <path d="M0 11h22" className="stroke-band-line" strokeDasharray="5 3" />
          </svg>
          {millimetres(low)} to {millimetres(high)} mm
        </span>
      )}
    </>
  );
}
