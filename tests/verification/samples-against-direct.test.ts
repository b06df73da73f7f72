import { expect, it } from 'vitest';
import { assessWall } from '../../shared/assessment/assess-wall.ts';
import {
  drawnInputs,
  drawnShares,
  type DrawnGround,
} from '../../shared/assessment/drawn-inputs.ts';
import { fieldsOverGrounds } from '../../shared/assessment/fields-over-grounds.ts';
import type { AssessmentRules } from '../../shared/assessment/rules.ts';
import { sampledGrounds } from '../../shared/assessment/sampled-grounds.ts';
import { sampledStrain } from '../../shared/assessment/sampled-run.ts';
import type { Drive } from '../../shared/ground/drive.ts';
import { groundModel } from '../../shared/ground/ground-model.ts';
import { certain, type Range } from '../../shared/numerics/range.ts';
import { aDrive, aWall, someRules } from '../support/builders.ts';

const LOSS = { low: 0.005, central: 0.015, high: 0.03 };
/** Strains that no category can feel; a share of them says nothing. */
const FELT = 5e-5;

/** What the drives of a case lose and how wide they settle, from the draw or as ranges. */
type Given = { readonly volumeLoss: Range; readonly troughWidth: Range };
type Case = {
  readonly drives: (first: Given, second: Given) => Drive[];
  readonly rules: AssessmentRules;
  readonly faces?: readonly (number | undefined)[];
};

function axisOf(northing: number): Drive['axis'] {
  return [
    [-300, northing, -18],
    [0, northing, -18],
    [300, northing, -24],
  ];
}

function single(given: Given): Drive[] {
  return [aDrive({ axis: axisOf(0), ...given })];
}

function twin(given: Given, other: Given): Drive[] {
  return [
    aDrive({ axis: axisOf(0), ...given }),
    aDrive({ name: 'B', axis: axisOf(16), ...other, laterFactor: 1.3 }),
  ];
}

function interval(given: Given, other: Given): Drive[] {
  return [aDrive({ axis: axisOf(0), ...given, intervals: [{ from: 295, to: 500, ...other }] })];
}

/** Walls across, slanting and along, over the axis and to the tails, short and long. */
const WALLS = [-5, 0, 6, 14, 22].flatMap((northing) =>
  [6, 12, 30].flatMap((length) =>
    [0, 0.9, 1.5].map((turn) =>
      aWall({
        from: [-3, northing],
        to: [-3 + length * Math.sin(turn), northing + length * Math.cos(turn)],
        foundingLevel: -1,
      }),
    ),
  ),
);

function givenBy({ volumeLoss, troughWidth }: DrawnGround): Given {
  return { volumeLoss: certain(volumeLoss), troughWidth: certain(troughWidth) };
}

/** The largest share by which a sample's strain is off that of its inputs given as certain. */
function worstGap({ drives, rules, faces = [] }: Case, troughWidth: Range) {
  const other = {
    volumeLoss: { low: 0.004, central: 0.01, high: 0.012 },
    troughWidth: { ...troughWidth, high: troughWidth.high * 1.1 },
  };
  const model = groundModel(drives({ volumeLoss: LOSS, troughWidth }, other), rules);
  const grounds = sampledGrounds(model);
  let [worst, felt] = [0, 0];
  for (const [seed, wall] of WALLS.entries()) {
    const fields = fieldsOverGrounds(model, wall, grounds, rules.cutOff, faces);
    for (const drawn of drawnInputs(grounds, drawnShares(grounds, 3, seed))) {
      const [first, second = first] = drawn.grounds;
      if (first === undefined || second === undefined) continue;
      const alone = groundModel(drives(givenBy(first), givenBy(second)), rules);
      const wanted = assessWall(alone, wall, rules, faces).strain;
      if (wanted < FELT) continue;
      felt += 1;
      const got = sampledStrain(model, fields, drawn, rules, faces);
      worst = Math.max(worst, Math.abs(got / wanted - 1));
    }
  }
  return { worst, felt };
}

