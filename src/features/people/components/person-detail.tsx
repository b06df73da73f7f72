import { Link } from 'react-router-dom';
import type { PersonAnswer } from '../../../../shared/schemas/people.ts';
import { settingsPath } from '../../../config/paths.ts';
import { partsOf } from '../person-words.ts';
import { PersonAccess } from './person-access.tsx';
import { PersonForm } from './person-form.tsx';
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

/** What can be changed about a person, and where they take part. */
export function PersonDetail({ person }: { readonly person: PersonAnswer }) {
  return (
    <div className="sticky left-(--edge) grid max-w-[min(760px,calc(100vw-32px))] grid-cols-2 gap-x-8 gap-y-4 text-small whitespace-normal max-sm:grid-cols-1">
      <PersonForm person={person} />
      <div className="grid content-start gap-3">
        <h2 className="text-small">Takes part in</h2>
        <Parts person={person} />
        {person.abilities.invite && <SendAgain person={person} />}
        <PersonAccess person={person} />
      </div>
    </div>
  );
}
