import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Link } from 'react-router-dom';
import { changePersonSchema, type PersonAnswer } from '../../../../shared/schemas/people.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Checkbox } from '../../../components/ui/checkbox.tsx';
import { DoneNote } from '../../../components/ui/done-note.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { settingsPath } from '../../../config/paths.ts';
import { showFieldFaults } from '../../../lib/form-errors.ts';
import { useChangePerson } from '../api/change-person.ts';
import { partsOf } from '../person-words.ts';
import { SendAgain } from './send-again.tsx';

function Parts({ person }: { readonly person: PersonAnswer }) {
  const parts = partsOf(person);
  if (parts.length === 0) return <p className="text-ink-2">In no scheme yet.</p>;
  return (
    <ul>
      {parts.map(({ schemeId, schemeName, roles }) => (
        <li key={schemeId} className="border-b border-hairline py-1 last:border-0">
          <Link to={settingsPath(schemeId, 'people')}>{schemeName}</Link>
          <span className="text-ink-2"> {roles.join(', ')}</span>
        </li>
      ))}
    </ul>
  );
}

function PersonForm({ person }: { readonly person: PersonAnswer }) {
  const change = useChangePerson(person.id);
  const form = useForm({
    resolver: zodResolver(changePersonSchema),
    defaultValues: { name: person.name, isAdministrator: person.isAdministrator },
  });
  const submit = form.handleSubmit((values) => {
    change.mutate(values, {
      onError: (error) => {
        showFieldFaults(error, form, ['name', 'isAdministrator']);
      },
    });
  });
  return (
    <form noValidate className="grid gap-3" onSubmit={(event) => void submit(event)}>
      <MutationError failed="The person was not changed." error={change.error} shown={['name']} />
      <Field label="Name" error={form.formState.errors.name?.message} {...form.register('name')} />
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
    </form>
  );
}

/** What can be changed about a person, and where they take part. */
export function PersonDetail({ person }: { readonly person: PersonAnswer }) {
  return (
    <div className="sticky left-(--edge) grid max-w-[min(760px,calc(100vw-32px))] grid-cols-2 gap-x-8 gap-y-4 text-small whitespace-normal max-sm:grid-cols-1">
      <PersonForm person={person} />
      <div className="grid content-start gap-3">
        <h2 className="text-small">Takes part in</h2>
        <Parts person={person} />
        {person.abilities.invite && <SendAgain person={person} />}
      </div>
    </div>
  );
}
