import { expect, test } from 'vitest';
import { assessWall } from '../../../shared/assessment/assess-wall.ts';
import { bracketOfWall, fieldsOverTroughWidth } from '../../../shared/assessment/bracket.ts';
import { bracketPoints } from '../../../shared/assessment/bracket-points.ts';
import { sectionOfWall } from '../../../shared/assessment/section-of-wall.ts';
import { FIVE_POSITIONS } from '../../../shared/numerics/range.ts';
import { aDrive, aModel, aWall, someRules } from '../../support/builders.ts';

const RULES = someRules();
const WALL = aWall();
const MODEL = aModel([
  aDrive({
    volumeLoss: { low: 0.01, central: 0.02, high: 0.04 },
    troughWidth: { low: 0.4, central: 0.5, high: 0.6 },
  }),
]);
const FIELDS = fieldsOverTroughWidth(MODEL, WALL, RULES, []);

test('the section meets the ends of zones, and its chord gives their deflection', () => {
  const { zones } = assessWall(MODEL, WALL, RULES, []);
  const places = zones.flatMap(({ start, deflectionAt, end }) => [start, deflectionAt, end]);
  const { points, length } = sectionOfWall(MODEL, FIELDS, [...places, -1, 1e6]);
  const at = (x: number) =>
    points.find((point) => point.x === x) ?? { settlement: NaN, displacement: NaN };
  expect(points.at(-1)?.x).toBe(length);
  expect(zones.length).toBeGreaterThan(0);
  for (const { start, deflectionAt, end, deflection, averageHorizontalStrain } of zones) {
    const [a, x, b] = [at(start), at(deflectionAt), at(end)];
    const share = (deflectionAt - start) / (end - start);
    const chord = a.settlement + share * (b.settlement - a.settlement);
    expect(Math.abs(x.settlement - chord)).toBeCloseTo(deflection, 12);
    const strain = (b.displacement - a.displacement) / (end - start);
    expect(strain).toBeCloseTo(averageHorizontalStrain, 12);
  }
});

test('the band holds the central line, and closes without ranges', () => {
  const { points } = sectionOfWall(MODEL, FIELDS);
  for (const { settlement, settlementLow, settlementHigh } of points) {
    expect(settlementLow).toBeLessThan(settlement);
    expect(settlementHigh).toBeGreaterThan(settlement);
  }
  const certain = aModel([aDrive()]);
  const alone = sectionOfWall(certain, fieldsOverTroughWidth(certain, WALL, RULES, []));
  for (const { settlement, settlementLow, settlementHigh } of alone.points) {
    expect([settlementLow, settlementHigh]).toEqual([settlement, settlement]);
  }
});

test('the zone at each combination has the strain of the bracket', () => {
  const { strains } = bracketOfWall(MODEL, FIELDS, WALL, RULES);
  const points = bracketPoints(MODEL, FIELDS, WALL, RULES);
  expect(points).toHaveLength(15);
  for (const [v, volumeLoss] of (['low', 'central', 'high'] as const).entries()) {
    for (const k of FIVE_POSITIONS) {
      const point = points.find((one) => one.volumeLoss === volumeLoss && one.troughWidth === k);
      expect(point?.zone.strain).toBe(strains[0]?.[v]?.[k]);
    }
  }
});

test('a wall out of reach has no point', () => {
  const far = aWall({ from: [0, 400], to: [0, 420] });
  expect(bracketPoints(MODEL, fieldsOverTroughWidth(MODEL, far, RULES, []), far, RULES)).toEqual(
    [],
  );
});
