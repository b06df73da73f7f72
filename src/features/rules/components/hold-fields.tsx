import { useFieldArray } from 'react-hook-form';
import { Button } from '../../../components/ui/button.tsx';
import type { HoldDraft } from '../rules-draft.ts';
import { HoldRow } from './hold-row.tsx';
import type { RulesFormModel } from '../rules-form-model.ts';

function blankHold(): HoldDraft {
  return {
    name: '',
    condition: { kind: 'listed', depth: '', total: '' },
    stages: ['2'],
    source: 'common-practice',
    date: new Date().toISOString().slice(0, 10),
  };
}

/** The holds, one after the other. */
export function HoldFields({ form }: { readonly form: RulesFormModel }) {
  const { fields, append, remove } = useFieldArray({ control: form.control, name: 'holds' });
  const faults = form.formState.errors.holds;
  return (
    <>
      {fields.map((field, index) => (
        <HoldRow
          key={field.id}
          form={form}
          index={index}
          onRemove={() => {
            remove(index);
          }}
        />
      ))}
      <p className="text-small font-medium text-clay-deep empty:hidden">
        {faults?.message ?? faults?.root?.message}
      </p>
      <Button
        className="mt-3"
        onClick={() => {
          append(blankHold());
        }}
      >
        Another hold
      </Button>
    </>
  );
}
