import { Field } from '../../../components/ui/field.tsx';
import type { RulesFormModel } from '../rules-form-model.ts';

/** The settlement and slope under both of which a building is let go. */
export function ScreeningFields({ form }: { readonly form: RulesFormModel }) {
  const faults = form.formState.errors.screening?.value;
  return (
    <div className="grid grid-cols-2 gap-3">
      <Field
        label="Settlement"
        unit="mm"
        error={faults?.settlement?.message}
        {...form.register('screening.value.settlement')}
      />
      <Field
        label="Slope, 1 in"
        inputMode="decimal"
        className="text-right"
        error={faults?.slope?.message}
        {...form.register('screening.value.slope')}
      />
    </div>
  );
}
