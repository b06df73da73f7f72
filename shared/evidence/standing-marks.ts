import type { PlanPoint } from '../geometry/point.ts';
import { stretchesInPolygon } from '../geometry/stretches-in-polygon.ts';
import { boxMark, cornersOf, lineMark, type Mark, type Measure } from './marks.ts';
import type { PlanBuilding } from './plan-material.ts';
import type { SectionPanel } from './section-panel.ts';
import { toneOfBuilding } from './tone-of-building.ts';

/** How high a building is drawn, whatever its height, and the size of its reference. */
const [TALL, SIZE] = [6, 6.5];
/** References keep so far apart, and are at most so long between a building and the title, in mm. */
const [APART, LONGEST] = [2.6, 17];

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

const EDGE = { ink: 'buildingEdge', width: 0.2 } as const;

function shapeOf({ x, ground }: SectionPanel, { building, from, to }: Standing): Mark {
  const box = { left: x(from), top: ground - TALL, right: x(to), bottom: ground };
  const tone = toneOfBuilding(building, 'central');
  return tone === null
    ? boxMark(box, { fill: 'paper', stroke: EDGE })
    : { kind: 'toned', tone, rings: [cornersOf(box)] };
}

function nameMarks({ ground }: SectionPanel, words: string, middle: number): Mark[] {
  const top = ground - TALL;
  return [
    lineMark([[middle, top], [middle, top - 1.2]], { ink: 'ink', width: 0.15 }), // prettier-ignore
    { kind: 'words', words, size: SIZE, along: [0, -1], at: [middle + 0.8, top - 1.8] },
  ];
}

/**
 * Buildings on the ground line of a section, at true width, with their category at the central values; their
 * references where there is room, and once each those whose reference found room nowhere.
 *
 * Units: mm. Valid: in the panel. Source: [own].
 */
export function standingMarks(
  panel: SectionPanel,
  standing: readonly Standing[],
  measure: Measure,
): { readonly marks: Mark[]; readonly unnamed: readonly Standing[] } {
  const ordered = [...standing].sort((a, b) => a.from - b.from);
  const named = new Set<string>();
  const unnamed = new Map<string, Standing>();
  let last = -Infinity;
  const names = ordered.flatMap((one): Mark[] => {
    const { id, reference } = one.building;
    const middle = (panel.x(one.from) + panel.x(one.to)) / 2;
    // words run up the sheet, each needs its own height of print
    if (middle - last < APART || measure(reference, SIZE, false) > LONGEST) {
      if (!unnamed.has(id)) unnamed.set(id, one);
      return [];
    }
    last = middle;
    named.add(id);
    return nameMarks(panel, reference, middle);
  });
  return {
    marks: [...ordered.map((one) => shapeOf(panel, one)), ...names],
    unnamed: [...unnamed.values()].filter(({ building }) => !named.has(building.id)),
  };
}
