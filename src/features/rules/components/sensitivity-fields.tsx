import { useFieldArray } from 'react-hook-form';
import type { SensitivityKind } from '../../../../shared/damage/sensitivity-score.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { SCORE_WORDS, SENSITIVITY_KINDS, SENSITIVITY_WORDS } from '../rule-words.ts';
import type { RulesFormModel } from '../rules-form-model.ts';
import { SOURCE_OPTIONS } from '../source-options.ts';
import { optionsOf } from './options-of.ts';

type KindProps = { readonly form: RulesFormModel; readonly kind: SensitivityKind };

type ReasonRowProps = KindProps & { readonly index: number; readonly onRemove: () => void };

function ReasonRow({ form, kind, index, onRemove }: ReasonRowProps) {
  const faults = form.formState.errors.sensitivity?.value?.[kind]?.[index];
  const path = `sensitivity.value.${kind}.${index}` as const;
  return (
    <div className="grid grid-cols-[64px_minmax(0,1fr)_90px] items-start gap-x-2">
      <Select
        label="Score"
        options={optionsOf(SCORE_WORDS)}
        error={faults?.score?.message}
        {...form.register(`${path}.score`)}
      />
      <Field
        label="Because"
        autoComplete="off"
        error={faults?.reason?.message}
        {...form.register(`${path}.reason`)}
      />
      <Button
        kind="quiet"
        className="mt-[22px]"
        aria-label={`Remove reason ${index + 1} for ${kind}`}
        onClick={onRemove}
      >
        Remove
      </Button>
    </div>
  );
}

function KindFields({ form, kind }: KindProps) {
  const { fields, append, remove } = useFieldArray({
    control: form.control,
    name: `sensitivity.value.${kind}`,
  });
  const faults = form.formState.errors.sensitivity?.value?.[kind];
  return (
    <fieldset className="border-b border-hairline py-3">
      <legend className="float-left mb-2 w-full text-small font-semibold">
        {SENSITIVITY_WORDS[kind]}
      </legend>
      <div className="clear-left grid gap-2.5">
        {fields.map((field, index) => (
          <ReasonRow
            key={field.id}
            {...{ form, kind, index }}
            onRemove={() => {
              remove(index);
            }}
          />
        ))}
      </div>
      <p className="text-small font-medium text-clay-deep empty:hidden">
        {faults?.message ?? faults?.root?.message}
      </p>
      <Button
        className="mt-3"
        onClick={() => {
          append({ score: '1', reason: '' });
        }}
      >
        Another reason for {kind}
      </Button>
    </fieldset>
  );
}

/** The reasons that buildings are scored by, of either kind, with the one source and day of them all. */
export function SensitivityFields({ form }: { readonly form: RulesFormModel }) {
  const faults = form.formState.errors.sensitivity;
  return (
    <>
      {SENSITIVITY_KINDS.map((kind) => (
        <KindFields key={kind} form={form} kind={kind} />
      ))}
      <div className="grid grid-cols-[236px_160px] gap-x-4 gap-y-2.5 py-3 max-sm:grid-cols-1">
        <Select
          label="Source"
          options={SOURCE_OPTIONS}
          error={faults?.source?.message}
          {...form.register('sensitivity.source')}
        />
        <Field
          label="Holds from"
          type="date"
          error={faults?.date?.message}
          {...form.register('sensitivity.date')}
        />
      </div>
    </>
  );
}
