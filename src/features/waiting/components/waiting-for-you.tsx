import { Link } from 'react-router-dom';
import type { WaitingAnswer } from '../../../../shared/schemas/waiting.ts';
import { Panel } from '../../../components/ui/panel.tsx';
import { schemePath } from '../../../config/paths.ts';
import { yourRoles } from '../../members/roles-in-words.ts';
import { WaitingList } from './waiting-list.tsx';

/** What waits for the person: what belongs to no scheme first, then scheme by scheme. */
export function WaitingForYou({ waiting }: { readonly waiting: WaitingAnswer }) {
  const open = waiting.schemes.filter(({ scheme }) => scheme.archivedAt === null);
  return (
    <>
      {waiting.general.length > 0 && (
        <Panel title="People" note="in no scheme yet">
          <WaitingList items={waiting.general} />
        </Panel>
      )}
      {open.map(({ scheme, roles, waiting: items }) => (
        <Panel
          key={scheme.id}
          title={scheme.name}
          note={yourRoles(roles)}
          action={
            <Link
              to={schemePath(scheme.id)}
              className="max-sm:-my-3.5 max-sm:inline-block max-sm:py-3.5"
            >
              Open the scheme
            </Link>
          }
        >
          <WaitingList items={items} />
        </Panel>
      ))}
    </>
  );
}
