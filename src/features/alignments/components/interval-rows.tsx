import { useFieldArray, useFormState } from 'react-hook-form';
import { Field } from '../../../components/ui/field.tsx';
import { blankInterval, type OptionDraft } from '../drafts/option-draft.ts';
import { FaultLine, RangeFields, type FieldsProps } from './range-fields.tsx';
import { AddRow, RemoveRow } from './row-buttons.tsx';

type IntervalRowsProps = FieldsProps & { readonly valuesOf: () => OptionDraft };

/** Stretches that have a volume loss and K of their own. */
export function IntervalRows({ control, register, valuesOf }: IntervalRowsProps) {
  const { fields, append, remove } = useFieldArray({ control, name: 'design.intervals' });
  const faults = useFormState({ control }).errors.design?.intervals;
  return (
    <fieldset className="mt-3">
      <legend className="text-small font-semibold">Intervals with values of their own</legend>
      {fields.map((field, k) => (
        <div key={field.id} className="mt-1.5 border-l-2 border-rule pl-2.5">
          <div className="grid grid-cols-[1fr_1fr_auto] items-end gap-2">
            {(['from', 'to'] as const).map((end) => (
              <Field
                key={end}
                label={
                  <>
                    {end === 'from' ? 'From' : 'To'}
                    <span className="sr-only"> of interval {k + 1}</span>
                  </>
                }
                unit="m"
                autoComplete="off"
                error={faults?.[k]?.[end]?.message}
                {...register(`design.intervals.${k}.${end}`)}
              />
            ))}
            <RemoveRow
              named={`interval ${k + 1}`}
              onClick={() => {
                remove(k);
              }}
            />
          </div>
          <RangeFields {...{ control, register }} of="volumeLoss" interval={k} />
          <RangeFields {...{ control, register }} of="troughWidth" interval={k} />
        </div>
      ))}
      <FaultLine>{faults?.message ?? faults?.root?.message}</FaultLine>
      <AddRow
        onClick={() => {
          append(blankInterval(valuesOf().design));
        }}
      >
        Another interval
      </AddRow>
    </fieldset>
  );
}
