import type { PlanPoint } from '../geometry/point.ts';
import { stretchesInPolygon } from '../geometry/stretches-in-polygon.ts';
import type { Mark, Measure } from './marks.ts';
import { lineMark, type Spot } from './marks.ts';
import type { PlanBuilding } from './plan-material.ts';
import type { SectionPanel } from './section-panel.ts';
import { toneOfBuilding } from './tone-of-building.ts';

/** How high a building is drawn, whatever its height, and the size of its reference. */
const [TALL, SIZE] = [6, 6.5];

/**
 * A stretch of a section that stands on a building.
 *
 * Units: m along the section. Valid: from before to. Source: [own].
 */
export type Standing = {
  readonly building: PlanBuilding;
  readonly from: number;
  readonly to: number;
};

/**
 * The buildings that a straight cut goes through, with the true width of each cut.
 *
 * Units: m; `start` is at distance `at` of the section. Valid: direction of length 1. Source: [own].
 */
export function standingOn(
  buildings: readonly PlanBuilding[],
  cut: { readonly start: PlanPoint; readonly direction: PlanPoint; readonly length: number },
  at: number,
): Standing[] {
  return buildings.flatMap((building) =>
    building.parts.flatMap((rings) =>
      stretchesInPolygon(cut, rings).map(([from, to]) => ({
        building,
        from: at + from,
        to: at + to,
      })),
    ),
  );
}

/**
 * Buildings on the ground line of a section, at true width, with their category at the central values; their
 * references where there is room.
 *
 * Units: mm. Valid: in the panel. Source: [own].
 */
export function standingMarks(
  { x, ground }: SectionPanel,
  standing: readonly Standing[],
  measure: Measure,
): Mark[] {
  const ordered = [...standing].sort((a, b) => a.from - b.from);
  let free = -Infinity;
  return ordered.flatMap(({ building, from, to }): Mark[] => {
    const [left, right, top] = [x(from), x(to), ground - TALL];
    const ring: Spot[] = [[left, ground], [left, top], [right, top], [right, ground]]; // prettier-ignore
    const tone = toneOfBuilding(building, 'central');
    const stroke = { ink: 'buildingEdge', width: 0.2 } as const;
    const shape: Mark =
      tone === null
        ? { kind: 'shape', rings: [ring], isClosed: true, fill: 'paper', stroke }
        : { kind: 'toned', tone, rings: [ring] };
    const middle = (left + right) / 2;
    const tall = measure(building.reference, SIZE, false);
    // words run up the sheet, each needs its own height of print
    if (middle - free < 2.6 || tall > 17) return [shape];
    free = middle;
    return [
      shape,
      lineMark([[middle, top], [middle, top - 1.2]], { ink: 'ink', width: 0.15 }), // prettier-ignore
      {
        ...{ kind: 'words', words: building.reference, size: SIZE, along: [0, -1] },
        at: [middle + 0.8, top - 1.8],
      },
    ];
  });
}
