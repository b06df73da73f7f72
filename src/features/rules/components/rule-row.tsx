import { Field } from '../../../components/ui/field.tsx';
import { Select } from '../../../components/ui/select.tsx';
import type { RuleName } from '../rule-words.ts';
import type { RulesFormModel } from '../rules-form-model.ts';
import { SOURCE_OPTIONS } from '../source-options.ts';
import { RuleValue } from './rule-value.tsx';

type RuleRowProps = {
  readonly form: RulesFormModel;
  readonly rule: RuleName;
  readonly name: string;
  readonly what: string;
};

/** One rule: what it says, where that comes from, and from when it holds. */
export function RuleRow({ form, rule, name, what }: RuleRowProps) {
  const faults = form.formState.errors[rule];
  return (
    <fieldset className="grid grid-cols-[150px_minmax(0,1fr)_236px_140px] gap-x-4 gap-y-2.5 border-b border-hairline py-3 max-xl:grid-cols-2 max-sm:grid-cols-1">
      <legend className="sr-only">{name}</legend>
      <div aria-hidden="true" className="max-xl:col-span-2 max-sm:col-span-1">
        <b className="block text-small font-semibold">{name}</b>
        <span className="text-cap text-ink-3">{what}</span>
      </div>
      <div className="max-xl:col-span-2 max-sm:col-span-1">
        <RuleValue form={form} rule={rule} />
      </div>
      <Select
        label="Source"
        options={SOURCE_OPTIONS}
        error={faults?.source?.message}
        {...form.register(`${rule}.source`)}
      />
      <Field
        label="Holds from"
        type="date"
        error={faults?.date?.message}
        {...form.register(`${rule}.date`)}
      />
    </fieldset>
  );
}
