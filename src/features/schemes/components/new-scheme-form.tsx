import { zodResolver } from '@hookform/resolvers/zod';
import { useForm, useWatch } from 'react-hook-form';
import { newSchemeSchema, type SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import { PATHS } from '../../../config/paths.ts';
import { showFieldFaults } from '../../../lib/form-errors.ts';
import { CrsPicker } from '../../crs/components/crs-picker.tsx';
import { useCreateScheme } from '../api/create-scheme.ts';

/** Name, description and the system that everything is drawn in. */
export function NewSchemeForm({ onMade }: { readonly onMade: (scheme: SchemeAnswer) => void }) {
  const create = useCreateScheme();
  const form = useForm({
    resolver: zodResolver(newSchemeSchema),
    defaultValues: { name: '', description: '' },
  });
  const { errors } = form.formState;
  const crs = useWatch({ control: form.control, name: 'crs' });
  const submit = form.handleSubmit((scheme) => {
    create.mutate(scheme, {
      onSuccess: onMade,
      onError: (error) => {
        showFieldFaults(error, form, ['name', 'description', 'crs']);
      },
    });
  });
  return (
    <form noValidate className="grid max-w-[620px] gap-4" onSubmit={(event) => void submit(event)}>
      <MutationError
        failed="The scheme was not made."
        error={create.error}
        shown={['name', 'description', 'crs']}
      />
      <Field label="Name" error={errors.name?.message} {...form.register('name')} />
      <TextArea
        label="Description"
        hint="What is to be driven and where, for who reads the list of schemes."
        error={errors.description?.message}
        {...form.register('description')}
      />
      <CrsPicker
        value={crs}
        error={errors.crs?.type === 'invalid_type' ? 'Choose one.' : errors.crs?.message}
        onChange={(code) => {
          if (code === undefined) form.resetField('crs');
          else form.setValue('crs', code, { shouldValidate: true });
        }}
      />
      <div className="flex gap-2">
        <Button kind="main" type="submit" busy={create.isPending}>
          Make the scheme
        </Button>
        <ButtonLink to={PATHS.schemes}>Leave it</ButtonLink>
      </div>
    </form>
  );
}
