import { DEFAULT_HOLDS } from '../../../../shared/assessment/holds.ts';
import { SAMPLES_CAUTION, SAMPLES_PURPOSE } from '../../../../shared/presentation/sample-words.ts';
import type { MethodPart } from './formula-parts.ts';
import { formula } from './formula.ts';

const HOLDS = DEFAULT_HOLDS.map(({ name, stages }) => {
  return `${name} (${stages.length > 1 ? 'stages' : 'stage'} ${stages.join(' and ')})`;
}).join('; ');

const STAGES: MethodPart = {
  id: 'stages',
  title: 'Stages and holds',
  words:
    'Stage 1 screens the ground under a footprint, stage 2 works out the strain of its walls, stage 3 looks at the building itself. A building is let go at stage 1 when both figures are under their limits over the whole bracket, at stage 2 in category 0 to 2.',
  formulas: [
    formula(
      'let go',
      'S_most < 0.01',
      'at stage 1: settlement under 10 mm',
      'm',
      'mair-taylor-burland-1996',
    ),
    formula(
      'let go',
      'm_most < 1 / 500',
      'at stage 1, as well: slope under 1 in 500',
      'm/m',
      'mair-taylor-burland-1996',
    ),
  ],
  limits: [
    `What holds a building whatever its figures, unless a scheme says otherwise: ${HOLDS}. Holds are common practice, no source.`,
    'Limits and holds are data of each scheme, with source and date.',
  ],
};

const BRACKET: MethodPart = {
  id: 'bracket',
  title: 'Bracket and breakpoint',
  words:
    'The answer is a range: category at three volume losses and five K. The breakpoint is the smallest factor on all central volume losses at which the category that leads on is reached; the reserve is what lies between.',
  formulas: [
    formula('V_break', 'λ * V_central', 'volume loss at the breakpoint', 'm/m', 'own'),
    formula('reserve', 'λ - 1', 'reserve over the central volume loss', '', 'own'),
    formula(
      'reserve_high',
      'λ * V_central / V_high - 1',
      'reserve over the high volume loss',
      '',
      'own',
    ),
  ],
  limits: [
    'The strain jumps where a zone appears or joins, so λ is walked up from 0 and then bisected; it is never a limit over a strain.',
    'It is looked for up to a volume loss of 10 %, at low, central and high K; the smallest counts.',
    'All lengths of all drives move together.',
  ],
};

const SAMPLES_PART: MethodPart = {
  id: 'samples',
  title: 'Sampled run',
  words: `On demand on a sheet, never in a run. ${SAMPLES_PURPOSE} A category is settled when the bracket and all samples agree on it.`,
  formulas: [
    formula(
      'q',
      '(part + rest) / n',
      'share of an input’s distribution below the value that a sample draws; each of the n parts is drawn once, in an order of its own for each input',
      '',
      'mckay-beckman-conover-1979',
    ),
    formula(
      'V_L',
      'low + sqrt(q * (high - low) * (central - low))',
      'drawn from a triangular distribution, below its central value; K likewise',
      'm/m',
      'own',
    ),
    formula(
      'V_L',
      'high - sqrt((1 - q) * (high - low) * (high - central))',
      'the same above its central value',
      'm/m',
      'own',
    ),
    formula('EG', 'low + q * (high - low)', 'drawn evenly', '', 'common-practice'),
    formula('share', 'n_c / n', 'share of the samples in a category', '', 'own'),
  ],
  limits: [
    SAMPLES_CAUTION,
    'That volume loss and K are triangular and E/G even is common practice, no source.',
    'Each sample is put together from unit fields at several K on either side of the central one, interpolated in 1/K. Tests keep the strain within 1 % of working out the same inputs alone.',
    'Under a rule by layers the K of all layers are drawn together, each at the same place in its range.',
    'The same seed draws the same samples everywhere; the next seed is another draw of the same ranges.',
  ],
};

/** What is answered, in the order of the work. */
export const ANSWER_PARTS: readonly MethodPart[] = [STAGES, BRACKET, SAMPLES_PART];
