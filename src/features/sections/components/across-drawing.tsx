import { useId } from 'react';
import type { SectionAcross } from '../../../../shared/assessment/sections-of-design.ts';
import { BottomAxis, LeftAxis } from '../../../components/chart/axis.tsx';
import { BracketLines } from '../../../components/chart/bracket-lines.tsx';
import { niceTicks } from '../../../../shared/presentation/nice-ticks.ts';
import { figure } from '../../../../shared/presentation/design-words.ts';
import type { AcrossLayout } from '../across-layout.ts';
import type { ShownBuilding } from '../shown-categories.ts';
import { BoresAcross } from './bores-across.tsx';
import { StandingBuildings } from './standing-buildings.tsx';

type AcrossDrawingProps = {
  readonly section: SectionAcross;
  readonly layout: AcrossLayout;
  readonly buildings: readonly ShownBuilding[];
  readonly selected: number | null;
  /** How many times as large settlement is drawn. */
  readonly factor: number;
  /** The largest settlement that is drawn, in m. */
  readonly most: number;
  readonly label: string;
};

const MILLIMETRES = 1000;
/** About so far apart are ticks, in pixels. */
const APART = { offsets: 90, levels: 30, settlement: 14 };

function signed(value: number): string {
  return value > 0 ? `+${figure(value, 1)}` : figure(value, 1);
}

/** Offsets below, levels at the right, settlement at the left. */
function Scales({ layout, factor, most, section }: Omit<AcrossDrawingProps, 'label'>) {
  const { frame, x, y, ground, halfWidth, pixelsPerMetre } = layout;
  const { left, right, top, bottom } = frame;
  const perMillimetre = (factor * pixelsPerMetre) / MILLIMETRES;
  const deepest = most * MILLIMETRES;
  const settlements = niceTicks(
    0,
    deepest,
    Math.max(1, (deepest * perMillimetre) / APART.settlement),
  );
  const lowest = section.groundLevel - (bottom - ground) / pixelsPerMetre;
  const highest = section.groundLevel + (ground - top) / pixelsPerMetre;
  const levels = niceTicks(lowest, highest, (bottom - top) / APART.levels);
  const unit = 'fill-ink-2 text-micro';
  return (
    <>
      <LeftAxis
        scale={(mm) => ground + mm * perMillimetre}
        ticks={settlements}
        at={left}
        across={right - left}
        words={(mm) => (mm === 0 ? '0 mm' : String(mm))}
      />
      {levels.map((level) => (
        <g key={level}>
          <path d={`M${right} ${y(level)}h4`} className="stroke-ink" />
          <text x={right + 7} y={y(level) + 3.5} className={unit}>
            {signed(level)}
            {level === levels.at(-1) && ' m'}
          </text>
        </g>
      ))}
      <path d={`M${left} ${bottom}H${right}V${top}`} className="fill-none stroke-ink" />
      <BottomAxis
        scale={x}
        ticks={niceTicks(-halfWidth, halfWidth, (right - left) / APART.offsets)}
        at={bottom}
        words={(offset) => (offset === 0 ? '0 m' : signed(offset))}
      />
      <text x={left + 4} y={top + 9} className="fill-ink-3 text-micro">
        looking up the line
      </text>
      <text x={left - 7} y={bottom + 15} textAnchor="end" className={unit}>
        left
      </text>
      <text x={right + 7} y={bottom + 15} className={unit}>
        right
      </text>
    </>
  );
}

/** The trough under the buildings and over the bores, seen up the line. */
export function AcrossDrawing(props: AcrossDrawingProps) {
  const { section, layout, buildings, selected, factor, label } = props;
  const { width, height, frame, x, ground, pixelsPerMetre } = layout;
  const clip = useId();
  const across = frame.right - frame.left;
  const places = section.points.map(({ offset, settlement }) => {
    if (settlement === null) return null;
    const down = (metres: number) => ground + metres * factor * pixelsPerMetre;
    const { low, central, high } = settlement;
    return { x: x(offset), low: down(low), central: down(central), high: down(high) };
  });
  return (
    <svg role="img" aria-label={label} width={width} height={height} className="block">
      <clipPath id={clip}>
        <rect x={frame.left} y={frame.top} width={across} height={frame.bottom - frame.top} />
      </clipPath>
      <rect
        x={frame.left}
        y={ground}
        width={across}
        height={frame.bottom - ground}
        className="fill-paper"
      />
      <Scales {...props} />
      <g clipPath={`url(#${clip})`}>
        <StandingBuildings {...{ layout, buildings, selected }} />
        <BoresAcross layout={layout} bores={section.bores} />
        <BracketLines places={places} />
        <path d={`M${frame.left} ${ground}h${across}`} className="stroke-ink" strokeWidth="1.6" />
      </g>
    </svg>
  );
}
