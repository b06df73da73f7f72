import type { SectionAcross } from '../../../../shared/assessment/sections-of-design.ts';
import type { AcrossLayout } from '../across-layout.ts';
import { metres } from '../section-words.ts';

type BoresAcrossProps = {
  readonly layout: AcrossLayout;
  readonly bores: SectionAcross['bores'];
};

/** About so wide is a letter, in pixels. */
const LETTER = 6;

/** The bores of a section at their true size and level, each under its axis. */
export function BoresAcross({ layout, bores }: BoresAcrossProps) {
  const { x, y, ground, pixelsPerMetre, frame } = layout;
  return bores.map(({ name, offset, axis, diameter }) => {
    const [cx, cy, r] = [x(offset), y(axis), (diameter / 2) * pixelsPerMetre];
    const isLeft = offset > 0;
    const room = (isLeft ? cx - frame.left : frame.right - cx) - r - 6;
    const words = `${name}, axis ${metres(axis, 1)} m`;
    return (
      <g key={name}>
        <path
          d={`M${cx} ${ground}V${cy - r}`}
          className="stroke-ink-3"
          strokeDasharray="8 2.2 1.4 2.2"
        />
        <circle cx={cx} cy={cy} r={r} className="fill-sheet stroke-ink" strokeWidth="1.5" />
        <path d={`M${cx - r} ${cy}h${2 * r}M${cx} ${cy - r}v${2 * r}`} className="stroke-ink-3" />
        <text
          x={cx + (isLeft ? -r - 6 : r + 6)}
          y={cy + 3.5}
          textAnchor={isLeft ? 'end' : 'start'}
          className="fill-ink text-cap"
        >
          {words.length * LETTER > room ? name : words}
        </text>
      </g>
    );
  });
}
