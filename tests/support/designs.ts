import type { AlignmentDesign } from '../../shared/schemas/alignments.ts';

/**
 * A designed line: unless said otherwise straight and level along northing 0 from easting −500 to 500, a
 * single bore of 6 m, axis 20 m under ground level 0, V_L 1.5 %, K 0.5.
 */
export function aDesign(overrides: Partial<AlignmentDesign> = {}): AlignmentDesign {
  return {
    line: [
      [-500, 0],
      [500, 0],
    ],
    levels: [{ chainage: 0, level: -20 }],
    diameter: 6,
    bores: { kind: 'single' },
    direction: 'forward',
    groundLevel: 0,
    volumeLoss: { low: 0.015, central: 0.015, high: 0.015 },
    troughWidth: { low: 0.5, central: 0.5, high: 0.5 },
    intervals: [],
    ...overrides,
  };
}

/** A likely range, half and twice the central value. */
export function aRange(central: number) {
  return { low: central / 2, central, high: 2 * central };
}
