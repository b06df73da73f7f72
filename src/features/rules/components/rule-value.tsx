import { Select } from '../../../components/ui/select.tsx';
import {
  CATEGORY_WORDS,
  COMPRESSION_WORDS,
  FOCUS_WORDS,
  STRAIN_WORDS,
  type RuleName,
} from '../rule-words.ts';
import { CutOffFields } from './cut-off-fields.tsx';
import { DepthFields } from './depth-fields.tsx';
import { optionsOf } from './options-of.ts';
import type { RulesFormModel } from '../rules-form-model.ts';
import { ScreeningFields } from './screening-fields.tsx';

const CHOICES = {
  focus: FOCUS_WORDS,
  horizontalStrain: STRAIN_WORDS,
  compression: COMPRESSION_WORDS,
  leadingCategory: CATEGORY_WORDS,
} as const;

/** What a rule says, with the fields that its kind needs. */
export function RuleValue({
  form,
  rule,
}: {
  readonly form: RulesFormModel;
  readonly rule: RuleName;
}) {
  switch (rule) {
    case 'screening':
      return <ScreeningFields form={form} />;
    case 'depth':
      return <DepthFields form={form} />;
    case 'cutOff':
      return <CutOffFields form={form} />;
    case 'focus':
    case 'horizontalStrain':
    case 'compression':
    case 'leadingCategory':
      return (
        <Select
          label="Value"
          options={optionsOf(CHOICES[rule])}
          error={form.formState.errors[rule]?.value?.message}
          {...form.register(`${rule}.value`)}
        />
      );
  }
}
