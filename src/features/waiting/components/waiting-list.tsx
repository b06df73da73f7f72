import type { WaitingItem } from '../../../../shared/schemas/waiting.ts';
import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { StateShape, type State } from '../../../components/ui/state-mark.tsx';
import { formatDaySince } from '../../../lib/format-date.ts';
import { waitingButton, waitingThing } from '../waiting-words.ts';

const SHAPES: Readonly<Partial<Record<WaitingItem['kind'], State>>> = {
  'invitations-not-accepted': 'in-hand',
  'decisions-to-check': 'waiting',
  'decisions-returned': 'in-hand',
  'decisions-again': 'visit',
  'matters-waiting': 'waiting',
  'appointments-asked': 'in-hand',
  'undertakings-overdue': 'visit',
};

function WaitingRow({ item }: { readonly item: WaitingItem }) {
  const state = SHAPES[item.kind] ?? 'not-started';
  return (
    <li className="grid min-h-[56px] grid-cols-[22px_44px_minmax(0,1fr)_132px_112px] items-center border-b border-hairline py-2 max-sm:grid-cols-[20px_32px_minmax(0,1fr)_auto] max-sm:gap-y-1.5">
      <StateShape state={state} />
      <b className="pr-3.5 text-right text-count leading-none font-bold max-sm:text-left">
        {item.count}
      </b>
      <span className="pr-4 max-sm:col-span-2 max-sm:pr-0">
        <span className="block text-roomy font-semibold">{waitingThing(item)}</span>
        <span className="block text-small text-ink-2">{item.text}</span>
      </span>
      <span className="text-small whitespace-nowrap text-ink-2 max-sm:col-start-3">
        Since {formatDaySince(item.since, new Date())}
      </span>
      <ButtonLink to={item.link} className="w-28">
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
