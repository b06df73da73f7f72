import { evaluate } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { assessBuilding } from '../../../shared/assessment/assess-building.ts';
import { ALL_COMPLETE } from '../../../shared/assessment/moment.ts';
import {
  mostGoverning,
  SAMPLES,
  sampleAtShare,
  sampledRun,
} from '../../../shared/assessment/sampled-run.ts';
import { sensitivityOf } from '../../../shared/assessment/sensitivity.ts';
import { workingOfSample } from '../../../shared/assessment/working-of-sample.ts';
import { categoryOfStrain } from '../../../shared/damage/category-of-strain.ts';
import { certain } from '../../../shared/numerics/range.ts';
import { SYMBOL_WORDS } from '../../../shared/presentation/symbol-words.ts';
import { REFERENCES } from '../../../shared/references.ts';
import { aDrive, aModel, aWall, someRules } from '../../support/builders.ts';

const LOSS = { low: 0.01, central: 0.02, high: 0.035 };
const K = { low: 0.4, central: 0.5, high: 0.6 };
const RULES = someRules();
const OTHER = aDrive({
  name: 'B',
  axis: [[-500, 16, -22], [500, 16, -22]],
  volumeLoss: { low: 0.01, central: 0.015, high: 0.02 },
  troughWidth: { low: 0.45, central: 0.5, high: 0.55 },
}); // prettier-ignore
const MODEL = aModel([aDrive({ volumeLoss: LOSS, troughWidth: K }), OTHER]);
const EG = { low: 0.5, central: 2.6, high: 12.5 };
const WALLS = [
  aWall({ name: 'N', eOverG: EG }),
  aWall({ name: 'E', from: [0, 2], to: [14, 2], eOverG: EG }),
];

function run(seed: number) {
  return sampledRun(MODEL, WALLS, RULES, [], seed);
}

describe('sampledRun', () => {
  const first = run(1);

  it('says in which category each of 500 samples comes', () => {
    expect(first.strains).toHaveLength(SAMPLES);
    expect(first.counts.reduce((sum, count) => sum + count, 0)).toBe(SAMPLES);
    const inTwo = first.strains.filter((strain) => categoryOfStrain(strain) === 2);
    expect(first.counts[2]).toBe(inTwo.length);
    expect(first.counts.filter((count) => count > 0).length).toBeGreaterThan(1);
  });

  it('gives the same bits for the same seed, and others for another', () => {
    expect(run(1)).toEqual(first);
    expect(run(2).strains).not.toEqual(first.strains);
  });

  it('gives for other seeds the same shares within the error of sampling', () => {
    for (const seed of [2, 3, 4294967295]) {
      for (const [category, count] of run(seed).counts.entries()) {
        const share = (first.counts[category] ?? 0) / SAMPLES;
        // of two independent draws, four times the deviation; the hypercube keeps well within
        const error = 4 * Math.sqrt(2 * SAMPLES * share * (1 - share));
        expect(Math.abs(count - (first.counts[category] ?? 0))).toBeLessThanOrEqual(error);
      }
    }
  });

  it('lets the worst wall of each sample count', () => {
    const alone = WALLS.map((wall) => sampledRun(MODEL, [wall], RULES, [], 1).strains);
    const worst = first.strains.map((_, k) => Math.max(...alone.map((strains) => strains[k] ?? 0)));
    expect(first.strains).toEqual(worst);
    const often = mostGoverning(first);
    expect(often?.samples).toBe(first.worst.filter((wall) => wall === often?.wall).length);
  });

  it('comes to the result itself where nothing has a range', () => {
    const model = aModel();
    const walls = [aWall()];
    const { strain } = assessBuilding(model, walls, [], RULES, [ALL_COMPLETE]);
    const { strains } = sampledRun(model, walls, RULES, [], 1, 5);
    for (const one of strains) expect(Math.abs(one / strain - 1)).toBeLessThan(1e-12);
  });

  it('draws K by layers and without K', () => {
    const layers = [
      { baseLevel: -8, troughWidth: { low: 0.3, central: 0.4, high: 0.5 } },
      { baseLevel: -60, troughWidth: { low: 0.5, central: 0.6, high: 0.7 } },
    ];
    const drives = [aDrive({ volumeLoss: LOSS, troughWidth: K })];
    const layered = someRules({ depth: { kind: 'layered', layers } });
    const fitted = someRules({ depth: { kind: 'oreilly-new-clay' } });
    for (const rules of [layered, fitted]) {
      const { strains } = sampledRun(aModel(drives, rules), WALLS, rules, [], 1, 50);
      expect(new Set(strains).size).toBe(50);
    }
  });

  it('strains no wall that no drive reaches', () => {
    const far = sampledRun(MODEL, [aWall({ from: [0, 900], to: [0, 910] })], RULES, [], 1, 10);
    expect(far.counts).toEqual([10, 0, 0, 0, 0]);
    expect(mostGoverning(far)).toBeNull();
  });

  it('strains nothing without walls', () => {
    expect(sampledRun(MODEL, [], RULES, [], 1, 10).counts).toEqual([10, 0, 0, 0, 0]);
  });
});

