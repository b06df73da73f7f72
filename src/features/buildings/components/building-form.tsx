import { zodResolver } from '@hookform/resolvers/zod';
import type { ChangeEvent } from 'react';
import { useForm, type UseFormReturn } from 'react-hook-form';
import {
  BUILDING_FIELD_NAMES,
  type BuildingField,
} from '../../../../shared/schemas/building-fields.ts';
import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import type { RegisterChange } from '../../../../shared/schemas/register-changes.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { UnsavedEdits } from '../../../components/ui/unsaved-edits.tsx';
import { useSensitivityReasons } from '../../rules/hooks/use-sensitivity-reasons.ts';
import {
  buildingDraftSchema,
  draftOf,
  draftOfWritten,
  type BuildingDraft,
  type WrittenBuilding,
} from '../building-draft.ts';
import { useEditBuilding } from '../hooks/use-edit-building.ts';
import { reasonsFor, scoreOfReason } from '../scored-reasons.ts';
import { AttributeField } from './attribute-field.tsx';
import { ClashChoice } from './clash-choice.tsx';

type BuildingFormProps = {
  readonly schemeId: string;
  readonly building: BuildingAnswer;
  /** Given the change, or null where there was nothing to change. */
  readonly onSaved: (change: RegisterChange | null) => void;
  readonly onCancel: () => void;
};

/** Stays in view under a form that is longer than its place. */
function FormFoot({ busy, onCancel }: { readonly busy: boolean; readonly onCancel: () => void }) {
  return (
    <>
      <p className="mt-2 text-cap text-ink-3">What is left empty is not known.</p>
      <div className="sticky bottom-0 z-10 -mx-4 mt-3 flex gap-2 border-t border-hairline bg-paper px-4 py-3">
        <Button kind="main" type="submit" busy={busy}>
          Save
        </Button>
        <Button onClick={onCancel}>Leave it as it is</Button>
      </div>
    </>
  );
}

/** Their words are long. */
const WIDE: ReadonlySet<BuildingField> = new Set(['address', 'structureReason', 'featuresReason']);

type FormFieldsProps = {
  readonly form: UseFormReturn<BuildingDraft, unknown, WrittenBuilding>;
};

/** Every field; a reason of the scheme's table brings its score along. */
function FormFields({ form }: FormFieldsProps) {
  const reasons = useSensitivityReasons();
  const { errors, isSubmitted } = form.formState;
  function fillInScore(field: BuildingField, written: string) {
    const scored = scoreOfReason(field, written, reasons);
    if (scored === undefined) return;
    form.setValue(`attributes.${scored.field}`, scored.score, {
      shouldDirty: true,
      shouldValidate: isSubmitted,
    });
  }
  return (
    <div className="grid grid-cols-2 gap-x-4 gap-y-2.5">
      <Field
        label="Reference"
        autoFocus
        autoComplete="off"
        error={errors.reference?.message}
        {...form.register('reference')}
      />
      {BUILDING_FIELD_NAMES.map((field) => {
        const words = reasonsFor(field, reasons);
        return (
          <AttributeField
            key={field}
            {...{ field, words }}
            hint={words && 'A reason of the scheme brings its score.'}
            error={errors.attributes?.[field]?.message}
            frameClassName={WIDE.has(field) ? 'col-span-2' : ''}
            {...form.register(`attributes.${field}`, {
              onChange: ({ target }: ChangeEvent<HTMLInputElement>) => {
                fillInScore(field, target.value);
              },
            })}
          />
        );
      })}
    </div>
  );
}

/** Changes the reference and the values of a building. What is left empty is not known. */
export function BuildingForm({ schemeId, building, onSaved, onCancel }: BuildingFormProps) {
  const edit = useEditBuilding(schemeId, building, onSaved);
  const form = useForm({
    resolver: zodResolver(buildingDraftSchema),
    defaultValues: draftOf(building),
  });
  const { isDirty } = form.formState;
  const submit = form.handleSubmit(edit.save);
  if (edit.clash !== null) {
    const { clash, busy, settle, leaveClash } = edit;
    const back = () => {
      const written = leaveClash();
      if (written !== null) form.reset(draftOfWritten(written));
    };
    return (
      <>
        <UnsavedEdits hasEdits />
        <ClashChoice {...{ clash, busy }} onSave={settle} onBack={back} />
      </>
    );
  }
  return (
    <>
      <UnsavedEdits hasEdits={isDirty} />
      <form
        noValidate
        aria-label={`Change ${building.reference}`}
        onSubmit={(event) => void submit(event)}
        onKeyDown={(event) => {
          if (event.key === 'Escape') onCancel();
        }}
        className="mt-3 [&_input]:scroll-mb-24"
      >
        <MutationError failed="The building was not changed." error={edit.error} />
        <FormFields form={form} />
        <FormFoot busy={edit.busy} onCancel={onCancel} />
      </form>
    </>
  );
}
