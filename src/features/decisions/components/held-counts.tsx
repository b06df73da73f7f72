import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { registerOfResults } from '../../register/register-of-results.ts';
import { usePerson } from '../../session/person-context.ts';
import { funnelQuery } from '../api/get-funnel.ts';

const COUNT =
  'inline-flex h-[26px] items-center gap-1.5 rounded px-2 hover:bg-paper-sunk max-sm:h-9';

type HeldCountsProps = { readonly schemeId: string; readonly runId: string };

/** How many buildings each rule holds, and how many are the person's own; each number leads to them. */
export function HeldCounts({ schemeId, runId }: HeldCountsProps) {
  const { data } = useQuery(funnelQuery(schemeId, runId));
  const { name: mine } = usePerson();
  if (data === undefined) return null;
  return (
    <>
      {data.heldBy.length > 0 && <span className="ml-2 text-ink-2">Held because</span>}
      {data.heldBy.map(({ name, count, texts }) => (
        <Link
          key={name}
          to={registerOfResults(schemeId, { any: { heldBy: texts } })}
          className={COUNT}
        >
          {name} <span className="text-ink-2">{formatCount(count)}</span>
        </Link>
      ))}
      {data.mine > 0 && (
        <Link to={registerOfResults(schemeId, { any: { assignedTo: [mine] } })} className={COUNT}>
          Mine <span className="text-ink-2">{formatCount(data.mine)}</span>
        </Link>
      )}
    </>
  );
}
