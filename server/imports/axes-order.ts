import type { ImportOptions } from '../../shared/schemas/imports.ts';
import { withinBounds } from '../crs/within-bounds.ts';
import type { LonLatBox } from '../models/find-buildings-in-box.ts';
import { placementOf, type Placement } from './placement.ts';

type Point = readonly [number, number];

export type AxesOrder = {
  readonly isExchanged: boolean;
  /** What there is to say of it. */
  readonly words: string | null;
};

/** Most of a file, if not all of it, must lie right. */
const MOST = 0.8;
/** Beside what a scheme holds already, in degrees: some 50 km. */
const NEAR = 0.6;

/** Whether what was said of the order of a file's axes is that they were exchanged. */
export function wereExchanged({ axes }: { readonly axes: string | null }): boolean {
  return axes?.includes('were exchanged') === true;
}

const BOTH = 'Both orders of the axes are possible: look at the map before you bring them in.';

function howMuch(part: number): string {
  if (part > 0.5) return 'Most';
  return part === 0.5 ? 'Half' : 'Part';
}

function share(points: readonly Point[], isRight: (point: Point) => boolean): number {
  return points.filter(isRight).length / Math.max(1, points.length);
}

function fits(points: readonly Point[], placement: Placement, around: LonLatBox | undefined) {
  const lonLats = points.map((point) => placement.toLonLat(placement.toGrid(point)));
  const inside = share(lonLats, placement.isInArea);
  return {
    inside,
    inArea: inside >= MOST,
    isNear:
      around !== undefined && share(lonLats, (one) => withinBounds(around, one, NEAR)) >= MOST,
  };
}

/**
 * Whether a file gives northing first. Its axes are exchanged only where exactly one order lies in the
 * area of both systems, or, of two that do, exactly one near what the scheme holds.
 */
export async function axesOrder(
  points: readonly Point[],
  crs: number,
  schemeCrs: number,
  around: LonLatBox | undefined,
): Promise<AxesOrder> {
  const place: Pick<ImportOptions['place'], 'shift'> = { shift: [0, 0] };
  const [given, exchanged] = await Promise.all(
    [false, true].map(async (exchangeAxes) => {
      const placement = await placementOf({ ...place, crs, exchangeAxes }, schemeCrs);
      return { ...fits(points, placement, around), name: placement.scheme.name };
    }),
  );
  if (given === undefined || exchanged === undefined || points.length === 0) {
    return { isExchanged: false, words: null };
  }
  if (exchanged.inArea && !given.inArea) {
    const words = `The file gives northing first: its axes were exchanged, for only so it lies in the area of ${given.name}.`;
    return { isExchanged: true, words };
  }
  if (exchanged.inArea && given.inArea && exchanged.isNear && !given.isNear) {
    const words =
      'The file gives northing first: its axes were exchanged, for only so it lies near the scheme.';
    return { isExchanged: true, words };
  }
  if (!given.inArea && !exchanged.inArea) {
    const outside = howMuch(1 - Math.max(given.inside, exchanged.inside));
    const words = `${outside} of the file lies outside the area of ${given.name}, whichever axis comes first. Check the system.`;
    return { isExchanged: false, words };
  }
  if (given.inArea && exchanged.inArea && given.isNear === exchanged.isNear) {
    return { isExchanged: false, words: BOTH };
  }
  return { isExchanged: false, words: null };
}
