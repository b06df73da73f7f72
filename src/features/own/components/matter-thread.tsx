import type { OwnMatter } from '../../../../shared/schemas/matter-answers.ts';
import { formatDay, formatWeekday } from '../../../lib/format-date.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useOwnZone } from '../hooks/use-own-zone.ts';
import { matterPhotographPath } from '../api/send-matter.ts';
import { kindWords, STATE_WORDS } from '../own-words.ts';
import { ReplyForm } from './reply-form.tsx';

type Message = OwnMatter['messages'][number];

function MessageItem({
  matter,
  message,
}: {
  readonly matter: OwnMatter;
  readonly message: Message;
}) {
  const scheme = useScheme();
  const zone = useOwnZone();
  const { side, text, writtenAt, photographs } = message;
  return (
    <li className={side === 'team' ? 'mt-2 border-l-4 border-ink pl-3' : 'mt-2'}>
      <b className="block text-lead font-semibold">
        {`${side === 'team' ? 'We answered' : 'You wrote'} on ${formatDay(writtenAt, zone)}`}
      </b>
      <p className="max-w-[34em] break-words whitespace-pre-line">{text}</p>
      {photographs
        .filter(({ hasArrived }) => hasArrived)
        .map(({ id, caption }, k) => (
          <img
            key={id}
            src={matterPhotographPath(scheme.id, matter.id, id)}
            alt={caption || `Photograph ${k + 1}`}
            className="mt-2 mr-2 inline-block h-28"
          />
        ))}
    </li>
  );
}

type MatterThreadProps = { readonly matter: OwnMatter; readonly mayAnswer: boolean };

/** Something that an owner brought up, where it stands, and what was written on both sides. */
export function MatterThread({ matter, mayAnswer }: MatterThreadProps) {
  const { kind, title, state, due, messages } = matter;
  return (
    <details className="border-b border-hairline">
      <summary className="min-h-touch py-2">
        <b className="font-semibold break-words">{title}</b>
        <span className="block text-lead text-ink-2">
          {`${kindWords(kind)}. ${STATE_WORDS[state]}.`}
          {state === 'open' && ` Someone will answer by ${formatWeekday(due)}.`}
        </span>
      </summary>
      <div className="pb-4">
        <ol>
          {messages.map((message) => (
            <MessageItem key={message.id} matter={matter} message={message} />
          ))}
        </ol>
        {mayAnswer && state !== 'closed' && <ReplyForm matter={matter} />}
      </div>
    </details>
  );
}
