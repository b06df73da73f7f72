import type { Matter } from '../../../../shared/schemas/matter-answers.ts';
import { PhotographList } from '../../../components/ui/photograph-list.tsx';
import { classNames } from '../../../lib/class-names.ts';
import { formatMoment } from '../../../lib/format-date.ts';
import { countWords } from '../../visits/visit-words.ts';
import { teamPhotographPath } from '../api/photograph-path.ts';

type Message = Matter['messages'][number];

const SIDES: Readonly<Record<Message['side'], string>> = {
  owner: 'Owner',
  team: 'Answer',
  note: 'Note, inside the team',
};

type OneMessageProps = {
  readonly schemeId: string;
  readonly matterId: string;
  readonly message: Message;
};

function OneMessage({ schemeId, matterId, message }: OneMessageProps) {
  const { side, by, text, writtenAt, photographs } = message;
  const there = photographs.filter(({ hasArrived }) => hasArrived);
  const missing = photographs.length - there.length;
  return (
    <li
      className={classNames(
        'border-l-4 px-3 py-2 [&+&]:mt-3',
        side === 'owner' && 'border-clay bg-paper-raised',
        side === 'team' && 'border-ink bg-paper-raised',
        side === 'note' && 'border-rule bg-paper-sunk',
      )}
    >
      <p className="text-small text-ink-2">
        <b className="font-semibold text-ink">{SIDES[side]}</b> · {by} · {formatMoment(writtenAt)}
      </p>
      <p className="mt-1 max-w-[72ch] text-body break-words whitespace-pre-line" dir="auto">
        {text}
      </p>
      {there.length > 0 && (
        <PhotographList
          photographs={there.map(({ id, caption }) => ({
            ...{ id, caption },
            href: teamPhotographPath(schemeId, matterId, id),
          }))}
        />
      )}
      {missing > 0 && (
        <p className="mt-1 text-cap text-ink-3">
          {countWords(missing, 'photograph')} announced, not here yet.
        </p>
      )}
    </li>
  );
}

/** Everything that was written, the oldest first. */
export function MessageList({
  schemeId,
  matter,
}: {
  readonly schemeId: string;
  readonly matter: Matter;
}) {
  return (
    <ol aria-label="What was written">
      {matter.messages.map((message) => (
        <OneMessage key={message.id} {...{ schemeId, message }} matterId={matter.id} />
      ))}
    </ol>
  );
}
