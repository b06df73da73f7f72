import { useState, type SubmitEvent } from 'react';
import type { Matter } from '../../../../shared/schemas/matter-answers.ts';
import { MATTER_LIMITS, teamMessageSchema } from '../../../../shared/schemas/matters.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Segments } from '../../../components/ui/segments.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import { faultsOfError, faultsOfIssues, type Faults } from '../../../lib/faults-by-path.ts';
import { useMatterStep } from '../api/change-matter.ts';

type WriteFormProps = {
  readonly schemeId: string;
  readonly matter: Matter;
  readonly onReload: () => void;
};

const SIDES = [
  { value: 'team', label: 'Answer' },
  { value: 'note', label: 'Note' },
] as const;

function hintOf(side: 'team' | 'note', isMailed: boolean): string {
  if (side === 'note') return 'Stays inside the team.';
  return isMailed
    ? 'Goes to the owner by e-mail and stands on their page. Your name is not told.'
    : 'Mail does not reach this owner. It stands on their page only: tell them another way.';
}

/** Answers the owner, or notes something inside the team; what is written stays until it is kept. */
export function WriteForm({ schemeId, matter, onReload }: WriteFormProps) {
  const [side, setSide] = useState<'team' | 'note'>('team');
  const [text, setText] = useState('');
  const [id, setId] = useState(() => crypto.randomUUID());
  const [faults, setFaults] = useState<Faults>({});
  const step = useMatterStep(schemeId, matter.id, () => {
    setText('');
    setId(crypto.randomUUID());
  });
  function send(event: SubmitEvent) {
    event.preventDefault();
    const read = teamMessageSchema.safeParse({ id, version: matter.version, side, text });
    setFaults(read.success ? {} : faultsOfIssues(read.error.issues));
    if (read.success) step.mutate({ kind: 'write', body: read.data });
  }
  const refused = faultsOfError(step.error);
  return (
    <form onSubmit={send} noValidate className="mt-5 grid max-w-[72ch] gap-2">
      <MutationError
        failed={side === 'team' ? 'The answer was not sent.' : 'The note was not kept.'}
        error={step.error}
        shown={['text']}
        action={<Button onClick={onReload}>See what is new</Button>}
      />
      <div>
        <Segments label="What to write" segments={SIDES} value={side} onChange={setSide} />
      </div>
      <TextArea
        label={side === 'team' ? 'Answer to the owner' : 'Note'}
        hint={hintOf(side, matter.isMailed)}
        rows={5}
        maxLength={MATTER_LIMITS.text}
        value={text}
        error={faults.text ?? refused.text}
        onChange={({ target }) => {
          setText(target.value);
        }}
      />
      <div>
        <Button kind="main" type="submit" busy={step.isPending}>
          {side === 'team' ? 'Send the answer' : 'Keep the note'}
        </Button>
      </div>
    </form>
  );
}
