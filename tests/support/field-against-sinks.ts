import { expect } from 'vitest';
import { FIELD, FIELD_SIZE } from '../../shared/ground/kernel.ts';
import { fieldAtPoints } from '../../shared/ground/field-at-points.ts';
import type { GroundModel } from '../../shared/ground/ground-model.ts';
import { levelField, type GroundState } from '../../shared/ground/level-field.ts';
import { lossFactorsAt } from '../../shared/ground/loss-factors-at.ts';
import { placeOf } from '../../shared/ground/place.ts';
import { siteOf } from '../../shared/ground/site.ts';
import type { Range } from '../../shared/numerics/range.ts';
import {
  movementAt,
  sinksOf,
  type Movement,
  type SinkDrive,
  type SinkGround,
} from './point-sinks.ts';

/** Points on a rectangle, by rows: `across` × `along` of them about a centre. */
export function gridAbout(
  [E, N]: readonly [number, number],
  halfWidth: number,
  each: number,
): Float64Array {
  const step = (2 * halfWidth) / (each - 1);
  const places = Array.from({ length: each }, (_, k) => k * step - halfWidth);
  return Float64Array.from(places.flatMap((dE) => places.flatMap((dN) => [E + dE, N + dN])));
}

/** What the kernel says at points, in the words of the quadrature. */
export function kernelMovements(
  model: GroundModel,
  { ground, founding }: SinkGround['levels'],
  state: GroundState,
  points: Float64Array,
  { V_L = 'central', culling = true }: { V_L?: keyof Range; culling?: boolean } = {},
): Movement[] {
  const lines = Array.from({ length: points.length / 2 }, (_, k) => {
    const point = [points[2 * k] ?? 0, points[2 * k + 1] ?? 0] as const;
    return { start: point, end: point };
  });
  const field = levelField(model, siteOf(model, placeOf(lines, ground, founding), culling), state);
  const values = fieldAtPoints(field, points, lossFactorsAt(model, V_L));
  return lines.map((_, k) => {
    function value(name: keyof typeof FIELD): number {
      return values[k * FIELD_SIZE + FIELD[name]] ?? 0;
    }
    return {
      S: value('settlement'),
      slope: [value('slopeEast'), value('slopeNorth')],
      curvature: [
        value('curvatureEastEast'),
        value('curvatureEastNorth'),
        value('curvatureNorthNorth'),
      ],
      u: [value('displacementEast'), value('displacementNorth')],
      strain: [value('strainEastEast'), value('strainEastNorth'), value('strainNorthNorth')],
    };
  });
}

/** What the quadrature says at points. */
export function sinkMovements(
  drives: readonly SinkDrive[],
  ground: SinkGround,
  points: Float64Array,
): Movement[] {
  const places = Array.from({ length: points.length / 2 }, (_, k) => {
    return [points[2 * k] ?? 0, points[2 * k + 1] ?? 0] as const;
  });
  const [E0, N0] = places[0] ?? [0, 0];
  const radius = Math.max(...places.map(([E, N]) => Math.hypot(E - E0, N - N0)));
  const sinks = sinksOf(drives, ground, [E0, N0], radius);
  return places.map(([E, N]) => movementAt(sinks, E, N));
}

/** Of one quantity over many points: the largest wanted, the worst deviation, and where. */
export type Deviation = {
  readonly largest: number;
  readonly worst: number;
  readonly share: number;
  readonly point: number;
  readonly got: number;
  readonly wanted: number;
};

function deviation(
  got: readonly Movement[],
  wanted: readonly Movement[],
  quantity: keyof Movement,
): Deviation {
  let found = { largest: 0, worst: 0, share: 0, point: -1, got: 0, wanted: 0 };
  for (const [point, movement] of wanted.entries()) {
    const others = [got[point]?.[quantity] ?? NaN].flat();
    for (const [k, want] of [movement[quantity]].flat().entries()) {
      const have = others[k] ?? NaN;
      const largest = Math.max(found.largest, Math.abs(want));
      const off = Math.abs(have - want);
      // NaN is worse than anything
      if (off <= found.worst) found = { ...found, largest };
      else found = { ...found, largest, worst: off, point, got: have, wanted: want };
    }
  }
  return { ...found, share: found.worst / found.largest };
}

/** How far one list of movements is from another, by quantity; shares are of the largest wanted. */
export function deviations(
  got: readonly Movement[],
  wanted: readonly Movement[],
): Record<keyof Movement, Deviation> {
  return {
    S: deviation(got, wanted, 'S'),
    slope: deviation(got, wanted, 'slope'),
    curvature: deviation(got, wanted, 'curvature'),
    u: deviation(got, wanted, 'u'),
    strain: deviation(got, wanted, 'strain'),
  };
}

/** Fails with got, wanted and the worst point where shares of the largest pass a tolerance. */
export function expectShares(
  found: ReturnType<typeof deviations>,
  tolerances: Record<keyof Movement, number>,
): void {
  for (const quantity of ['S', 'slope', 'curvature', 'u', 'strain'] as const) {
    const { share, got, wanted, point } = found[quantity];
    const message = `${quantity} at point ${point}: got ${got}, wanted ${wanted}`;
    expect(share, message).toBeLessThan(tolerances[quantity]);
  }
}
