import { footprintArea } from '../../shared/building/footprint-area.ts';
import { pointInPolygon } from '../../shared/geometry/point-in-polygon.ts';
import { IMPORT_LIMITS } from '../../shared/schemas/imports.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import { cleanRings } from './clean-rings.ts';
import { crossingOfEdges } from './crossing-of-footprint.ts';
import { lappedRings } from './lapped-rings.ts';
import { mendFootprint } from './mend-footprint.ts';
import { REMARKS } from './remarks.ts';

/**
 * In square metres: what is smaller than the least is nothing, what is larger than the most a district or
 * a slip of units. Registers of land do hold buildings of half a square metre, which are looked at twice.
 */
const FOOTPRINT_AREA = { least: 0.1, small: 1, most: 200_000 } as const;

export type CheckedFootprint = {
  /** As it will be kept, or as it was read where it is refused; undefined where it cannot be drawn. */
  readonly footprint: FootprintRings | undefined;
  readonly area: number | null;
  readonly isRefused: boolean;
  /** Rings crossed, and they were mended or can be. */
  readonly isMended: boolean;
  readonly remarks: readonly string[];
};

function refused(remark: string, footprint?: FootprintRings, isMended = false): CheckedFootprint {
  return { footprint, area: null, isRefused: true, isMended, remarks: [remark] };
}

function sized(
  footprint: FootprintRings,
  remarks: readonly string[],
  isMended: boolean,
): CheckedFootprint {
  const area = footprintArea(footprint);
  const { least, small, most } = FOOTPRINT_AREA;
  const size = [
    ...(area < least ? [REMARKS.tiny(area)] : []),
    ...(area >= least && area < small ? [REMARKS.small(area)] : []),
    ...(area > most ? [REMARKS.huge(area)] : []),
  ];
  const isRefused = area < least || area > most;
  return { footprint, area, isRefused, isMended, remarks: [...remarks, ...size] };
}

type Ring = FootprintRings[number][number];

/** By any corner of a ring inside, for others may stand on the edge of what is round it. */
function reachesInto(ring: Ring, part: readonly Ring[]): boolean {
  return ring.some((corner) => pointInPolygon(corner, part));
}

function hasHoleOutside(footprint: FootprintRings): boolean {
  return footprint.some(([outer = [], ...holes]) => {
    return !holes.every((hole) => reachesInto(hole, [outer]));
  });
}

/** Looks at a footprint in the scheme's grid: whether it can be a building's, and what was done to it. */
export function checkFootprint(placed: FootprintRings, mend: boolean): CheckedFootprint {
  if (placed.flat(2).length > IMPORT_LIMITS.corners) return refused(REMARKS.manyCorners);
  const footprint = cleanRings(placed);
  if (footprint === undefined) return refused(REMARKS.fewCorners);
  const edges = crossingOfEdges(footprint);
  if (edges === undefined && hasHoleOutside(footprint)) {
    return refused(REMARKS.holeOutside, footprint);
  }
  const crossing = edges ?? lappedRings(footprint);
  if (crossing === undefined) return sized(footprint, [], false);
  const isOneRing = footprint.flat().length === 1;
  const mended = mendFootprint(footprint);
  if (!mend || mended === undefined) {
    const canBeMended = mended !== undefined;
    const remark = REMARKS.crossing(crossing, { isOneRing, canBeMended });
    return refused(remark, footprint, canBeMended);
  }
  return sized(mended, [REMARKS.mended(crossing, isOneRing)], true);
}
