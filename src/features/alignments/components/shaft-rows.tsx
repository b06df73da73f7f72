import { useFieldArray, useFormState } from 'react-hook-form';
import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { FaultLine, type FieldsProps } from './range-fields.tsx';
import { AddRow } from './row-buttons.tsx';

const FIELDS = [
  ['name', 'Name', undefined],
  ['source', 'Source', undefined],
  ['east', 'Easting', 'm'],
  ['north', 'Northing', 'm'],
] as const;

/** Shafts beside the line, for rules of who is told; no run takes them. */
export function ShaftRows({ control, register }: FieldsProps) {
  const { fields, append, remove } = useFieldArray({ control, name: 'shafts' });
  const faults = useFormState({ control }).errors.shafts;
  return (
    <fieldset className="mt-3">
      <legend className="text-small font-semibold">Shafts</legend>
      {fields.map((field, k) => (
        <div key={field.id} className="mt-1 border-b border-hairline pb-2">
          <div className="grid grid-cols-2 gap-2">
            {FIELDS.map(([name, label, unit]) => (
              <Field
                key={name}
                label={
                  <>
                    {label}
                    <span className="sr-only"> of shaft {k + 1}</span>
                  </>
                }
                unit={unit}
                autoComplete="off"
                error={faults?.[k]?.[name]?.message}
                {...register(`shafts.${k}.${name}`)}
              />
            ))}
          </div>
          <Button
            kind="quiet"
            className="-ml-1.5"
            aria-label={`Remove shaft ${k + 1}`}
            onClick={() => {
              remove(k);
            }}
          >
            Remove
          </Button>
        </div>
      ))}
      <FaultLine>{faults?.message ?? faults?.root?.message}</FaultLine>
      <AddRow
        onClick={() => {
          append({ name: '', east: '', north: '', source: '' });
        }}
      >
        {fields.length === 0 ? 'Add a shaft' : 'Another shaft'}
      </AddRow>
    </fieldset>
  );
}
