import { describe, expect, test } from 'vitest';
import { drivesOfDesign } from '../../../shared/assessment/drives-of-design.ts';
import { groundModel } from '../../../shared/ground/ground-model.ts';
import type { AlignmentDesign } from '../../../shared/schemas/alignments.ts';
import { aDesign, aRange } from '../../support/designs.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';

const RULES = { depth: { kind: 'clay' }, focus: 'axis' } as const;
const TWIN = { kind: 'twin', spacing: 16, later: 'left', laterFactor: 1.2 } as const;

/** Turns left by a right angle after 100 m. */
const BEND: AlignmentDesign['line'] = [
  [0, 0],
  [100, 0],
  [100, 80],
];

function soleDrive(design: AlignmentDesign) {
  const drives = drivesOfDesign(design);
  expect(drives).toHaveLength(1);
  const [drive] = drives;
  if (drive === undefined) throw new Error('no drive');
  return drive;
}

describe('a single bore', () => {
  test('runs along the drawn line with the values of the line', () => {
    const drive = soleDrive(aDesign());
    expect(drive).toMatchObject({
      ...{ name: 'Drive', diameter: 6, laterFactor: 1, faceShare: 0.5, intervals: [] },
      axis: [
        [-500, 0, -20],
        [500, 0, -20],
      ],
      groundLevels: [{ chainage: 0, level: 0 }],
    });
  });

  test('takes levels by chainage: straight between them, level beyond them', () => {
    const levels = [
      { chainage: 50, level: -20 },
      { chainage: 130, level: -28 },
      { chainage: 500, level: -65 },
    ];
    expect(soleDrive(aDesign({ line: BEND, levels })).axis).toEqual([
      [0, 0, -20],
      [50, 0, -20],
      [100, 0, -25],
      [100, 30, -28],
      [100, 80, -33],
    ]);
    const late = [
      { chainage: 120, level: -20 },
      { chainage: 140, level: -24 },
    ];
    expect(soleDrive(aDesign({ line: BEND, levels: late })).axis.map(([, , z]) => z)).toEqual([
      ...[-20, -20, -20, -24, -24],
    ]);
  });

  test('keeps the drawn vertex where a level stands within a millimetre of it', () => {
    const levels = [
      { chainage: 0, level: -20 },
      { chainage: 99.9995, level: -21 },
      { chainage: 179.9995, level: -22 },
      { chainage: 180, level: -30 },
    ];
    const { axis } = soleDrive(aDesign({ line: BEND, levels }));
    expect(axis.map(([e, n]) => [e, n])).toEqual(BEND);
    expect(axis[1]?.[2]).toBeCloseTo(-21, 4);
    expect(axis[2]?.[2]).toBe(-30);
  });

  test('driven backward starts at the last point, with its intervals from there', () => {
    const intervals = [
      { from: 10, to: 30, volumeLoss: aRange(0.01), troughWidth: aRange(0.5) },
      { from: 30, to: 100, volumeLoss: aRange(0.02), troughWidth: aRange(0.4) },
    ];
    const levels = [
      { chainage: 0, level: -20 },
      { chainage: 180, level: -38 },
    ];
    const drive = soleDrive(aDesign({ line: BEND, levels, intervals, direction: 'backward' }));
    expect(drive.axis).toEqual([
      [100, 80, -38],
      [100, 0, -30],
      [0, 0, -20],
    ]);
    expect(drive.intervals).toEqual([
      { from: 80, to: 150, volumeLoss: aRange(0.02), troughWidth: aRange(0.4) },
      { from: 150, to: 170, volumeLoss: aRange(0.01), troughWidth: aRange(0.5) },
    ]);
  });

  test('leaves out what lies past the end of the line', () => {
    const value = { volumeLoss: aRange(0.01), troughWidth: aRange(0.5) };
    const intervals = [
      { from: 150, to: 900, ...value },
      { from: 900, to: 950, ...value },
    ];
    expect(soleDrive(aDesign({ line: BEND, intervals })).intervals).toEqual([
      { from: 150, to: 180, ...value },
    ]);
  });

  test('moves the ground alike whichever way it is driven', () => {
    const [there, back] = (['forward', 'backward'] as const).map((direction) => {
      const levels = [
        { chainage: 0, level: -20 },
        { chainage: 70, level: -27 },
      ];
      const intervals = [{ from: 20, to: 60, volumeLoss: aRange(0.01), troughWidth: aRange(0.5) }];
      return groundModel(
        drivesOfDesign(aDesign({ line: BEND, levels, intervals, direction })),
        RULES,
      );
    });
    const volumes = [there, back].map((model) =>
      model?.pieces.flat().reduce((sum, piece) => sum + piece.unitLoss * piece.length, 0),
    );
    expect(volumes[0]).toBeCloseTo(volumes[1] ?? NaN, 9);
    expect(there?.pieces.flat()).toHaveLength(back?.pieces.flat().length ?? NaN);
  });
});

