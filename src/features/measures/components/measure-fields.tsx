import {
  MEASURE_KINDS,
  MEASURE_LIMITS,
  MEASURE_STATES,
  MEASURE_WORDS,
} from '../../../../shared/schemas/measures.ts';
import { Field } from '../../../components/ui/field.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import type { MeasureDraft } from '../measure-draft.ts';
import { capital } from '../../../../shared/presentation/capital.ts';
import { LimitFields } from './limit-fields.tsx';

type MeasureFieldsProps = {
  readonly draft: MeasureDraft;
  readonly faults: Readonly<Record<string, string>>;
  /** Where along the line the building stands. */
  readonly chainage: number | null;
  readonly onChange: (change: Partial<MeasureDraft>) => void;
};

const KINDS = MEASURE_KINDS.map((kind) => ({ value: kind, label: capital(kind) }));
const STATES = MEASURE_STATES.map((state) => ({ value: state, label: capital(state) }));

function WhatIsDone({ draft, faults, onChange: set }: MeasureFieldsProps) {
  return (
    <>
      <Select
        label="Where it acts"
        hint="Sought first in how the tunnel is driven, then in the ground, last at the building."
        options={KINDS}
        value={draft.kind}
        data-first-in-focus
        onChange={({ target }) => {
          const kind = MEASURE_KINDS.find((one) => one === target.value);
          if (kind !== undefined) set({ kind });
        }}
      />
      <Field
        label="What is done"
        list="measure-words"
        maxLength={MEASURE_LIMITS.title}
        value={draft.title}
        error={faults.title}
        onChange={({ target }) => {
          set({ title: target.value });
        }}
      />
      <datalist id="measure-words">
        {MEASURE_WORDS[draft.kind].map((words) => (
          <option key={words} value={words} />
        ))}
      </datalist>
    </>
  );
}

function HowFar({ draft, faults, onChange: set }: MeasureFieldsProps) {
  return (
    <div className="grid grid-cols-3 gap-3 max-sm:grid-cols-1">
      <Select
        label="State"
        options={STATES}
        value={draft.state}
        onChange={({ target }) => {
          const state = MEASURE_STATES.find((one) => one === target.value);
          if (state !== undefined) set({ state });
        }}
      />
      <Field
        label="Responsible"
        maxLength={MEASURE_LIMITS.responsible}
        value={draft.responsible}
        onChange={({ target }) => {
          set({ responsible: target.value });
        }}
      />
      <Field
        label="Due"
        type="date"
        value={draft.due}
        error={faults.due}
        onChange={({ target }) => {
          set({ due: target.value });
        }}
      />
    </div>
  );
}

/** What is written of a protective measure. */
export function MeasureFields(props: MeasureFieldsProps) {
  const { draft, onChange: set } = props;
  return (
    <>
      <WhatIsDone {...props} />
      {draft.kind === 'at the tunnel' && <LimitFields {...props} />}
      <TextArea
        label="Details"
        rows={2}
        maxLength={MEASURE_LIMITS.detail}
        value={draft.detail}
        onChange={({ target }) => {
          set({ detail: target.value });
        }}
      />
      <HowFar {...props} />
    </>
  );
}
