import { planDistance } from '../geometry/plan-distance.ts';
import { pointInPolygon } from '../geometry/point-in-polygon.ts';
import { labelCorners, type LabelBox } from './label-box.ts';
import type { Measure, Spot } from './marks.ts';
import type { Wanted } from './place-labels.ts';

/**
 * A building on paper that wants words: its outline, its middle, and what is to be written.
 *
 * Units: mm. Valid: rings closed or not. Source: [own].
 */
export type LabelledBuilding = {
  readonly id: string;
  readonly rings: readonly (readonly Spot[])[];
  readonly middle: Spot;
  readonly words: string;
};

/**
 * The sizes of categories in buildings and of their references.
 *
 * Units: points of print. Valid: constants. Source: [own].
 */
export const [CATEGORY_SIZE, NAME_SIZE] = [7.5, 7] as const;

/** In mm: steps from the middle of a building to the middle of a name outside, and between its directions. */
const RINGS = [7, 10, 13, 17, 22, 28];
const DIRECTIONS: readonly Spot[] = [
  [0, -1], [0, 1], [1, 0], [-1, 0], [0.71, -0.71], [-0.71, -0.71], [0.71, 0.71], [-0.71, 0.71],
]; // prettier-ignore

/** The direction of the longest side of an outline, so that words can run along a narrow house. */
function longestSide(rings: readonly (readonly Spot[])[]): Spot {
  let [best, along]: [number, Spot] = [0, [1, 0]];
  const [ring = []] = rings;
  for (const [k, [x, y]] of ring.entries()) {
    const [nextX, nextY] = ring[(k + 1) % ring.length] ?? [x, y];
    const [dx, dy] = [nextX - x, nextY - y];
    const long = planDistance([x, y], [nextX, nextY]);
    if (long <= best) continue;
    const turned = dx < 0 || (dx === 0 && dy > 0) ? -1 : 1;
    [best, along] = [long, [(turned * dx) / long, (turned * dy) / long]];
  }
  return along;
}

function fits(box: LabelBox, rings: readonly (readonly Spot[])[]): boolean {
  return labelCorners(box).every((corner) => pointInPolygon(corner, rings));
}

/** Where words fit into a building: at its middle, or a little off it to either side. */
function spotsInside(
  { rings, middle }: LabelledBuilding,
  halfWide: number,
  halfTall: number,
): LabelBox[] {
  const along = longestSide(rings);
  const across: Spot = [-along[1], along[0]];
  return ([[1, 0] as Spot, along, across[0] < 0 ? ([-across[0], -across[1]] as Spot) : across] as const)
    .flatMap((direction) =>
      [0, 2.6, -2.6, 4.5, -4.5].flatMap((off) =>
        [along, across].map(
          ([x, y]): LabelBox => ({
            middle: [middle[0] + off * x, middle[1] + off * y],
            halfWide,
            halfTall,
            along: direction,
          }),
        ),
      ),
    )
    .filter((box) => fits(box, rings)); // prettier-ignore
}

/**
 * The numbers of categories, each in its building.
 *
 * Units: mm. Valid: no spot where a building is too narrow. Source: [own].
 */
export function categoryLabels(
  buildings: readonly LabelledBuilding[],
  measure: Measure,
): Wanted<LabelledBuilding>[] {
  return buildings.map((building) => {
    const halfWide = measure(building.words, CATEGORY_SIZE, true) / 2 + 0.25;
    const spots = spotsInside(building, halfWide, 1.25);
    return { what: building, spots: spots.slice(0, 12) };
  });
}

/**
 * The names of buildings: inside where there is room, or else beside it, to be led to it by a line.
 *
 * Units: mm. Valid: any buildings. Source: [own].
 */
export function nameLabels(
  buildings: readonly LabelledBuilding[],
  measure: Measure,
): Wanted<LabelledBuilding>[] {
  return buildings.map((building) => {
    const halfWide = measure(building.words, NAME_SIZE, false) / 2 + 0.9;
    const halfTall = 1.7;
    const outside = RINGS.flatMap((ring) =>
      DIRECTIONS.map(([dx, dy]): LabelBox => ({
        middle: [
          building.middle[0] + dx * (ring + halfWide * Math.abs(dx)),
          building.middle[1] + dy * ring,
        ],
        ...{ halfWide, halfTall, along: [1, 0] },
      })),
    );
    return { what: building, spots: [...spotsInside(building, halfWide, 1.4), ...outside] };
  });
}
