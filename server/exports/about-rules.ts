import { CATEGORIES } from '../../shared/damage/categories.ts';
import { RESULT_VALUES } from '../../shared/schemas/result-values.ts';
import type { RuleSet } from '../../shared/schemas/rules.ts';
import type { ExportAbout } from './export-file.ts';

function depthWords({ value }: RuleSet['depth']): string {
  if (value.kind !== 'layered') return value.kind;
  const layers = value.layers.map(({ baseLevel, troughWidth: { low, central, high } }) => {
    return `K ${low}, ${central}, ${high} down to ${baseLevel} m`;
  });
  return `layered: ${layers.join('; ')}`;
}

function cutOffLine({ value }: RuleSet['cutOff']): ExportAbout[number] {
  return value.kind === 'widths'
    ? ['Rule: ignored beyond (trough widths)', value.widths]
    : ['Rule: ignored settlement below (mm)', value.settlement * RESULT_VALUES.settlement.scale];
}

/** What a run took of the rules of its scheme, figure by figure. */
export function aboutRules(rules: RuleSet): ExportAbout {
  const { settlement, slope } = rules.screening.value;
  const leading = CATEGORIES[rules.leadingCategory.value]?.label ?? '';
  const holds = rules.holds.map(({ name, stages }) => `${name} (stage ${stages.join(' and ')})`);
  return [
    ['Rule: let go under a settlement of (mm)', settlement * RESULT_VALUES.settlement.scale],
    ['Rule: and under a slope of (mm/m)', slope * RESULT_VALUES.slope.scale],
    ['Rule: trough width with depth', depthWords(rules.depth)],
    ['Rule: focus of movements', rules.focus.value],
    cutOffLine(rules.cutOff),
    ['Rule: horizontal strain of a zone', rules.horizontalStrain.value],
    ['Rule: compression', rules.compression.value],
    ['Rule: leads on from category', leading],
    ['Rule: held by', holds.length === 0 ? 'nothing' : holds.join('; ')],
  ];
}
