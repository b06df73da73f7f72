import type { Scale } from '../../../shared/presentation/linear-scale.ts';

type AxisProps = {
  readonly scale: Scale;
  readonly ticks: readonly number[];
  /** Where the axis stands: from the top for one that lies, from the left for one that stands. */
  readonly at: number;
  readonly words?: (tick: number) => string;
};

function plain(tick: number): string {
  return String(tick).replace('-', '\u2212');
}

const TICK_TEXT = 'fill-ink-2 text-micro';

/** The ticks under a drawing. */
export function BottomAxis({ scale, ticks, at, words = plain }: AxisProps) {
  return ticks.map((tick) => (
    <g key={tick}>
      <path d={`M${scale(tick)} ${at}v4`} className="stroke-ink" />
      <text x={scale(tick)} y={at + 15} textAnchor="middle" className={TICK_TEXT}>
        {words(tick)}
      </text>
    </g>
  ));
}

/** The ticks at the left of a drawing, with hairlines across it where a width is given. */
export function LeftAxis({
  scale,
  ticks,
  at,
  words = plain,
  across = 0,
}: AxisProps & { readonly across?: number }) {
  return ticks.map((tick) => (
    <g key={tick}>
      <path
        d={`M${at} ${scale(tick)}h${across === 0 ? -4 : across}`}
        className={across === 0 ? 'stroke-ink' : 'stroke-hairline'}
      />
      <text x={at - 7} y={scale(tick) + 3.5} textAnchor="end" className={TICK_TEXT}>
        {words(tick)}
      </text>
    </g>
  ));
}
