import { useState, type SubmitEvent } from 'react';
import type { OwnMatter } from '../../../../shared/schemas/matter-answers.ts';
import { MATTER_LIMITS, ownMessageSchema } from '../../../../shared/schemas/matters.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useSendMatter } from '../api/send-matter.ts';
import { usePhotographs } from '../hooks/use-photographs.ts';
import { PhotographList } from './photograph-list.tsx';

/** A further message in a thread, with photographs where the first could have some. */
export function ReplyForm({ matter }: { readonly matter: OwnMatter }) {
  const scheme = useScheme();
  const [id, setId] = useState(() => crypto.randomUUID());
  const [text, setText] = useState('');
  const [fault, setFault] = useState<string>();
  const photographs = usePhotographs();
  const sending = useSendMatter(scheme.id, () => {
    setId(crypto.randomUUID());
    setText('');
    photographs.clear();
  });
  function send(event: SubmitEvent) {
    event.preventDefault();
    const parsed = ownMessageSchema.safeParse({ id, text, photographs: photographs.announced });
    setFault(parsed.error?.issues[0]?.message);
    if (!parsed.success || sending.isPending) return;
    sending.mutate({
      matter: { ...parsed.data, matterId: matter.id },
      photographs: photographs.added,
    });
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
      {matter.kind !== 'question' && <PhotographList photographs={photographs} />}
      <MutationError
        failed="It has not been sent."
        stands="What you wrote is still here. Please try again."
        error={sending.error}
      />
      <Button type="submit" className="mt-3" busy={sending.isPending}>
        Send
      </Button>
      <p role="status" className="text-lead text-ink-2">
        {sending.isSuccess && text === '' && 'Thank you. It is with us.'}
      </p>
    </form>
  );
}