const usual = { low: 0.4, central: 0.5, high: 0.6 };
const wide = { low: 0.3, central: 0.5, high: 0.7 };
const widest = { low: 0.25, central: 0.5, high: 1 };
const lopsided = { low: 0.4, central: 0.4, high: 0.6 };
const sand = { depth: { kind: 'constant' } } as const;

it.each<[string, Case, Range]>([
  ['one drive in clay', { drives: single, rules: someRules() }, usual],
  ['one drive, a wide range', { drives: single, rules: someRules(sand) }, wide],
  ['one drive, the widest range', { drives: single, rules: someRules(sand) }, widest],
  ['twin drives, the later increased', { drives: twin, rules: someRules() }, usual],
  ['twin drives, a wide range', { drives: twin, rules: someRules(sand) }, wide],
  ['an interval with values of its own', { drives: interval, rules: someRules() }, usual],
  ['central at the low end', { drives: twin, rules: someRules() }, lopsided],
  ['no K but volume loss', { drives: twin, rules: someRules() }, certain(0.5)],
  ['2.5 i', { drives: twin, rules: someRules({ ...sand, cutOff: { kind: 'widths', widths: 2.5 } }) }, wide],
  ['nothing ignored', { drives: twin, rules: someRules({ ...sand, cutOff: { kind: 'settlement', settlement: 0 } }) }, wide],
  ['a tenth of a millimetre ignored', { drives: single, rules: someRules({ ...sand, cutOff: { kind: 'settlement', settlement: 1e-4 } }) }, widest],
  ['peak strain', { drives: twin, rules: someRules({ ...sand, horizontalStrain: 'peak' }) }, wide],
  ['compression zero, the deep focus', { drives: twin, rules: someRules({ compression: 'zero', focus: 'deep' }) }, usual],
  ['a face', { drives: single, rules: someRules(), faces: [300] }, usual],
  ['a fitted line', { drives: twin, rules: someRules({ depth: { kind: 'oreilly-new-clay' } }) }, usual],
])('samples against direct computation: %s', (_, scheme, troughWidth) => {
  const { worst, felt } = worstGap(scheme, troughWidth);
  expect(felt).toBeGreaterThan(30);
  expect(worst).toBeLessThan(0.01);
}); // prettier-ignore

it('draws layers at one position, and comes to what those layers give', () => {
  const first = { low: 0.3, central: 0.4, high: 0.6 };
  const second = { low: 0.45, central: 0.5, high: 0.55 };
  const depthOf = (upper: Range, lower: Range) =>
    ({
      kind: 'layered',
      layers: [
        { baseLevel: -8, troughWidth: upper },
        { baseLevel: -60, troughWidth: lower },
      ],
    }) as const;
  const rules = someRules({ depth: depthOf(first, second) });
  const drive = aDrive({ volumeLoss: LOSS });
  const model = groundModel([drive], rules);
  const grounds = sampledGrounds(model);
  for (const [seed, wall] of WALLS.entries()) {
    const fields = fieldsOverGrounds(model, wall, grounds, rules.cutOff, []);
    for (const drawn of drawnInputs(grounds, drawnShares(grounds, 3, seed))) {
      const { volumeLoss = NaN, position = NaN } = drawn.grounds[0] ?? {};
      // the share of the way from central to the end that the draw goes towards
      const at = ({ low, central, high }: Range) =>
        certain(
          position < 2
            ? central - (1 - position / 2) * (central - low)
            : central + (position / 2 - 1) * (high - central),
        );
      const alone = someRules({ depth: depthOf(at(first), at(second)) });
      const certainLoss = { ...drive, volumeLoss: certain(volumeLoss) };
      const wanted = assessWall(groundModel([certainLoss], alone), wall, alone, []).strain;
      if (wanted < FELT) continue;
      const got = sampledStrain(model, fields, drawn, rules, []);
      expect(Math.abs(got / wanted - 1)).toBeLessThan(0.01);
    }
  }
});
