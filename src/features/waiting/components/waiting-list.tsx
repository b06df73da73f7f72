import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { StateShape } from '../../../components/ui/state-mark.tsx';
import { formatDay } from '../../../lib/format-date.ts';
import type { WaitingItem } from '../../../../shared/schemas/waiting.ts';
import { waitingButton } from '../waiting-words.ts';

function WaitingRow({ item }: { readonly item: WaitingItem }) {
  return (
    <li className="grid min-h-[56px] grid-cols-[22px_44px_minmax(0,1fr)_auto_104px] items-center border-b border-hairline py-2 max-sm:grid-cols-[20px_minmax(0,auto)_minmax(0,1fr)] max-sm:gap-y-1.5">
      <StateShape state={item.kind === 'invitations-not-accepted' ? 'in-hand' : 'not-started'} />
      <b className="pr-3.5 text-right text-count leading-none font-bold">{item.count}</b>
      <span className="pr-4 text-roomy font-semibold text-balance">{item.text}</span>
      <span className="pr-5 text-small whitespace-nowrap text-ink-2 max-sm:col-start-3">
        Since {formatDay(item.since)}
      </span>
      <ButtonLink to={item.link} className="max-sm:col-start-3 max-sm:justify-self-start">
        {waitingButton(item.kind)}
      </ButtonLink>
    </li>
  );
}

/** What waits in one place: shape, count, thing, since when, and one button. */
export function WaitingList({ items }: { readonly items: readonly WaitingItem[] }) {
  if (items.length === 0) {
    return (
      <p className="border-b border-hairline py-3.5 text-small text-ink-2">Nothing waits here.</p>
    );
  }
  return (
    <ul>
      {items.map((item) => (
        <WaitingRow key={item.kind} item={item} />
      ))}
    </ul>
  );
}
