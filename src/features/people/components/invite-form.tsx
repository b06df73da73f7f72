import { zodResolver } from '@hookform/resolvers/zod';
import { useState, type ComponentProps } from 'react';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { newPersonSchema } from '../../../../shared/schemas/people.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { draftSchema } from '../../../lib/draft-schema.ts';
import { showFieldFaults } from '../../../lib/form-errors.ts';
import type { Invitation } from '../invitation.ts';
import { useInvitePerson } from '../api/invite-person.ts';
import { LetterNote } from './letter-note.tsx';
import { MembershipFields } from './membership-fields.tsx';

type NewPerson = z.output<typeof newPersonSchema>;

const NO_MEMBERSHIP = { schemeId: '', role: 'assessor' } as const;
const EMPTY: Invitation = {
  name: '',
  email: '',
  isAdministrator: false,
  memberships: [NO_MEMBERSHIP],
};

/** A line on which no scheme is chosen says nothing. */
function withoutBlanks(invitation: Invitation): Invitation {
  const memberships = invitation.memberships.filter(({ schemeId }) => schemeId !== '');
  return { ...invitation, memberships };
}

function seesNothing({ isAdministrator, memberships }: NewPerson): boolean {
  return !isAdministrator && memberships.length === 0;
}

const invitationSchema = draftSchema(newPersonSchema, withoutBlanks);

function NothingToSeeQuestion(
  props: Pick<ComponentProps<typeof ConfirmDialog>, 'open' | 'onConfirm' | 'onClose'>,
) {
  return (
    <ConfirmDialog {...props} title="Invite without a scheme?" doIt="Send the invitation">
      <p>They will see nothing yet: no scheme is chosen, and they are not administrator.</p>
    </ConfirmDialog>
  );
}

/** Adds a person with what they will be, and sends them a letter. */
export function InviteForm() {
  const invite = useInvitePerson();
  const form = useForm({ defaultValues: EMPTY, resolver: zodResolver(invitationSchema) });
  const { errors } = form.formState;
  const [asked, setAsked] = useState<NewPerson>();
  function send(invitation: NewPerson) {
    setAsked(undefined);
    invite.mutate(invitation, {
      onSuccess: () => {
        form.reset();
      },
      onError: (error) => {
        showFieldFaults(error, form, ['name', 'email']);
      },
    });
  }
  const submit = form.handleSubmit((invitation) => {
    if (seesNothing(invitation)) setAsked(invitation);
    else send(invitation);
  });
  return (
    <form noValidate className="mt-3.5 grid gap-3.5" onSubmit={(event) => void submit(event)}>
      <MutationError failed="Nobody was invited." error={invite.error} shown={['name', 'email']} />
      <Field
        label="Name"
        autoComplete="off"
        error={errors.name?.message}
        {...form.register('name')}
      />
      <Field
        label="E-mail"
        type="email"
        autoComplete="off"
        error={errors.email?.message}
        {...form.register('email')}
      />
      <MembershipFields form={form} blank={NO_MEMBERSHIP} />
      <Checkbox
        label="Administrator"
        hint="Sees every scheme, and manages schemes, people and rules."
        {...form.register('isAdministrator')}
      />
      <Button kind="main" type="submit" busy={invite.isPending} className="justify-self-start">
        Send the invitation
      </Button>
      <NothingToSeeQuestion
        open={asked !== undefined}
        onConfirm={() => {
          if (asked !== undefined) send(asked);
        }}
        onClose={() => {
          setAsked(undefined);
        }}
      />
      {invite.data !== undefined && <LetterNote person={invite.data} />}
    </form>
  );
}
