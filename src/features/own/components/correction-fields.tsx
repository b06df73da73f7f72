import { BUILDING_TEXT } from '../../../../shared/schemas/building-fields.ts';
import { CORRECTED_FIELDS } from '../../../../shared/schemas/matters.ts';
import { Field } from '../../../components/ui/field.tsx';
import { Select } from '../../../components/ui/select.tsx';
import type { CorrectionDraft } from '../correction-draft.ts';
import { FIELD_WORDS } from '../own-words.ts';

const OPTIONS = CORRECTED_FIELDS.map((field) => ({ value: field, label: FIELD_WORDS[field] }));

type CorrectionFieldsProps = {
  readonly draft: CorrectionDraft;
  readonly error: string | undefined;
  readonly onChange: (draft: CorrectionDraft) => void;
};

/** Which fact is wrong, and what it should be. */
export function CorrectionFields({ draft, error, onChange }: CorrectionFieldsProps) {
  return (
    <div className="mb-3 flex flex-wrap gap-4">
      <Select
        label="Which fact?"
        options={OPTIONS}
        value={draft.field}
        onChange={({ target }) => {
          const field = CORRECTED_FIELDS.find((one) => one === target.value);
          if (field !== undefined) onChange({ ...draft, field });
        }}
      />
      <Field
        label="What should it say?"
        autoComplete="off"
        maxLength={BUILDING_TEXT.text}
        value={draft.value}
        error={error}
        onChange={({ target }) => {
          onChange({ ...draft, value: target.value });
        }}
      />
    </div>
  );
}
