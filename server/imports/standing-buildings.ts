import { boundingBox, type Box } from '../../shared/geometry/bounding-box.ts';
import type { CheckedRow } from '../models/checked-rows.ts';

/** What the rows of an import leave standing of the register, gathered row by row. */
export type StandingBuildings = {
  readonly add: (row: CheckedRow) => void;
  /** Around all that comes in, in degrees; undefined where nothing does. */
  readonly box: () => Box | undefined;
  /** Whether the footprint that the register has of a building stays. */
  readonly stands: (buildingId: number) => boolean;
  /** Whether a row is about a building. */
  readonly isAbout: (row: number, buildingId: number) => boolean;
};

function keepsFootprint({ outcome, changes }: CheckedRow): boolean {
  if (outcome === 'refused') return true;
  return changes.some(({ field, isKept }) => field === 'footprint' && isKept);
}

/** Tells which buildings of the register keep their footprints beside the rows of an import. */
export function createStandingBuildings(): StandingBuildings {
  const replaced = new Set<number>();
  const rows = new Map<number, number>();
  let around: Box | undefined;
  return {
    add: (row) => {
      const { box, buildingId, outcome } = row;
      if (buildingId !== null) {
        if (keepsFootprint(row)) rows.set(row.row, buildingId);
        else replaced.add(buildingId);
      }
      if (box === null || outcome === 'refused') return;
      const { west, south, east, north } = box;
      const corners = [[west, south], [east, north]] as const; // prettier-ignore
      const before = around === undefined ? [] : ([[around.west, around.south], [around.east, around.north]] as const); // prettier-ignore
      around = boundingBox([...corners, ...before]);
    },
    box: () => around,
    stands: (buildingId) => !replaced.has(buildingId),
    isAbout: (row, buildingId) => rows.get(row) === buildingId,
  };
}
