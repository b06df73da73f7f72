import { spawnSync } from 'node:child_process';
import { mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { describe, expect, test } from 'vitest';
import { z } from 'zod';
import { twinBoreCase } from '../../scripts/bench/twin-bore-case.ts';

const folder = mkdtempSync(path.join(tmpdir(), 'groundsill-assess-'));
const program = path.resolve(import.meta.dirname, '../../scripts/assess.mjs');

/** The wall whose figures are checked against a computation outside the project. */
const CASE = {
  groundLevel: 0,
  drives: [
    {
      name: 'A',
      axis: [
        [-500, 0, -20],
        [500, 0, -20],
      ],
      diameter: 6,
      volumeLoss: 0.015,
      troughWidth: 0.5,
    },
  ],
  walls: [
    {
      name: 'W1',
      from: [0, 2],
      to: [0, 28],
      foundingLevel: 0,
      height: 12,
      eOverG: 2.6,
      poisson: 0.3,
    },
  ],
};

const resultSchema = z.object({
  walls: z.array(
    z.looseObject({
      name: z.string(),
      strain: z.number(),
      category: z.number(),
      zones: z.array(z.looseObject({ mode: z.string(), end: z.number(), strain: z.number() })),
      warnings: z.array(z.string()),
    }),
  ),
  methodVersion: z.string(),
});

function assess(document: unknown, ...more: string[]) {
  const file = path.join(folder, 'case.json');
  writeFileSync(file, typeof document === 'string' ? document : JSON.stringify(document));
  const run = spawnSync(process.execPath, [program, file, ...more], {
    encoding: 'utf8',
    maxBuffer: 64 * 1024 * 1024,
  });
  return { status: run.status, out: run.stdout, errors: run.stderr };
}

function wallsOf(out: string) {
  return resultSchema.parse(JSON.parse(out)).walls;
}

describe('assess', () => {
  test('prints the strains of the known wall', () => {
    const { status, out } = assess(CASE);
    expect(status).toBe(0);
    const [wall] = wallsOf(out);
    expect(wall?.zones.map(({ mode }) => mode)).toEqual(['sagging', 'hogging']);
    expect((wall?.strain ?? NaN) * 100).toBeCloseTo(0.03788, 5);
    expect((wall?.zones[0]?.strain ?? NaN) * 100).toBeCloseTo(0.01418, 5);
    expect(wall).not.toHaveProperty('bracket');
  });

  test('prints bracket, breakpoint, reserve, settled and governing where a range is given', () => {
    const [drive] = CASE.drives;
    const { out } = assess({ ...CASE, drives: [{ ...drive, volumeLoss: [0.01, 0.015, 0.03] }] });
    const [wall] = wallsOf(out);
    expect(wall).toMatchObject({
      breakpoint: { reached: true, drive: 'A', eOverG: 2.6 },
      settled: false,
      governing: { zone: 1, mode: 'hogging', strain: 'bending', input: 'volumeLoss' },
    });
    expect(wall).toHaveProperty('bracket.categories');
    expect(wall).toHaveProperty('reserve.overHigh');
  });

  test('a range of E/G alone gives the bracket too', () => {
    const [wall] = CASE.walls;
    const { out } = assess({ ...CASE, walls: [{ ...wall, eOverG: [0.5, 12.5] }] });
    expect(wallsOf(out)[0]).toHaveProperty('bracket.eOverG', [0.5, 6.5, 12.5]);
  });

  test('walls stay in the order of the case, whatever thread took them', () => {
    const { walls, ...input } = twinBoreCase(3000, false);
    const { out } = assess({ ...input, walls });
    expect(wallsOf(out).map(({ name }) => name)).toEqual(walls.map(({ name }) => name));
  });

  test.each<[string, unknown, string]>([
    ['an unknown key', { ...CASE, more: 1 }, 'more: is not a key that is known here'],
    ['a missing key', { ...CASE, drives: undefined }, 'drives: is missing'],
    ['NaN', '{"groundLevel": NaN}', 'groundLevel: "NaN" is not a value that JSON can hold'],
    [
      'a wall of no length',
      { ...CASE, walls: [{ ...CASE.walls[0], to: [0, 2] }] },
      'walls[0].to: is the same point as from',
    ],
    [
      'a founding level below a crown beside the drive',
      { ...CASE, walls: [CASE.walls[0], { ...CASE.walls[0], foundingLevel: -18 }] },
      'walls[1].foundingLevel: A founding level of -18 m is not above the crown',
    ],
    [
      'a founding level above ground',
      { ...CASE, walls: [{ ...CASE.walls[0], foundingLevel: 1 }] },
      'walls[0].foundingLevel: A founding level of 1 m is above the ground level',
    ],
    [
      'a drive that stands still',
      {
        ...CASE,
        drives: [
          {
            ...CASE.drives[0],
            axis: [
              [0, 0, -20],
              [0, 0, -21],
            ],
          },
        ],
      },
      'drives[0].axis[1]: It lies on the point before it in plan.',
    ],
    [
      'intervals that overlap',
      {
        ...CASE,
        drives: [
          {
            ...CASE.drives[0],
            intervals: [
              { from: 0, to: 9 },
              { from: 8, to: 20 },
            ],
          },
        ],
      },
      'drives[0].intervals[1]: It overlaps another that ends at 9 m.',
    ],
  ])('refuses %s in one line, status 2, nothing printed', (_, document, line) => {
    const { status, out, errors } = assess(document);
    expect({ status, out }).toEqual({ status: 2, out: '' });
    expect(errors).toContain(line);
    expect(errors.trim().split('\n')).toHaveLength(1);
  });

  test('a fault in a large case is named by its own index', () => {
    const { walls, ...input } = twinBoreCase(3000, false);
    const faulty = walls.map((wall, index) =>
      index === 2750 ? { ...wall, foundingLevel: 7 } : wall,
    );
    const { status, out, errors } = assess({ ...input, walls: faulty });
    expect({ status, out }).toEqual({ status: 2, out: '' });
    expect(errors).toMatch(/^walls\[2750\]\.foundingLevel: /);
  });

  test('the working shows every line with numbers and source', () => {
    const { out } = assess(CASE, '--working', 'W1');
    expect(out).toContain('V_s = V_L * pi * D^2 / 4\n    with V_L = 0.015, D = 6');
    expect(out).toContain('= 0.424115 m³/m   [attewell-woodman-1982]');
    expect(out).toContain('Zone 2: hogging from 8.000 to 21.784 m, which governs');
    expect(out).toContain('Result: strain 0.03788 %, category 0, Rankin slight.');
    expect(out).toContain('does not replace a site visit');
    expect(out).not.toMatch(/NaN|undefined/);
  });

  test('a working of a wall that is not there is refused', () => {
    expect(assess(CASE, '--working', 'W9')).toMatchObject({ status: 2, out: '' });
    expect(assess(CASE, '--working')).toMatchObject({ status: 2, out: '' });
  });
});
