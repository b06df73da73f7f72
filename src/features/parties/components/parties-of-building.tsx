import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { capital } from '../../../../shared/presentation/capital.ts';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { partyPath } from '../../../config/paths.ts';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { partiesQuery } from '../api/list-parties.ts';
import { daysWords } from '../party-words.ts';
import { PartyName } from './party-name.tsx';

/** Who holds which interest in a building, for those who write to them. */
export function PartiesOfBuilding({ buildingId }: { readonly buildingId: number }) {
  const scheme = useScheme();
  const mayRead = can(scheme, 'readParties');
  const { data, error } = useQuery({
    ...partiesQuery(scheme.id, { building: buildingId }),
    enabled: mayRead,
  });
  if (!mayRead) return null;
  return (
    <Panel title="Parties" className="print:hidden">
      <MutationError failed="Parties could not be fetched." error={error} />
      {data?.found === 0 && <p className="mt-2 text-small text-ink-2">None known yet.</p>}
      <ul>
        {data?.parties.map(({ id, name, interests }) => {
          const held = interests.filter(({ building }) => building.id === buildingId);
          const words = held.map((one) => `${capital(one.kind)} ${daysWords(one)}`.trim());
          return (
            <li key={id} className="border-b border-hairline py-1.5 text-small last:border-0">
              <Link to={partyPath(scheme.id, id)} className="line-clamp-2 break-words">
                <PartyName name={name} />
              </Link>
              <span className="text-ink-2">{words.join(', ')}</span>
            </li>
          );
        })}
      </ul>
    </Panel>
  );
}
