import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { changeSchemeSchema, type SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { Button } from '../../../components/ui/button.tsx';
import { DoneNote } from '../../../components/ui/done-note.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import { showFieldFaults } from '../../../lib/form-errors.ts';
import { useChangeScheme } from '../api/change-scheme.ts';

/** The name and the description of a scheme. */
export function DescriptionForm({ scheme }: { readonly scheme: SchemeAnswer }) {
  const { id, version, name, description } = scheme;
  const change = useChangeScheme(id);
  const form = useForm({
    resolver: zodResolver(changeSchemeSchema),
    values: { version, name, description },
  });
  const { errors } = form.formState;
  const submit = form.handleSubmit((values) => {
    change.mutate(values, {
      onError: (error) => {
        showFieldFaults(error, form, ['name', 'description']);
      },
    });
  });
  return (
    <form noValidate className="mt-2 grid gap-4" onSubmit={(event) => void submit(event)}>
      <MutationError
        failed="The scheme was not changed."
        error={change.error}
        shown={['name', 'description']}
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
        {change.isSuccess && !form.formState.isDirty && <DoneNote>Saved.</DoneNote>}
      </div>
    </form>
  );
}