describe('twin bores', () => {
  test('run half the spacing to either side, the later one second with its factor', () => {
    const drives = drivesOfDesign(aDesign({ bores: TWIN }));
    expect(drives.map(({ name, laterFactor, axis }) => [name, laterFactor, axis[0]?.[1]])).toEqual([
      ['Right drive', 1, -8],
      ['Left drive', 1.2, 8],
    ]);
    const other = drivesOfDesign(aDesign({ bores: { ...TWIN, later: 'right' } }));
    expect(other.map(({ name, laterFactor }) => [name, laterFactor])).toEqual([
      ['Left drive', 1],
      ['Right drive', 1.2],
    ]);
  });

  test('left stays left of the drawn line when driven backward', () => {
    const [, left] = drivesOfDesign(aDesign({ bores: TWIN, direction: 'backward' }));
    expect(left).toMatchObject({
      name: 'Left drive',
      axis: [
        [500, 8, -20],
        [-500, 8, -20],
      ],
    });
  });

  test('are mitred at bends and have their levels abreast of the line', () => {
    const levels = [
      { chainage: 0, level: -20 },
      { chainage: 50, level: -25 },
      { chainage: 140, level: -34 },
    ];
    const [right, left] = drivesOfDesign(aDesign({ line: BEND, levels, bores: TWIN }));
    expect(left?.axis).toEqual([
      [0, 8, -20],
      [46, 8, -25],
      [92, 8, -30],
      [92, 44, -34],
      [92, 80, -34],
    ]);
    expect(right?.axis).toEqual([
      [0, -8, -20],
      [54, -8, -25],
      [108, -8, -30],
      [108, 36, -34],
      [108, 80, -34],
    ]);
  });

  test('have intervals by their own chainage', () => {
    const values = { volumeLoss: aRange(0.01), troughWidth: aRange(0.5) };
    const intervals = [
      { from: 50, to: 140, ...values },
      { from: 140, to: 180, ...values },
    ];
    const [right, left] = drivesOfDesign(aDesign({ line: BEND, intervals, bores: TWIN }));
    const ends = (drive: typeof left) => drive?.intervals.map(({ from, to }) => [from, to]);
    expect(ends(left)).toEqual([
      [46, 128],
      [128, 164],
    ]);
    expect(ends(right)).toEqual([
      [54, 152],
      [152, 196],
    ]);
    const [first] = drivesOfDesign(
      aDesign({ line: BEND, intervals, bores: TWIN, direction: 'backward' }),
    );
    expect(ends(first)).toEqual([
      [0, 44],
      [44, 142],
    ]);
  });

  test('of a long wound line make pieces that fit their intervals', () => {
    const line: AlignmentDesign['line'] = Array.from({ length: 400 }, (_, k) => [
      500_000 + 5 * k,
      6_000_000 + 90 * Math.sin(k / 25),
    ]);
    const intervals = Array.from({ length: 20 }, (_, k) => ({
      ...{ from: 100 * k, to: 100 * k + 100 },
      ...{ volumeLoss: aRange(0.01 + 0.001 * (k % 3)), troughWidth: aRange(0.5) },
    }));
    for (const direction of ['forward', 'backward'] as const) {
      const drives = drivesOfDesign(aDesign({ line, intervals, direction, bores: TWIN }));
      const model = groundModel(drives, RULES);
      for (const length of model.lengths) expect(length).toBeGreaterThan(1900);
    }
  });
});

describe('a design that no bore can follow is refused at its place', () => {
  test('where two points coincide or all but', () => {
    const twice = aDesign({ line: [[0, 0], [100, 0], [100, 0]] }); // prettier-ignore
    expect(methodErrorOf(() => drivesOfDesign(twice))).toMatchObject({
      ...{ code: 'zero-length', field: 'line.2' },
    });
    const near = aDesign({ line: [[0, 0], [0.0005, 0], [100, 0]] }); // prettier-ignore
    expect(methodErrorOf(() => drivesOfDesign(near))).toMatchObject({
      ...{ code: 'zero-length', field: 'line.1' },
    });
  });

  test('where the spacing leaves nothing of a part, or the line turns back', () => {
    const tight = aDesign({
      ...{ line: [[0, 0], [100, 0], [100, 6], [0, 6]] },
      bores: { ...TWIN, spacing: 40 },
    }); // prettier-ignore
    expect(methodErrorOf(() => drivesOfDesign(tight))).toMatchObject({
      ...{ code: 'outside-range', field: 'line.2' },
    });
    const back = aDesign({ line: [[0, 0], [100, 0], [50, 0]], bores: TWIN }); // prettier-ignore
    expect(methodErrorOf(() => drivesOfDesign(back))).toMatchObject({
      ...{ code: 'outside-range', field: 'line.1' },
    });
  });
});
