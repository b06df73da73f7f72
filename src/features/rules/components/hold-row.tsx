import { useWatch } from 'react-hook-form';
import { Button } from '../../../components/ui/button.tsx';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { CONDITION_WORDS } from '../rule-words.ts';
import { SOURCE_OPTIONS } from '../source-options.ts';
import { optionsOf } from './options-of.ts';
import type { RulesFormModel } from '../rules-form-model.ts';

type HoldRowProps = {
  readonly form: RulesFormModel;
  readonly index: number;
  readonly onRemove: () => void;
};

function ConditionFields({ form, index }: Omit<HoldRowProps, 'onRemove'>) {
  const path = `holds.${index}.condition` as const;
  const kind = useWatch({ control: form.control, name: `${path}.kind` });
  const faults = form.formState.errors.holds?.[index]?.condition;
  return (
    <div className="grid grid-cols-[minmax(0,1fr)_auto] gap-2">
      <Select
        label="Acts when the building is"
        options={optionsOf(CONDITION_WORDS)}
        {...form.register(`${path}.kind`)}
      />
      {kind === 'founded deeper than' && (
        <Field
          label="Depth"
          unit="m"
          frameClassName="w-[84px]"
          error={faults?.depth?.message}
          {...form.register(`${path}.depth`)}
        />
      )}
      {kind === 'sensitivity total from' && (
        <Field
          label="Total"
          inputMode="numeric"
          className="text-right"
          frameClassName="w-[84px]"
          error={faults?.total?.message}
          {...form.register(`${path}.total`)}
        />
      )}
    </div>
  );
}

function StageFields({ form, index }: Omit<HoldRowProps, 'onRemove'>) {
  const fault = form.formState.errors.holds?.[index]?.stages?.message;
  return (
    <fieldset>
      <legend className="mb-1 text-small font-semibold">At stage</legend>
      <div className="flex gap-3">
        {['1', '2'].map((stage) => (
          <Checkbox
            key={stage}
            label={stage}
            value={stage}
            {...form.register(`holds.${index}.stages`)}
          />
        ))}
      </div>
      <p className="text-small font-medium text-clay-deep">{fault}</p>
    </fieldset>
  );
}

/** One hold: what it is called, when it acts, at which stages, and where it comes from. */
export function HoldRow({ form, index, onRemove }: HoldRowProps) {
  const faults = form.formState.errors.holds?.[index];
  return (
    <fieldset className="grid grid-cols-[minmax(0,1fr)_minmax(0,1.2fr)_90px] items-start gap-x-4 gap-y-2.5 border-b border-hairline py-3 max-sm:grid-cols-1">
      <legend className="sr-only">Hold {index + 1}</legend>
      <Field
        label="Held because"
        error={faults?.name?.message}
        {...form.register(`holds.${index}.name`)}
      />
      <ConditionFields form={form} index={index} />
      <StageFields form={form} index={index} />
      <Select
        label="Source"
        options={SOURCE_OPTIONS}
        error={faults?.source?.message}
        {...form.register(`holds.${index}.source`)}
      />
      <Field
        label="Holds from"
        type="date"
        frameClassName="max-w-[160px]"
        error={faults?.date?.message}
        {...form.register(`holds.${index}.date`)}
      />
      <Button
        kind="quiet"
        className="self-end"
        aria-label={`Remove hold ${index + 1}`}
        onClick={onRemove}
      >
        Remove
      </Button>
    </fieldset>
  );
}
