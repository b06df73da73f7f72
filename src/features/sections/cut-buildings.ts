import type { SectionAcross } from '../../../shared/assessment/sections-of-design.ts';
import { completeAttributes } from '../../../shared/building/assumed-attributes.ts';
import type { Line } from '../../../shared/geometry/stretch-within.ts';
import { stretchesInPolygon } from '../../../shared/geometry/stretches-in-polygon.ts';
import type { BuildingOutline } from '../../../shared/schemas/building-outlines.ts';

/** A stretch of a building that a section cuts, by offsets to the left of the line. */
export type CutBuilding = {
  readonly id: number;
  readonly reference: string;
  readonly name: string | null;
  readonly from: number;
  readonly to: number;
  readonly eavesHeight: number;
  readonly isHeightAssumed: boolean;
};

type Cut = Pick<SectionAcross, 'middle' | 'left'>;

/** The line on which a section stands, from its right end to its left. */
export function lineOfSection({ middle, left }: Cut, halfWidth: number): Line {
  const start = [middle[0] - halfWidth * left[0], middle[1] - halfWidth * left[1]] as const;
  return { start, direction: left, length: 2 * halfWidth };
}

function heightOf({ storeys, eavesHeight }: BuildingOutline) {
  const known = {
    ...(storeys === null ? {} : { storeys }),
    ...(eavesHeight === null ? {} : { eavesHeight }),
  };
  return {
    eavesHeight: completeAttributes(known).eavesHeight,
    isHeightAssumed: eavesHeight === null,
  };
}

/** The buildings that stand on a section, from right to left; one with a yard stands there twice. */
export function cutBuildings(
  section: Cut,
  halfWidth: number,
  outlines: readonly BuildingOutline[],
): CutBuilding[] {
  const line = lineOfSection(section, halfWidth);
  const once = new Map(outlines.map((outline) => [outline.id, outline]));
  const cuts = [...once.values()].flatMap((outline) =>
    stretchesInPolygon(line, outline.footprint.flat()).map(([from, to]): CutBuilding => {
      const { id, reference, name } = outline;
      const offsets = { from: from - halfWidth, to: to - halfWidth };
      return { id, reference, name, ...offsets, ...heightOf(outline) };
    }),
  );
  return cuts.sort((a, b) => a.from - b.from);
}
