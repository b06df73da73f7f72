import { describe, expect, it } from 'vitest';
import { openWall } from '../../../shared/assessment/open-wall.ts';
import {
  breakpointWords,
  categoriesWords,
  settledWords,
} from '../../../shared/presentation/bracket-words.ts';
import {
  interactionFrame,
  numberPlaces,
  pointsBeside,
} from '../../../shared/presentation/interaction-frame.ts';
import { sectionFrame } from '../../../shared/presentation/section-frame.ts';
import { strainRange } from '../../../shared/presentation/strain-range.ts';
import {
  originOf,
  peoplesFigure,
  workingText,
} from '../../../shared/presentation/working-words.ts';
import { SYMBOL_WORDS } from '../../../shared/presentation/symbol-words.ts';
import { formatSignificant } from '../../../shared/presentation/significant.ts';
import { aDrive, aModel, aWall, someRules } from '../../support/builders.ts';

const LOSS = { low: 0.01, central: 0.015, high: 0.02 };
const MODEL = aModel([
  aDrive({ volumeLoss: LOSS, troughWidth: { low: 0.4, central: 0.5, high: 0.6 } }),
]);
const OPENED = openWall(MODEL, aWall(), someRules(), []);
const LINES = OPENED.working.flatMap(({ lines }) => lines);

function lineOf(symbol: string) {
  const line = LINES.findLast((one) => one.symbol === symbol);
  if (line === undefined) throw new Error(`There is no line for ${symbol}.`);
  return line;
}

describe('figures', () => {
  it.each([
    [0, '0'],
    [20, '20'],
    [-0.0123456, '−0.012346'],
    [0.00011391, '1.1391\u2009×\u200910⁻⁴'],
    [12345678, '1.2346\u2009×\u200910⁷'],
    [12345, '12\u2009345'],
  ])('%s', (value, written) => {
    expect(formatSignificant(value, 5)).toBe(written);
  });

  it('of a working stand in the unit that people read', () => {
    expect(peoplesFigure(lineOf('ε'))).toBe('0.037876\u00a0%');
    expect(peoplesFigure(lineOf('Δ'))).toBe('1.5702\u00a0mm');
    expect(peoplesFigure(lineOf('tilt'))).toBe('1 in 1\u2009600');
    expect(peoplesFigure(lineOf('r_b'))).toBeNull();
  });
});

describe('a working', () => {
  it('says of every figure that is put in where it comes from', () => {
    for (const [index, { inputs }] of LINES.entries()) {
      for (const name of Object.keys(inputs)) {
        expect([name, originOf(name, LINES.slice(0, index))]).not.toEqual([name, 'given']);
        expect(SYMBOL_WORDS).toHaveProperty([name]);
      }
    }
  });

  it('is copied in full figures with its source', () => {
    const text = workingText('Strain', [lineOf('ε')]);
    expect(text).toContain('ε = max(ε_bt, ε_dt)');
    expect(text).toContain(String(OPENED.result.strain));
    expect(text).toContain('Source: Burland 1995');
  });
});

describe('the bracket in words', () => {
  it('names its categories, what they are sensitive to, and where the wall breaks', () => {
    expect(categoriesWords(OPENED.bracket)).toBe('Category 0 or 1');
    expect(settledWords(OPENED.sensitivity)).toBe('Sensitive, most of all to volume loss.');
    expect(settledWords({ settled: true, input: null })).toMatch(/^Settled/);
    expect(breakpointWords(OPENED.breakpoint, LOSS)).toBe(
      'Breaks at 4.40\u00a0%: above the high value.',
    );
    expect(breakpointWords(undefined, LOSS)).toBe('None below 10\u00a0%.');
  });

  it('says between which values the wall breaks', () => {
    const { breakpoint } = OPENED;
    if (breakpoint === undefined) throw new Error('The wall does not break.');
    const at = (volumeLoss: number) => breakpointWords({ ...breakpoint, volumeLoss }, LOSS);
    expect(at(0.018)).toMatch(/above the central value, not above the high\.$/);
    expect(at(0.015)).toMatch(/not above the central value\.$/);
    expect(at(0.01)).toMatch(/not above the low value\.$/);
  });

  it('has a strain from the least to the most', () => {
    const { low, central, high } = strainRange(OPENED.bracket);
    expect(central).toBe(OPENED.result.strain);
    expect(low).toBeLessThan(central);
    expect(high).toBeGreaterThan(central);
  });
});

describe('the charts', () => {
  it('have room for every point of the nine', () => {
    const zone = OPENED.result.zones[OPENED.result.governingZone];
    if (zone === undefined) throw new Error('No zone governs.');
    const { alike, otherwise } = pointsBeside(OPENED.points, zone);
    expect(alike.length + otherwise).toBe(8);
    const { to, most } = interactionFrame(
      alike.map((point) => point.zone),
      400,
    );
    for (const point of alike) {
      expect(point.zone.horizontalStrain).toBeLessThan(to);
      expect(point.zone.deflectionRatio).toBeLessThan(most);
    }
    const beam = { length: zone.end - zone.start, height: 12, eOverG: 2.6, poisson: 0.3 };
    const places = numberPlaces(zone, beam, { from: 0, to: 0.0012, most: 0.0008 });
    expect(places.map(({ category }) => category)).toEqual([0, 1, 2, 3]);
  });

  it('draw settlement downwards, the deepest of the bracket still inside', () => {
    const { down, along } = sectionFrame(OPENED.section, 600);
    expect(down(5)).toBeGreaterThan(down(0));
    const deepest = Math.max(...OPENED.section.points.map((point) => point.settlementHigh)) * 1000;
    expect(down(deepest)).toBeLessThan(down(deepest * 1.05));
    expect(along(0)).toBe(44);
    expect(along(OPENED.section.length)).toBe(588);
  });
});
