import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { newPersonSchema } from '../../../../shared/schemas/people.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { draftSchema } from '../../../lib/draft-schema.ts';
import { showFieldFaults } from '../../../lib/form-errors.ts';
import type { Invitation } from '../invitation.ts';
import { useInvitePerson } from '../api/invite-person.ts';
import { LetterNote } from './letter-note.tsx';
import { MembershipFields } from './membership-fields.tsx';

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

const invitationSchema = draftSchema(newPersonSchema, withoutBlanks);

/** Adds a person with what they will be, and sends them a letter. */
export function InviteForm() {
  const invite = useInvitePerson();
  const form = useForm({ defaultValues: EMPTY, resolver: zodResolver(invitationSchema) });
  const { errors } = form.formState;
  const submit = form.handleSubmit((invitation) => {
    invite.mutate(invitation, {
      onSuccess: () => {
        form.reset();
      },
      onError: (error) => {
        showFieldFaults(error, form, ['name', 'email']);
      },
    });
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
      {invite.data !== undefined && <LetterNote invited={invite.data} />}
    </form>
  );
}
