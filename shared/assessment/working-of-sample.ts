import { strainedZone } from '../building/strained-zone.ts';
import { zoneShape } from '../building/zone-shape.ts';
import { categoryOfStrain } from '../damage/category-of-strain.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import type { GroundState } from '../ground/level-field.ts';
import { at } from '../numerics/at.ts';
import { isRange } from '../numerics/range.ts';
import type { Recorder, WorkingLine } from '../working.ts';
import { drawnEOverG, drawnGround, type DrawnInputs } from './drawn-inputs.ts';
import type { FieldsOverGrounds } from './fields-over-grounds.ts';
import type { AssessmentRules } from './rules.ts';
import type { SampledGround } from './sampled-grounds.ts';
import { recordInterpolation, sampledCutOff, sampledProfile } from './sampled-profile.ts';
import type { SampledRun } from './sampled-run.ts';
import { shapesOfWall } from './shapes-of-wall.ts';
import type { WorkingSection } from './working-of-wall.ts';

/** The share that a sample takes of an input's distribution: its part of n, and how far into that. */
function recordShare(share: number, n: number, record: Recorder): void {
  const part = Math.floor(share * n);
  record({
    symbol: 'q',
    meaning: 'share of the distribution below the drawn value',
    expression: '(part + rest) / n',
    inputs: { part, rest: share * n - part, n },
    value: share,
    unit: '',
    reference: 'mckay-beckman-conover-1979',
  });
}

type Sampling = {
  readonly shares: readonly Float64Array[];
  readonly n: number;
  readonly k: number;
};

function linesOfGround(
  ground: SampledGround,
  { shares, n, k }: Sampling,
  interpolate: (record: Recorder) => void,
): WorkingLine[] {
  const lines: WorkingLine[] = [];
  const record: Recorder = (line) => {
    lines.push(line);
  };
  const shareOf = (input: number) => at(shares[input] ?? new Float64Array(), k);
  const [volumeLoss, troughWidth] = [shareOf(ground.lossInput), shareOf(ground.widthInput)];
  const drawn: WorkingLine[] = [];
  drawnGround(ground, { volumeLoss, troughWidth }, (line) => {
    drawn.push(line);
  });
  for (const line of drawn) {
    if (line.inputs.q !== undefined) recordShare(line.inputs.q, n, record);
    record(line);
  }
  interpolate(record);
  return lines;
}

function linesOfWall(
  model: GroundModel,
  fields: FieldsOverGrounds,
  drawn: DrawnInputs,
  rules: AssessmentRules,
  faces: GroundState['faces'],
  n: number,
): WorkingLine[] {
  const lines: WorkingLine[] = [];
  const record: Recorder = (line) => {
    lines.push(line);
  };
  const loaded = sampledProfile(fields, drawn);
  if (loaded === null) return lines;
  const { height, poisson, eOverG: range } = fields.wall;
  if (isRange(range)) recordShare(drawn.eOverG, n, record);
  const eOverG = drawnEOverG(range, drawn.eOverG, record);
  const shapes = shapesOfWall(
    loaded,
    sampledCutOff(model, fields, drawn, rules.cutOff, faces),
    rules,
  );
  const strains = shapes.map((shape) => strainedZone(shape, { height, poisson, eOverG }).strain);
  const strain = Math.max(0, ...strains);
  const governing = shapes[strains.indexOf(strain)];
  if (governing === undefined) return lines;
  const { profile, scale } = loaded;
  const shape = zoneShape(profile, scale, governing, rules, record);
  strainedZone(shape, { height, poisson, eOverG }, record);
  categoryOfStrain(strain, record);
  return lines;
}

/**
 * The working of one sample: what is drawn of each ground that reaches its governing wall and of E/G, how
 * the unit fields are put together, and the strain of the zone that governs.
 *
 * Units: SI. Valid: `run` of the same model, rules and faces; k an index of its samples; nothing where no
 * wall is strained in it. Source: each line names its own.
 */
export function workingOfSample(
  model: GroundModel,
  rules: AssessmentRules,
  faces: GroundState['faces'],
  { shares, samples, fields: ofWalls, worst }: SampledRun,
  k: number,
): WorkingSection[] {
  const [fields, drawn] = [ofWalls[worst[k] ?? -1], samples[k]];
  if (fields === undefined || drawn === undefined) return [];
  const n = samples.length;
  const ofGrounds = fields.grounds.flatMap((one) => {
    const { number } = one.ground;
    const ofGround = drawn.grounds[number - 1];
    if (one.halves.length === 0 || ofGround === undefined) return [];
    const interpolate = (record: Recorder) => {
      recordInterpolation(one, ofGround, record);
    };
    const lines = linesOfGround(one.ground, { shares, n, k }, interpolate);
    return [{ title: `Sample ${k + 1}, ground ${number}`, lines }];
  });
  const lines = linesOfWall(model, fields, drawn, rules, faces, n);
  return [...ofGrounds, { title: `Sample ${k + 1}, wall ${fields.wall.name}`, lines }];
}
