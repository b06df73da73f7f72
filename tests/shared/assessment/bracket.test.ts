import { describe, expect, test } from 'vitest';
import { assessWall } from '../../../shared/assessment/assess-wall.ts';
import {
  bracketCategories,
  bracketOfWall,
  fieldsOverTroughWidth,
  worstBracket,
} from '../../../shared/assessment/bracket.ts';
import { sensitivityOf } from '../../../shared/assessment/sensitivity.ts';
import type { Wall } from '../../../shared/building/wall.ts';
import { categoryOfStrain } from '../../../shared/damage/category-of-strain.ts';
import { atPosition, certain, FIVE_POSITIONS } from '../../../shared/numerics/range.ts';
import type { GroundModel } from '../../../shared/ground/ground-model.ts';
import { aDrive, aModel, aWall, someRules } from '../../support/builders.ts';

const RULES = someRules();
const LOSS = { low: 0.01, central: 0.02, high: 0.04 };
const K = { low: 0.4, central: 0.5, high: 0.6 };

function bracketOf(model: GroundModel, wall: Wall = aWall()) {
  return bracketOfWall(model, fieldsOverTroughWidth(model, wall, RULES, []), wall, RULES);
}

describe('the bracket', () => {
  test('each of its fifteen strains is what the wall gives at those inputs alone', () => {
    const model = aModel([aDrive({ volumeLoss: LOSS, troughWidth: K })]);
    const bracket = bracketOf(model);
    for (const [v, loss] of [LOSS.low, LOSS.central, LOSS.high].entries()) {
      for (const k of FIVE_POSITIONS) {
        const troughWidth = certain(atPosition(K, k));
        const one = aModel([aDrive({ volumeLoss: certain(loss), troughWidth })]);
        const { strain } = assessWall(one, aWall(), RULES, []);
        // The same arithmetic in another order: a few units of the last bit.
        expect(Math.abs((bracket.strains[0]?.[v]?.[k] ?? NaN) / strain - 1)).toBeLessThan(1e-9);
      }
    }
  });

  test('drives whose losses are out of proportion are recombined rightly', () => {
    const other = { low: 0.001, central: 0.02, high: 0.021 };
    const model = aModel([
      aDrive({ volumeLoss: LOSS }),
      aDrive({ name: 'B', axis: [[-500, 14, -20], [500, 14, -20]], volumeLoss: other }),
    ]); // prettier-ignore
    const bracket = bracketOf(model);
    const low = aModel([
      aDrive({ volumeLoss: certain(LOSS.low) }),
      aDrive({ name: 'B', axis: [[-500, 14, -20], [500, 14, -20]], volumeLoss: certain(other.low) }),
    ]); // prettier-ignore
    const { strain } = assessWall(low, aWall(), RULES, []);
    expect(Math.abs((bracket.strains[0]?.[0]?.[2] ?? NaN) / strain - 1)).toBeLessThan(1e-9);
  });

  test('without a range of K the unit field is computed once and stands for all five', () => {
    const fields = fieldsOverTroughWidth(aModel(), aWall(), RULES, []);
    expect(new Set(fields).size).toBe(1);
    expect(fields).toHaveLength(5);
  });

  test('the fitted lines have no K: the bracket has volume loss only', () => {
    const model = aModel([aDrive({ troughWidth: K })], { depth: { kind: 'oreilly-new-clay' } });
    expect(new Set(fieldsOverTroughWidth(model, aWall(), RULES, [])).size).toBe(1);
  });

  test('holds low, central and high E/G where given as a range', () => {
    const wall = aWall({ eOverG: { low: 0.5, central: 2.6, high: 12.5 } });
    const bracket = bracketOf(aModel([aDrive({ volumeLoss: LOSS })]), wall);
    expect(bracket.eOverG).toEqual([0.5, 2.6, 12.5]);
    expect(bracket.strains).toHaveLength(3);
  });

  test('categories are the worst over E/G', () => {
    const wall = aWall({ eOverG: { low: 0.5, central: 2.6, high: 12.5 } });
    const bracket = bracketOf(aModel([aDrive({ volumeLoss: LOSS })]), wall);
    const worst = Math.max(...bracket.strains.map((level) => level[2]?.[2] ?? 0));
    expect(bracketCategories(bracket)[2]?.[2]).toBe(categoryOfStrain(worst));
  });

  test('of several walls it is the worst at each combination', () => {
    const narrow = { eOverG: [2.6], strains: [[[1], [2], [3]]] };
    const wide = {
      eOverG: [1, 2, 3],
      strains: [
        [[0], [3], [1]],
        [[2], [0], [0]],
        [[0], [0], [9]],
      ],
    };
    expect(worstBracket([narrow, wide])).toEqual({
      eOverG: [1, 2, 3],
      strains: [[[1], [3], [3]], [[2], [2], [3]], [[1], [2], [9]]],
    }); // prettier-ignore
  });
});

describe('settled or sensitive', () => {
  const flat = [0.0002, 0.0002, 0.0002, 0.0002, 0.0002];

  test('one category throughout is settled, and nothing moves it', () => {
    const bracket = { eOverG: [2.6], strains: [[flat, flat, flat]] };
    expect(sensitivityOf(bracket)).toEqual({ settled: true, input: null });
  });

  test('names the input that moves the category most', () => {
    const byLoss = {
      eOverG: [2.6],
      strains: [[flat, flat.map((e) => 3 * e), flat.map((e) => 9 * e)]],
    };
    expect(sensitivityOf(byLoss)).toEqual({ settled: false, input: 'volumeLoss' });
    const growing = [0.0002, 0.0004, 0.0006, 0.0008, 0.0016];
    const byK = { eOverG: [2.6], strains: [[growing, growing, growing]] };
    expect(sensitivityOf(byK)).toEqual({ settled: false, input: 'troughWidth' });
    const scaled = (factor: number) => [1, 1, 1].map(() => flat.map((e) => e * factor));
    const byBeam = { eOverG: [1, 2, 3], strains: [scaled(1), scaled(2), scaled(8)] };
    expect(sensitivityOf(byBeam)).toEqual({ settled: false, input: 'eOverG' });
  });

  test('among equal changes of category the larger change of strain counts', () => {
    const centre = [0.00045, 0.00048, 0.0006, 0.0007, 0.0006];
    const low = [0.0001, 0.0001, 0.0003, 0.0003, 0.0003];
    const bracket = { eOverG: [2.6], strains: [[low, centre, centre]] };
    expect(sensitivityOf(bracket)).toEqual({ settled: false, input: 'volumeLoss' });
  });
});
