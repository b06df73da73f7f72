import { CATEGORIES } from '../../../shared/damage/categories.ts';
import type { SensitivityKind } from '../../../shared/damage/sensitivity-score.ts';
import type { RuleSet } from '../../../shared/schemas/rules.ts';
import { formatCount } from '../../../shared/presentation/format-number.ts';
import { fromMetres, fromSlope } from './display-units.ts';

export type RuleName = Exclude<keyof RuleSet, 'holds' | 'sensitivity'>;
type Words = Readonly<Record<string, string>>;

/** The rules in the order in which they act, by name and with what each settles. */
export const RULES: readonly {
  readonly rule: RuleName;
  readonly name: string;
  readonly what: string;
}[] = [
  {
    rule: 'screening',
    name: 'Let go at stage 1',
    what: 'under both limits, over the whole bracket',
  },
  { rule: 'depth', name: 'Trough width', what: 'how it follows from the depth' },
  { rule: 'focus', name: 'Ground moves towards', what: 'where the movements point' },
  { rule: 'cutOff', name: 'Ignored', what: 'what of a wall does not count' },
  { rule: 'horizontalStrain', name: 'Horizontal strain', what: 'which value of a zone is taken' },
  { rule: 'compression', name: 'Compression', what: 'whether it relieves bending' },
  {
    rule: 'leadingCategory',
    name: 'Leads on from',
    what: 'the category that the breakpoint is for',
  },
];

export const DEPTH_WORDS: Words = {
  constant: 'K the same at every depth',
  clay: 'K grows with depth, as in clay',
  'oreilly-new-clay': 'i straight from the depth, clay',
  'oreilly-new-sand': 'i straight from the depth, sand and gravel',
  layered: 'K by layers',
};
export const FOCUS_WORDS: Words = { axis: 'the axis', deep: 'a point below the axis' };
export const CUT_OFF_WORDS: Words = {
  settlement: 'settlement below',
  widths: 'what lies beyond',
};
export const STRAIN_WORDS: Words = {
  average: 'the average over the zone',
  peak: 'the highest in the zone',
};
export const COMPRESSION_WORDS: Words = { counted: 'counted', zero: 'taken as zero' };
export const CONDITION_WORDS: Words = {
  'founded deeper than': 'founded deeper than',
  piled: 'on piles',
  'inside zone of works': 'inside the zone of a shaft or box',
  listed: 'listed',
  'poor condition': 'in poor condition',
  'sensitivity total from': 'sensitivity and category together from',
};
export const SENSITIVITY_KINDS: readonly SensitivityKind[] = ['structure', 'features'];
export const SENSITIVITY_WORDS: Readonly<Record<SensitivityKind, string>> = {
  structure: 'Structure',
  features: 'Features',
};
export const SCORE_WORDS: Words = { 0: '0', 1: '1', 2: '2' };
export const CATEGORY_WORDS: Words = Object.fromEntries(
  CATEGORIES.filter(({ category }) => category > 0).map(({ category, label, name }) => [
    String(category),
    `category ${label}, ${name}`,
  ]),
);

type Depth = RuleSet['depth']['value'];

function layersInWords(layers: Extract<Depth, { kind: 'layered' }>['layers']): string {
  return layers
    .map(({ baseLevel, troughWidth: { low, central, high } }) => {
      return `${low}, ${central}, ${high} down to ${formatCount(baseLevel)}\u00a0m`;
    })
    .join('; ');
}

/** What a rule says in a scheme. */
export function ruleValue(rules: RuleSet, rule: RuleName): string {
  switch (rule) {
    case 'screening': {
      const { settlement, slope } = rules.screening.value;
      return `${fromMetres(settlement)}\u00a0mm and 1 in ${fromSlope(slope)}`;
    }
    case 'depth': {
      const { value } = rules.depth;
      const words = DEPTH_WORDS[value.kind] ?? value.kind;
      return value.kind === 'layered' ? `${words}: ${layersInWords(value.layers)}` : words;
    }
    case 'focus':
      return FOCUS_WORDS[rules.focus.value] ?? '';
    case 'cutOff': {
      const { value } = rules.cutOff;
      if (value.kind === 'widths')
        return `what lies beyond ${value.widths} trough widths of every drive`;
      return value.settlement === 0
        ? 'nothing'
        : `settlement below ${fromMetres(value.settlement)}\u00a0mm`;
    }
    case 'horizontalStrain':
      return STRAIN_WORDS[rules.horizontalStrain.value] ?? '';
    case 'compression':
      return COMPRESSION_WORDS[rules.compression.value] ?? '';
    case 'leadingCategory':
      return CATEGORY_WORDS[String(rules.leadingCategory.value)] ?? '';
  }
}

/** When a hold acts, in words. */
export function conditionInWords(condition: RuleSet['holds'][number]['condition']): string {
  const words = CONDITION_WORDS[condition.kind] ?? condition.kind;
  if ('depth' in condition) return `${words} ${condition.depth}\u00a0m`;
  return 'total' in condition ? `${words} ${condition.total}` : words;
}
