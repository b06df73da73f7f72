import { zodResolver } from '@hookform/resolvers/zod';
import { useEffect } from 'react';
import { useForm } from 'react-hook-form';
import { changeSchemeSchema, type SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ConflictChoice } from '../../../components/ui/conflict-choice.tsx';
import { DoneNote } from '../../../components/ui/done-note.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import { UnsavedEdits } from '../../../components/ui/unsaved-edits.tsx';
import { isRefusal } from '../../../lib/api-error.ts';
import { changesBetween } from '../../../lib/changes-between.ts';
import { showFieldFaults } from '../../../lib/form-errors.ts';
import { useChangeScheme } from '../api/change-scheme.ts';

const FASTER = 'Somebody else changed it meanwhile. What you wrote is still here.';

function valuesOf({ version, name, description }: SchemeAnswer) {
  return { version, name, description };
}

function inWords({
  name = '',
  description = '',
}: {
  name?: string | undefined;
  description?: string | undefined;
}) {
  return { Name: name, Description: description };
}

/** The form of a scheme. While something is written in it, a newer scheme does not take its place. */
function useDescription(scheme: SchemeAnswer) {
  const form = useForm({
    resolver: zodResolver(changeSchemeSchema),
    defaultValues: valuesOf(scheme),
  });
  const { isDirty, defaultValues: base = {} } = form.formState;
  useEffect(() => {
    if (!isDirty) form.reset(valuesOf(scheme));
  }, [form, isDirty, scheme]);

  /** Lays what was written on the newest scheme; what was not touched is theirs. */
  function rebase() {
    const mine = form.getValues();
    form.reset(valuesOf(scheme));
    for (const field of ['name', 'description'] as const) {
      const written = mine[field];
      if (written !== base[field]) form.setValue(field, written, { shouldDirty: true });
    }
  }
  return { form, base, isDirty, rebase };
}

/** The name and the description of a scheme. */
export function DescriptionForm({ scheme }: { readonly scheme: SchemeAnswer }) {
  const change = useChangeScheme(scheme.id);
  const { form, base, isDirty, rebase } = useDescription(scheme);
  const { errors } = form.formState;
  const isLate = isRefusal(change.error, 'conflict');
  const submit = form.handleSubmit((values) => {
    change.mutate(values, {
      onSuccess: (saved) => {
        form.reset(valuesOf(saved));
      },
      onError: (error) => {
        showFieldFaults(error, form, ['name', 'description']);
      },
    });
  });
  return (
    <form noValidate className="mt-2 grid gap-4" onSubmit={(event) => void submit(event)}>
      <UnsavedEdits hasEdits={isDirty} />
      <MutationError
        failed="The scheme was not changed."
        error={change.error}
        shown={['name', 'description']}
        stands={isLate ? FASTER : undefined}
        action={
          isLate && scheme.version !== base.version ? (
            <ConflictChoice
              changes={changesBetween(inWords(base), inWords(scheme))}
              onKeepMine={() => {
                rebase();
                change.reset();
              }}
            />
          ) : undefined
        }
      />
      <Field label="Name" error={errors.name?.message} {...form.register('name')} />
      <TextArea
        label="Description"
        rows={5}
        error={errors.description?.message}
        {...form.register('description')}
      />
      <div className="flex items-center gap-3">
        <Button kind="main" type="submit" busy={change.isPending}>
          Save
        </Button>
        {change.isSuccess && !isDirty && <DoneNote>Saved.</DoneNote>}
      </div>
    </form>
  );
}
