import type { RuleSet } from '../../../shared/schemas/rules.ts';
import { formatShortDay } from '../../lib/format-date.ts';
import type { ValueChange } from '../../lib/changes-between.ts';
import {
  conditionInWords,
  RULES,
  ruleValue,
  SENSITIVITY_KINDS,
  SENSITIVITY_WORDS,
} from './rule-words.ts';
import { sourceWords } from '../../../shared/presentation/source-words.ts';

/** A rule, a hold or a reason for a score as a line of a table. */
export type RuleLine = {
  readonly id: string;
  readonly name: string;
  /** What it settles; of a hold, at which stages it acts; of a reason, what it scores. */
  readonly what: string;
  readonly value: string;
  readonly source: RuleSet['screening']['source'];
  readonly date: string;
};

/** The rules, in the order in which they act. */
export function ruleLines(rules: RuleSet): RuleLine[] {
  return RULES.map(({ rule, name, what }) => {
    const { source, date } = rules[rule];
    return { id: rule, name, what, value: ruleValue(rules, rule), source, date };
  });
}

/** The holds, as they were written. */
export function holdLines({ holds }: RuleSet): RuleLine[] {
  return holds.map(({ name, condition, stages, source, date }) => ({
    id: `hold ${name}`,
    name,
    what: stages.join(' and '),
    value: conditionInWords(condition),
    source,
    date,
  }));
}

/** The reasons for scores, by kind and as they were written. */
export function reasonLines({ sensitivity: { value, source, date } }: RuleSet): RuleLine[] {
  return SENSITIVITY_KINDS.flatMap((kind) =>
    value[kind].map(({ score, reason }) => ({
      id: `${kind} ${reason}`,
      name: reason,
      what: SENSITIVITY_WORDS[kind],
      value: String(score),
      source,
      date,
    })),
  );
}

type Told = readonly (readonly [path: string, value: string])[];

function told({ id, name, what, value, source, date }: RuleLine): Told {
  const isHold = id.startsWith('hold ');
  return [
    [name, isHold ? `${value}, at stage ${what}` : value],
    [`${name}: source`, sourceWords(source)],
    [`${name}: holds from`, formatShortDay(date)],
  ];
}

/** One source and one day for all reasons. */
function toldOfReasons(rules: RuleSet): Told {
  const { source, date } = rules.sensitivity;
  return [
    ...reasonLines(rules).map(
      ({ name, what, value }) => [`${what} score: ${name}`, `score ${value}`] as const,
    ),
    ['Sensitivity scores: source', sourceWords(source)],
    ['Sensitivity scores: holds from', formatShortDay(date)],
  ];
}

/** What one version of the rules says otherwise than the one before, in words. */
export function ruleChanges(before: RuleSet, after: RuleSet): ValueChange[] {
  const [old, fresh] = [before, after].map(
    (rules) =>
      new Map([
        ...[...ruleLines(rules), ...holdLines(rules)].flatMap(told),
        ...toldOfReasons(rules),
      ]),
  );
  const paths = new Set([...(old?.keys() ?? []), ...(fresh?.keys() ?? [])]);
  return [...paths]
    .map((path) => ({ path, before: old?.get(path), after: fresh?.get(path) }))
    .filter((change) => change.before !== change.after);
}
