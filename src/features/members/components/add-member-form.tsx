import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { Link } from 'react-router-dom';
import { z } from 'zod';
import type { MemberAnswer } from '../../../../shared/schemas/members.ts';
import { ROLES, roleSchema } from '../../../../shared/schemas/roles.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { PATHS } from '../../../config/paths.ts';
import { peopleQuery } from '../../people/api/list-people.ts';
import { useChangeMember } from '../api/change-member.ts';
import { ROLE_TASKS, roleName } from '../roles-in-words.ts';

const schema = z.object({ personId: z.uuid('Choose a person.'), role: roleSchema });

const ROLE_OPTIONS = ROLES.map((role) => ({
  value: role,
  label: `${roleName(role)}: ${ROLE_TASKS[role]}`,
}));

type AddMemberFormProps = {
  readonly schemeId: string;
  readonly members: readonly MemberAnswer[];
};

/** Brings somebody who has an account into the scheme. */
export function AddMemberForm({ schemeId, members }: AddMemberFormProps) {
  const { data: people = [] } = useQuery(peopleQuery);
  const change = useChangeMember(schemeId);
  const form = useForm<z.infer<typeof schema>>({
    resolver: zodResolver(schema),
    defaultValues: { personId: '', role: 'assessor' },
  });
  const inside = new Set(members.map(({ person }) => person.id));
  const outside = people.filter(({ id }) => !inside.has(id));
  const submit = form.handleSubmit(({ personId, role }) => {
    change.mutate(
      { personId, roles: [role] },
      {
        onSuccess: () => {
          form.reset();
        },
      },
    );
  });
  return (
    <form noValidate className="mt-3.5 grid gap-3.5" onSubmit={(event) => void submit(event)}>
      <MutationError failed="Nobody was added." error={change.error} />
      <Select
        label="Person"
        unchosen={outside.length === 0 ? 'Everybody is in it already' : 'Choose a person'}
        options={outside.map(({ id, name, email }) => ({ value: id, label: `${name}, ${email}` }))}
        error={form.formState.errors.personId?.message}
        {...form.register('personId')}
      />
      <Select label="Role" options={ROLE_OPTIONS} {...form.register('role')} />
      <Button kind="main" type="submit" busy={change.isPending} className="justify-self-start">
        Add to the scheme
      </Button>
      <p className="text-small text-ink-2">
        Not in the list? <Link to={PATHS.people}>Invite them</Link> with their first role.
      </p>
    </form>
  );
}
