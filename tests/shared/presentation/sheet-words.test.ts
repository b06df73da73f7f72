import { describe, expect, test } from 'vitest';
import type { RunResult } from '../../../shared/schemas/runs.ts';
import { assumedWords, plainWords } from '../../../shared/presentation/plain-words.ts';
import { labelPlace, letterPlace, planFrame } from '../../../shared/presentation/plan-frame.ts';

const LET_GO: RunResult = {
  ...{ stage: 1, settlement: 0.0064, slope: 1 / 1900, strainLow: null, strain: null, strainHigh: null },
  ...{ categoryLow: null, category: null, categoryHigh: null, rankin: null, wallSettlement: null },
  ...{ wallSlope: null, breakpoint: null, breakpointVolumeLoss: null, reserve: null },
  ...{ reserveOverHigh: null, isSettled: null, sensitiveTo: null, governingWall: null, isRow: null },
  ...{ mode: null, deflectionRatio: null, horizontalStrain: null, heldBy: [], assumed: [] },
  ...{ warnings: [], fault: null, chainage: null, offset: null },
}; // prettier-ignore
const STRAINED: RunResult = { ...LET_GO, stage: 3, categoryLow: 1, category: 2, categoryHigh: 3 };

describe('what a sheet says in plain words', () => {
  test('of a building that screening lets go', () => {
    const words = plainWords(LET_GO).join(' ');
    expect(words).toContain('6.4 mm at most, sloping 1 in 1900');
    expect(words).toContain('lets it go at stage 1');
  });

  test('of one at the strain stage: the range, the worst of it and what holds it', () => {
    const words = plainWords({ ...STRAINED, heldBy: ['listed'] }).join(' ');
    expect(words).toContain('is in category 1 to 3');
    expect(words).toContain('cracks that a mason has to open');
    expect(words).toContain('held whatever the figures: listed');
    const settled = plainWords({ ...STRAINED, stage: 2, categoryLow: 1, categoryHigh: 1 }).join(
      ' ',
    );
    expect(settled).toContain('stays in category 1');
    expect(settled).toContain('lets it go at stage 2');
  });

  test('of one that could not be worked out, and of what is assumed', () => {
    expect(plainWords({ ...LET_GO, fault: 'too deep' })[0]).toContain('too deep');
    expect([assumedWords([]), assumedWords(['storeys'])]).toEqual([
      null,
      'One value is assumed. A visit would settle it.',
    ]);
  });
});

describe('the plan on a sheet', () => {
  const frame = planFrame([[[[0, 0], [20, 0], [20, 10], [0, 10]]]], 300); // prettier-ignore

  test('holds the building with north up, at one scale both ways', () => {
    const [x, y] = frame.place([10, 5]);
    expect([x, y]).toEqual([frame.width / 2, frame.height / 2]);
    expect(frame.place([10, 6])[1]).toBeLessThan(y);
    expect(frame.place([11, 5])[0] - x).toBeCloseTo(frame.pixelsPerMetre, 9);
    expect(frame.box.east - frame.box.west).toBeCloseTo(300 / frame.pixelsPerMetre, 9);
  });

  test('puts letters outside and labels inside', () => {
    const wall = { start: [0, 0], end: [20, 0] } as const;
    const [, y] = letterPlace(frame, wall, [10, 5]);
    expect(y).toBeGreaterThan(frame.place([10, 0])[1]);
    const turned = letterPlace(frame, { start: wall.end, end: wall.start }, [10, 5]);
    expect(turned[1]).toBeCloseTo(y, 9);
    expect(labelPlace(frame, [[500, 500]])).toBeNull();
    expect(labelPlace(frame, [[500, 500], [10, 5]])).toEqual(frame.place([10, 5])); // prettier-ignore
  });
});
