import { useFieldArray, useFormState } from 'react-hook-form';
import { Field } from '../../../components/ui/field.tsx';
import { FaultLine, type FieldsProps } from './range-fields.tsx';
import { AddRow, RemoveRow } from './row-buttons.tsx';

/** Levels of the axis along the line; straight between them. */
export function LevelRows({ control, register }: FieldsProps) {
  const { fields, append, remove } = useFieldArray({ control, name: 'design.levels' });
  const faults = useFormState({ control }).errors.design?.levels;
  return (
    <fieldset className="mt-3">
      <legend className="text-small font-semibold">Levels of the axis</legend>
      {fields.map((field, k) => (
        <div key={field.id} className="mt-1 grid grid-cols-[1fr_1fr_auto] items-end gap-2">
          <Field
            label={
              <span className={k > 0 ? 'sr-only' : undefined}>
                Chainage<span className="sr-only"> of level {k + 1}</span>
              </span>
            }
            unit="m"
            autoComplete="off"
            error={faults?.[k]?.chainage?.message}
            {...register(`design.levels.${k}.chainage`)}
          />
          <Field
            label={
              <span className={k > 0 ? 'sr-only' : undefined}>
                Level<span className="sr-only"> {k + 1}</span>
              </span>
            }
            unit="m"
            autoComplete="off"
            error={faults?.[k]?.level?.message}
            {...register(`design.levels.${k}.level`)}
          />
          {fields.length > 1 && (
            <RemoveRow
              named={`level ${k + 1}`}
              onClick={() => {
                remove(k);
              }}
            />
          )}
        </div>
      ))}
      <FaultLine>{faults?.message ?? faults?.root?.message}</FaultLine>
      <AddRow
        onClick={() => {
          append({ chainage: '', level: '' });
        }}
      >
        Another level
      </AddRow>
    </fieldset>
  );
}
