import { useState } from 'react';
import type { Batch } from '../../../../shared/schemas/letter-batches.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { buttonStyle } from '../../../components/ui/button-style.ts';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import { batchAgainPath } from '../../../config/paths.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { usePerson } from '../../session/person-context.ts';
import { useMoveBatch, type BatchStep } from '../api/letter-batches.ts';
import { lettersWords } from '../letter-words.ts';

type StepsProps = {
  readonly batch: Batch;
  readonly busy: boolean;
  readonly onStep: (step: BatchStep) => void;
};

/** What the second person does; whoever prepared the letters may take them back. */
function WhileWaiting({ batch, busy, onStep }: StepsProps) {
  const [comment, setComment] = useState('');
  const scheme = useScheme();
  if (batch.preparedById === usePerson().id) {
    return (
      <div className="flex flex-wrap items-center gap-3">
        <span className="text-small text-ink-2">Somebody else checks these letters.</span>
        {can(scheme, 'prepareLetters') && (
          <Button
            busy={busy}
            onClick={() => {
              onStep({ step: 'withdraw' });
            }}
          >
            Take them back
          </Button>
        )}
      </div>
    );
  }
  if (!can(scheme, 'checkLetters')) return null;
  return (
    <div className="grid max-w-[560px] gap-2">
      <TextArea
        rows={2}
        label="Comment"
        hint="Needed where you return them"
        value={comment}
        onChange={(event) => {
          setComment(event.target.value);
        }}
      />
      <div className="flex gap-2">
        <Button
          kind="main"
          busy={busy}
          onClick={() => {
            onStep({ step: 'check', verdict: 'checked', comment });
          }}
        >
          They are right
        </Button>
        <Button
          busy={busy}
          onClick={() => {
            onStep({ step: 'check', verdict: 'returned', comment });
          }}
        >
          Return them
        </Button>
      </div>
    </div>
  );
}

/** Once more before something that cannot be taken back. */
function Send({ batch, busy, onStep }: StepsProps) {
  const [asks, setAsks] = useState(false);
  function close() {
    setAsks(false);
  }
  if (!can(useScheme(), 'checkLetters')) return null;
  const byMail = batch.letters - batch.byPost;
  return (
    <>
      <Button
        kind="main"
        onClick={() => {
          setAsks(true);
        }}
      >
        {`Send ${lettersWords(batch.letters)}…`}
      </Button>
      <ConfirmDialog
        open={asks}
        title="Send the letters?"
        doIt="Send them"
        busy={busy}
        onConfirm={() => {
          onStep({ step: 'send' });
          close();
        }}
        onClose={close}
      >
        <p>
          {byMail} go out by e-mail now, {batch.byPost} wait to be printed. Who has no password yet
          gets a link that sets one. This cannot be taken back.
        </p>
      </ConfirmDialog>
    </>
  );
}

function Print({ batch, busy, onStep }: StepsProps) {
  const scheme = useScheme();
  if (batch.byPost === 0) return null;
  return (
    <div className="flex flex-wrap items-center gap-3">
      <a
        className={buttonStyle('plain')}
        href={apiPath`/api/schemes/${scheme.id}/letter-batches/${batch.id}/print-file`}
        download
      >
        {`Print file of ${lettersWords(batch.byPost)}`}
      </a>
      {batch.printedAt === null && can(scheme, 'prepareLetters') && (
        <Button
          busy={busy}
          onClick={() => {
            onStep({ step: 'printed' });
          }}
        >
          Record that they went to the post
        </Button>
      )}
    </div>
  );
}

/** What was written for letters that are not sent, and whom somebody took in or left out, is not lost. */
function PrepareAgain({ batch }: { readonly batch: Batch }) {
  const scheme = useScheme();
  if (!can(scheme, 'prepareLetters')) return null;
  return (
    <div>
      <ButtonLink to={batchAgainPath(scheme.id, batch.id)}>Prepare these letters again</ButtonLink>
    </div>
  );
}

/** What can be done with a batch next. */
export function BatchSteps({ batch }: { readonly batch: Batch }) {
  const move = useMoveBatch(useScheme().id, batch.id);
  const steps: StepsProps = {
    batch,
    busy: move.isPending,
    onStep: (step) => {
      move.mutate(step);
    },
  };
  return (
    <div className="my-4 grid gap-3">
      <MutationError failed="Nothing was changed." error={move.error} />
      {batch.state === 'waiting for check' && <WhileWaiting {...steps} />}
      {batch.state === 'checked' && <Send {...steps} />}
      {(batch.state === 'returned' || batch.state === 'withdrawn') && (
        <PrepareAgain batch={batch} />
      )}
      {batch.state === 'sent' && <Print {...steps} />}
    </div>
  );
}