describe('sampleAtShare', () => {
  const strains = [5, 1, 4, 2, 3];

  it.each([
    [0.05, 1],
    [0.5, 4],
    [0.8, 2],
    [1, 0],
  ])('at %d is sample %d', (share, sample) => {
    expect(sampleAtShare({ strains }, share)).toBe(sample);
  });
});

describe('settled or sensitive', () => {
  const bracket = assessBuilding(MODEL, [aWall({ from: [0, 60], to: [0, 70] })], [], RULES, [ALL_COMPLETE]).bracket; // prettier-ignore

  it('is settled where bracket and samples are of one category', () => {
    expect(bracket && sensitivityOf(bracket, [0, 0.0004])).toEqual({ settled: true, input: null });
  });

  it('is sensitive where a sample is of another, to the input that moves the bracket most', () => {
    expect(bracket && sensitivityOf(bracket, [0, 0.0006]).settled).toBe(false);
    expect(bracket && sensitivityOf(bracket, [0, 0.0006]).input).not.toBeNull();
  });
});

describe('workingOfSample', () => {
  const sampled = run(1);
  const middle = sampleAtShare(sampled, 0.5);
  const sections = workingOfSample(MODEL, RULES, [], sampled, middle);
  const lines = sections.flatMap((section) => section.lines);

  it('says what was drawn of each ground and how the wall is strained by it', () => {
    expect(sections.map(({ title }) => title)).toEqual([
      `Sample ${middle + 1}, ground 1`,
      `Sample ${middle + 1}, ground 2`,
      `Sample ${middle + 1}, wall ${WALLS[sampled.worst[middle] ?? -1]?.name}`,
    ]);
    const symbols = lines.map(({ symbol }) => symbol);
    for (const wanted of ['q', 'V_L', 'K', 'r', 'w_1', 'EG', 'ε_h', 'ε', 'category']) {
      expect(symbols).toContain(wanted);
    }
  });

  it('comes to the strain of the sample', () => {
    const strain = lines.findLast(({ symbol }) => symbol === 'ε');
    expect(strain?.value).toBe(sampled.strains[middle]);
  });

  it('can be repeated line by line by mathjs', () => {
    for (const { expression, inputs, value, reference } of lines) {
      const again: unknown = evaluate(expression, { ...inputs });
      expect(Math.abs(Number(again) - value)).toBeLessThan(1e-9);
      expect(REFERENCES).toHaveProperty([reference]);
    }
  });

  it('names its symbols in words', () => {
    const numbered = /^[wk]_\d+$/;
    for (const name of lines.flatMap(({ inputs }) => Object.keys(inputs))) {
      if (!numbered.test(name)) expect(SYMBOL_WORDS).toHaveProperty([name]);
    }
  });

  it('is short where nothing has a range, and empty where nothing is strained', () => {
    const certainRun = sampledRun(aModel(), [aWall()], RULES, [], 1, 3);
    const symbols = workingOfSample(aModel(), RULES, [], certainRun, 0)
      .flatMap((section) => section.lines)
      .map(({ symbol }) => symbol);
    expect(symbols.slice(0, 2)).toEqual(['r', 'w_1']);
    expect(symbols).not.toContain('EG');
    const model = aModel([aDrive({ volumeLoss: certain(0) })]);
    const still = sampledRun(model, [aWall()], RULES, [], 1, 3);
    expect(workingOfSample(model, RULES, [], still, 0)).toEqual([]);
  });
});
