import { useFieldArray, useWatch } from 'react-hook-form';
import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { DEPTH_WORDS } from '../rule-words.ts';
import { blankLayer } from '../rules-draft.ts';
import { optionsOf } from './options-of.ts';
import type { RulesFormModel } from '../rules-form-model.ts';

const RANGE = ['low', 'central', 'high'] as const;

type LayerProps = { readonly form: RulesFormModel; readonly index: number };

function LayerFields({ form, index }: LayerProps) {
  const layer = `depth.value.layers.${index}` as const;
  const faults = form.formState.errors.depth?.value?.layers?.[index];
  return (
    <>
      <Field
        label={`Base of layer ${index + 1}`}
        unit="m"
        error={faults?.baseLevel?.message}
        {...form.register(`${layer}.baseLevel`)}
      />
      {RANGE.map((part) => (
        <Field
          key={part}
          label={`K ${part}`}
          inputMode="decimal"
          className="text-right"
          error={faults?.troughWidth?.[part]?.message}
          {...form.register(`${layer}.troughWidth.${part}`)}
        />
      ))}
      <p className="col-span-full text-small font-medium text-clay-deep empty:hidden">
        {faults?.troughWidth?.message ?? faults?.troughWidth?.root?.message}
      </p>
    </>
  );
}

function Layers({ form }: { readonly form: RulesFormModel }) {
  const { fields, append, remove } = useFieldArray({
    control: form.control,
    name: 'depth.value.layers',
  });
  const faults = form.formState.errors.depth?.value?.layers;
  return (
    <div className="mt-2.5 grid gap-2.5">
      {fields.map((field, index) => (
        <div
          key={field.id}
          className="grid grid-cols-[1.6fr_1fr_1fr_1fr] items-start gap-2 max-sm:grid-cols-2"
        >
          <LayerFields form={form} index={index} />
        </div>
      ))}
      <p className="text-small font-medium text-clay-deep empty:hidden">
        {faults?.message ?? faults?.root?.message}
      </p>
      <div className="-ml-1.5 flex gap-2">
        <Button
          kind="quiet"
          onClick={() => {
            append(blankLayer());
          }}
        >
          Another layer below
        </Button>
        {fields.length > 1 && (
          <Button
            kind="quiet"
            onClick={() => {
              remove(fields.length - 1);
            }}
          >
            Remove the lowest
          </Button>
        )}
      </div>
    </div>
  );
}

/** How the trough width follows from the depth; by layers, with the K of each. */
export function DepthFields({ form }: { readonly form: RulesFormModel }) {
  const kind = useWatch({ control: form.control, name: 'depth.value.kind' });
  return (
    <>
      <Select
        label="Value"
        options={optionsOf(DEPTH_WORDS)}
        {...form.register('depth.value.kind')}
      />
      {kind === 'layered' && <Layers form={form} />}
    </>
  );
}
