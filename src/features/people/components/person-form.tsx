import { zodResolver } from '@hookform/resolvers/zod';
import { use, useState, type ComponentProps } from 'react';
import { useForm, type UseFormReturn } from 'react-hook-form';
import type { z } from 'zod';
import { changePersonSchema, type PersonAnswer } from '../../../../shared/schemas/people.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { DoneNote } from '../../../components/ui/done-note.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { showFieldFaults } from '../../../lib/form-errors.ts';
import { PersonContext } from '../../session/person-context.ts';
import { useChangePerson } from '../api/change-person.ts';

type Change = z.infer<typeof changePersonSchema>;

/** Whether a change takes one's own administrator's right, which one cannot give oneself again. */
function useGivesUpOwnRight(person: PersonAnswer): (change: Change) => boolean {
  const isMine = use(PersonContext)?.id === person.id;
  return ({ isAdministrator }) => isMine && person.isAdministrator && isAdministrator === false;
}

function valuesOf({ name, email, isAdministrator, abilities }: PersonAnswer): Change {
  return { name, isAdministrator, ...(abilities.changeEmail && { email }) };
}

function OwnRightQuestion(
  props: Pick<ComponentProps<typeof ConfirmDialog>, 'open' | 'onConfirm' | 'onClose'>,
) {
  return (
    <ConfirmDialog {...props} title="Give up being administrator?" doIt="Give it up">
      <p>
        You lose the pages for people, audit and new schemes at once. Only another administrator can
        make you one again.
      </p>
    </ConfirmDialog>
  );
}

function AddressField({ form }: { readonly form: UseFormReturn<Change> }) {
  return (
    <Field
      label="E-mail"
      type="email"
      autoComplete="off"
      hint="Another address ends the link that went to this one."
      error={form.formState.errors.email?.message}
      {...form.register('email')}
    />
  );
}

/** Name, rights, and the address of somebody who has not accepted yet. */
export function PersonForm({ person }: { readonly person: PersonAnswer }) {
  const change = useChangePerson(person.id);
  const givesUpOwnRight = useGivesUpOwnRight(person);
  const [asked, setAsked] = useState<Change>();
  const form = useForm({
    resolver: zodResolver(changePersonSchema),
    defaultValues: valuesOf(person),
  });
  const { errors } = form.formState;
  function save(values: Change) {
    setAsked(undefined);
    change.mutate(values, {
      onError: (error) => {
        showFieldFaults(error, form, ['name', 'email', 'isAdministrator']);
      },
    });
  }
  const submit = form.handleSubmit((values) => {
    if (givesUpOwnRight(values)) setAsked(values);
    else save(values);
  });
  return (
    <form noValidate className="grid content-start gap-3" onSubmit={(event) => void submit(event)}>
      <MutationError
        failed="The person was not changed."
        error={change.error}
        shown={['name', 'email']}
      />
      <Field label="Name" error={errors.name?.message} {...form.register('name')} />
      {person.abilities.changeEmail && <AddressField form={form} />}
      <Checkbox
        label="Administrator"
        hint="Sees every scheme, and manages schemes, people and rules."
        {...form.register('isAdministrator')}
      />
      <div className="flex items-center gap-3">
        <Button type="submit" busy={change.isPending}>
          Save
        </Button>
        {change.isSuccess && <DoneNote>Saved.</DoneNote>}
      </div>
      <OwnRightQuestion
        open={asked !== undefined}
        onConfirm={() => {
          if (asked !== undefined) save(asked);
        }}
        onClose={() => {
          setAsked(undefined);
        }}
      />
    </form>
  );
}
