import { afterEach, describe, expect, test, vi } from 'vitest';
import type { Check } from '../../shared/checks/check.ts';

/**
 * A check that cannot fail proves nothing. Each case makes one formula 1 % wrong and names the check
 * that must then disagree.
 */
const ONE_PERCENT = 1.01;

afterEach(() => {
  vi.doUnmock('../../shared/ground/volume-loss.ts');
  vi.doUnmock('../../shared/ground/trough-width.ts');
  vi.doUnmock('../../shared/ground/vector-focus.ts');
  vi.doUnmock('../../shared/building/deep-beam.ts');
  vi.doUnmock('../../shared/building/horizontal-strain.ts');
  vi.doUnmock('../../shared/building/deflection.ts');
  vi.doUnmock('../../shared/damage/category-of-strain.ts');
  vi.doUnmock('../../shared/numerics/error-function.ts');
  vi.resetModules();
});

async function disagreeing(): Promise<string[]> {
  vi.resetModules();
  const { ALL_CHECKS } = await import('../../shared/checks/all-checks.ts');
  const fails = (check: Check) => check.run().some((row) => !row.agrees);
  return ALL_CHECKS.filter(fails).map((check) => check.id);
}

describe('a formula that is 1 % wrong is found by name', () => {
  test('as it stands, every check agrees', async () => {
    expect(await disagreeing()).toEqual([]);
  });

  test('volume of the trough', async () => {
    vi.doMock('../../shared/ground/volume-loss.ts', () => ({
      volumePerMetre: (loss: number, diameter: number) =>
        (ONE_PERCENT * loss * Math.PI * diameter * diameter) / 4,
    }));
    expect(await disagreeing()).toEqual(
      expect.arrayContaining(['bitetti-troughs', 'attewell-woodman-face', 'wall-square-to-drive']),
    );
  });

  test('trough width', async () => {
    vi.doMock('../../shared/ground/trough-width.ts', async (original) => {
      const real = await original<typeof import('../../shared/ground/trough-width.ts')>();
      return {
        ...real,
        troughWidth: (...args: Parameters<typeof real.troughWidth>) =>
          ONE_PERCENT * real.troughWidth(...args),
      };
    });
    expect(await disagreeing()).toEqual(
      expect.arrayContaining(['bitetti-troughs', 'clay-depth-rule', 'attewell-woodman-face']),
    );
  });

  test('depth to the vector focus', async () => {
    vi.doMock('../../shared/ground/vector-focus.ts', async (original) => {
      const real = await original<typeof import('../../shared/ground/vector-focus.ts')>();
      return {
        ...real,
        depthToFocus: (...args: Parameters<typeof real.depthToFocus>) =>
          ONE_PERCENT * real.depthToFocus(...args),
      };
    });
    expect(await disagreeing()).toEqual(
      expect.arrayContaining(['attewell-woodman-face', 'wall-square-to-drive']),
    );
  });

  test('second moment of area of the deep beam', async () => {
    vi.doMock('../../shared/building/deep-beam.ts', async (original) => {
      const real = await original<typeof import('../../shared/building/deep-beam.ts')>();
      return {
        ...real,
        deflectionPerStrain: (...args: Parameters<typeof real.deflectionPerStrain>) => {
          const { bending, diagonal } = real.deflectionPerStrain(...args);
          return { bending: bending * ONE_PERCENT, diagonal };
        },
      };
    });
    expect(await disagreeing()).toContain('deep-beam-ratios');
  });

  test('average horizontal strain', async () => {
    vi.doMock('../../shared/building/horizontal-strain.ts', async (original) => {
      const real = await original<typeof import('../../shared/building/horizontal-strain.ts')>();
      return {
        ...real,
        averageHorizontalStrain: (...args: Parameters<typeof real.averageHorizontalStrain>) =>
          ONE_PERCENT * real.averageHorizontalStrain(...args),
      };
    });
    expect(await disagreeing()).toEqual(['wall-square-to-drive']);
  });

  test('deflection from the chord', async () => {
    vi.doMock('../../shared/building/deflection.ts', async (original) => {
      const real = await original<typeof import('../../shared/building/deflection.ts')>();
      return {
        deflection: (...args: Parameters<typeof real.deflection>) => {
          const found = real.deflection(...args);
          return { ...found, deflection: ONE_PERCENT * found.deflection };
        },
      };
    });
    expect(await disagreeing()).toEqual(['wall-square-to-drive']);
  });

  test('error function', async () => {
    vi.doMock('../../shared/numerics/error-function.ts', async (original) => {
      const real = await original<typeof import('../../shared/numerics/error-function.ts')>();
      return {
        ...real,
        complementaryErrorFunction: (x: number) => ONE_PERCENT * real.complementaryErrorFunction(x),
      };
    });
    expect(await disagreeing()).toContain('normal-distribution');
  });
});
