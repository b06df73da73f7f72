import { CATEGORIES } from '../../../../shared/damage/categories.ts';
import type { Range } from '../../../../shared/numerics/range.ts';
import { linearScale } from '../../../../shared/presentation/linear-scale.ts';
import { useWidth } from '../../../hooks/use-width.ts';
import { percentWords } from '../../../../shared/presentation/bracket-words.ts';

type RangeBarProps = {
  readonly strain: Range;
  /** The strain at the right end, the same for all bars of a column. */
  readonly upTo?: number;
};

const HEIGHT = 34;
const ON_PAPER = 340;
const LEAST_SCALE = 0.002;

/** The strain from low to high with its central value, among the limits of the categories. */
export function RangeBar({ strain, upTo }: RangeBarProps) {
  const { width, frame } = useWidth(250, ON_PAPER);
  const { low, central, high } = strain;
  const most = upTo ?? Math.max(LEAST_SCALE, high * 1.1);
  const across = linearScale([0, most], [1, width - 1]);
  const limits = CATEGORIES.filter(
    ({ limitingStrain }) => limitingStrain > 0 && limitingStrain < most,
  );
  const words = `Strain ${percentWords(low, 3)} to ${percentWords(high, 3)}, central ${percentWords(central, 3)}`;
  return (
    <div ref={frame} className="print:max-w-[340px]">
      <svg
        viewBox={`0 0 ${width} ${HEIGHT}`}
        width="100%"
        role="img"
        aria-label={words}
        className="block"
      >
        <path d={`M0 11H${width}`} className="stroke-rule" />
        {limits.map(({ category, label, limitingStrain }) => (
          <g key={category}>
            <path d={`M${across(limitingStrain)} 3v17`} className="stroke-ink-3" />
            <text
              x={across(limitingStrain)}
              y="31"
              textAnchor="middle"
              className="fill-ink-2 text-micro"
            >
              {label}
            </text>
          </g>
        ))}
        <rect
          x={across(low)}
          y="6"
          width={Math.max(1, across(high) - across(low))}
          height="10"
          className="fill-band stroke-band-line"
        />
        <path d={`M${across(central)} 3v16`} className="stroke-ink" strokeWidth="3" />
      </svg>
    </div>
  );
}
