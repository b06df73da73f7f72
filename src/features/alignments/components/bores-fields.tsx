import { useFormState, useWatch } from 'react-hook-form';
import { Field } from '../../../components/ui/field.tsx';
import { Select } from '../../../components/ui/select.tsx';
import type { FieldsProps } from './range-fields.tsx';

const KINDS = [
  { value: 'single', label: 'One drive' },
  { value: 'twin', label: 'Two drives' },
];
const SIDES = [
  { value: 'left', label: 'Left drive' },
  { value: 'right', label: 'Right drive' },
];
const DIRECTIONS = [
  { value: 'forward', label: 'As drawn' },
  { value: 'backward', label: 'Against the line' },
];

/** One bore or two, how large, how far apart, and which way and in which order they are driven. */
export function BoresFields({ control, register }: FieldsProps) {
  const { errors } = useFormState({ control });
  const kind = useWatch({ control, name: 'design.bores.kind' });
  const faults = errors.design;
  return (
    <div className="mt-2.5 grid grid-cols-2 gap-x-3 gap-y-2.5">
      <Field
        label="Diameter, excavated"
        unit="m"
        autoComplete="off"
        error={faults?.diameter?.message}
        {...register('design.diameter')}
      />
      <Field
        label="Ground level"
        unit="m"
        autoComplete="off"
        error={faults?.groundLevel?.message}
        {...register('design.groundLevel')}
      />
      <Select label="Bores" options={KINDS} {...register('design.bores.kind')} />
      <Select label="Driven" options={DIRECTIONS} {...register('design.direction')} />
      {kind === 'twin' && (
        <>
          <Field
            label="Between the axes"
            unit="m"
            autoComplete="off"
            error={faults?.bores?.spacing?.message}
            {...register('design.bores.spacing')}
          />
          <Select label="Driven later" options={SIDES} {...register('design.bores.later')} />
          <Field
            label="Its volume loss times"
            inputMode="decimal"
            autoComplete="off"
            className="text-right"
            error={faults?.bores?.laterFactor?.message}
            {...register('design.bores.laterFactor')}
          />
        </>
      )}
    </div>
  );
}
