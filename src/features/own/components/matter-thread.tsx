import { useState, type SubmitEvent } from 'react';
import type { OwnMatter } from '../../../../shared/schemas/matter-answers.ts';
import { MATTER_LIMITS, ownMessageSchema } from '../../../../shared/schemas/matters.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import { formatDay, formatWeekday } from '../../../lib/format-date.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { matterPhotographPath, useSendMatter } from '../api/send-matter.ts';
import { kindWords, STATE_WORDS } from '../own-words.ts';

function Reply({ matter }: { readonly matter: OwnMatter }) {
  const scheme = useScheme();
  const [id, setId] = useState(() => crypto.randomUUID());
  const [text, setText] = useState('');
  const [fault, setFault] = useState<string>();
  const sending = useSendMatter(scheme.id, () => {
    setId(crypto.randomUUID());
    setText('');
  });
  function send(event: SubmitEvent) {
    event.preventDefault();
    const parsed = ownMessageSchema.safeParse({ id, text, photographs: [] });
    setFault(parsed.error?.issues[0]?.message);
    if (!parsed.success || sending.isPending) return;
    sending.mutate({ matter: { ...parsed.data, matterId: matter.id }, photographs: [] });
  }
  return (
    <form noValidate onSubmit={send} className="mt-3 print:hidden">
      <TextArea
        label="Write again about this"
        rows={3}
        maxLength={MATTER_LIMITS.text}
        value={text}
        error={fault}
        onChange={({ target }) => {
          setText(target.value);
        }}
      />
      <MutationError
        failed="It has not been sent."
        stands="What you wrote is still here. Please try again."
        error={sending.error}
      />
      <Button type="submit" className="mt-2" busy={sending.isPending}>
        Send
      </Button>
      <p role="status" className="text-lead text-ink-2">
        {sending.isSuccess && text === '' && 'Thank you. It is with us.'}
      </p>
    </form>
  );
}

type Message = OwnMatter['messages'][number];

function MessageItem({
  matter,
  message,
}: {
  readonly matter: OwnMatter;
  readonly message: Message;
}) {
  const scheme = useScheme();
  const { side, text, writtenAt, photographs } = message;
  return (
    <li className={side === 'team' ? 'mt-2 border-l-4 border-ink pl-3' : 'mt-2'}>
      <b className="block text-lead font-semibold">
        {`${side === 'team' ? 'We answered' : 'You wrote'} on ${formatDay(writtenAt)}`}
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
        {mayAnswer && state !== 'closed' && <Reply matter={matter} />}
      </div>
    </details>
  );
}
