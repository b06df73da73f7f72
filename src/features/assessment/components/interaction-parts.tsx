import { categoryCurves } from '../../../../shared/assessment/category-curves.ts';
import type { DeepBeam } from '../../../../shared/building/deep-beam.ts';
import type { StrainedZone } from '../../../../shared/building/strained-zone.ts';
import { CATEGORIES, type Category } from '../../../../shared/damage/categories.ts';
import { percentFromRatio } from '../../../../shared/units/percent-from-ratio.ts';
import { BottomAxis, LeftAxis } from '../../../components/chart/axis.tsx';
import { niceTicks } from '../../../../shared/presentation/nice-ticks.ts';
import { pathBetween, pathOf, type Place } from '../../../components/chart/path-of.ts';
import { hatchFill } from '../../../components/ui/hatch-patterns.tsx';
import {
  INTERACTION,
  type InteractionFrame,
} from '../../../../shared/presentation/interaction-frame.ts';

type RegionsProps = {
  readonly zone: StrainedZone;
  readonly beam: DeepBeam;
  readonly frame: InteractionFrame;
  readonly prefix: string;
};

/** The categories behind the points, each hatched up to its curve. */
export function Regions({ zone, beam, frame, prefix }: RegionsProps) {
  const { from, to, across, up } = frame;
  const curves = categoryCurves(zone.mode, beam, from, to).filter(
    ({ points }) => points.length > 0,
  );
  return [...curves].reverse().map(({ category, points }) => {
    const line = points.map((point): Place => [
      across(point.horizontalStrain),
      up(point.deflectionRatio),
    ]);
    const foot = line.map(([x]): Place => [x, up(0)]);
    const below = CATEGORIES[category - 1]?.category ?? 0;
    return (
      <g key={category}>
        <path d={pathBetween(line, foot)} fill={hatchFill(prefix, below)} />
        <path d={pathOf(line)} fill="none" className="stroke-ink" />
      </g>
    );
  });
}

/** The number of a category on its hatch. */
export function CategoryNumber({ category, x, y }: { category: Category; x: number; y: number }) {
  const label = CATEGORIES[category]?.label ?? '';
  const width = label.length > 1 ? 26 : 16;
  return (
    <g>
      <rect
        x={x - width / 2}
        y={y - 8}
        width={width}
        height="16"
        className="fill-sheet stroke-rule"
      />
      <text x={x} y={y + 4} textAnchor="middle" className="fill-ink text-cap font-bold">
        {label}
      </text>
    </g>
  );
}

/** The frame of the chart with both its axes. */
export function Axes({
  frame,
  width,
}: {
  readonly frame: InteractionFrame;
  readonly width: number;
}) {
  const { from, to, most, across, up } = frame;
  const middle = INTERACTION.top + INTERACTION.height / 2;
  const foot = INTERACTION.top + INTERACTION.height;
  const inPercent = (scale: (value: number) => number) => (percent: number) => scale(percent / 100);
  return (
    <>
      <rect
        x={INTERACTION.left}
        y={INTERACTION.top}
        width={width - INTERACTION.left - INTERACTION.right}
        height={INTERACTION.height}
        fill="none"
        className="stroke-ink"
      />
      <BottomAxis
        scale={inPercent(across)}
        ticks={niceTicks(percentFromRatio(from), percentFromRatio(to), 4)}
        at={foot}
      />
      <LeftAxis
        scale={inPercent(up)}
        ticks={niceTicks(0, percentFromRatio(most), 4)}
        at={INTERACTION.left}
      />
      <text
        x={across((from + to) / 2)}
        y={foot + 32}
        textAnchor="middle"
        className="fill-ink-2 text-cap"
      >
        Horizontal strain, %
      </text>
      <text
        transform={`translate(10 ${middle}) rotate(-90)`}
        textAnchor="middle"
        className="fill-ink-2 text-cap"
      >
        Deflection ratio Δ/L, %
      </text>
    </>
  );
}
