import { useWatch } from 'react-hook-form';
import { Field } from '../../../components/ui/field.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { CUT_OFF_WORDS } from '../rule-words.ts';
import { optionsOf } from './options-of.ts';
import type { RulesFormModel } from '../rules-form-model.ts';

/** What of a wall is ignored. */
export function CutOffFields({ form }: { readonly form: RulesFormModel }) {
  const kind = useWatch({ control: form.control, name: 'cutOff.value.kind' });
  const faults = form.formState.errors.cutOff?.value;
  return (
    <div className="grid grid-cols-2 gap-3">
      <Select
        label="Ignore"
        options={optionsOf(CUT_OFF_WORDS)}
        {...form.register('cutOff.value.kind')}
      />
      {kind === 'widths' ? (
        <Field
          label="Distance"
          unit="trough widths"
          error={faults?.widths?.message}
          {...form.register('cutOff.value.widths')}
        />
      ) : (
        <Field
          label="Settlement"
          unit="mm"
          hint="0 ignores nothing."
          error={faults?.settlement?.message}
          {...form.register('cutOff.value.settlement')}
        />
      )}
    </div>
  );
}
