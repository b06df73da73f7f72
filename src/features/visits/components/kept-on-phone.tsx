import { Button } from '../../../components/ui/button.tsx';
import { DoneNote } from '../../../components/ui/done-note.tsx';
import { ErrorNote } from '../../../components/ui/error-note.tsx';
import type { Sent } from '../draft/send-kept.ts';
import { useKeptVisits, useSending } from '../hooks/use-kept-visits.ts';
import { countWords } from '../visit-words.ts';
import { HeldUpVisit } from './held-up-visit.tsx';

type SentNoteProps = {
  readonly outcome: Sent | undefined;
  readonly isSending: boolean;
  readonly waiting: number;
};

/** What became of the last try. */
function SentNote({ outcome, isSending, waiting }: SentNoteProps) {
  if (isSending) return <p className="text-small text-ink-2">Sending.</p>;
  if (outcome === undefined) return null;
  if (outcome.stopped !== null && waiting > 0) {
    return <p className="text-small text-clay-deep">Not sent: {outcome.stopped.message}</p>;
  }
  return outcome.sent === 0 ? null : (
    <p className="text-small text-ink-2">{countWords(outcome.sent, 'visit')} sent.</p>
  );
}

/** What waits on this phone, and the way to send it; what is held up says why. */
export function KeptOnPhone({ schemeId }: { readonly schemeId: string }) {
  const { data = [], error } = useKeptVisits();
  const waiting = data.filter(({ state }) => state !== 'draft');
  const send = useSending(schemeId, waiting);
  const heldUp = waiting.filter(({ state }) => state !== 'kept');
  if (error !== null) {
    return <ErrorNote failed="This browser cannot keep visits." stands={error.message} />;
  }
  return (
    <>
      <DoneNote>
        {waiting.length > 0 && (
          <div className="mb-3 flex flex-wrap items-center gap-x-3 gap-y-1 border-l-4 border-clay bg-clay-wash px-3 py-2 text-body text-ink">
            <p className="min-w-0 flex-1">
              {waiting.length} kept on this phone, not sent yet.
              {heldUp.length < waiting.length && (
                <span className="block text-small text-ink-2">
                  Goes when this page has a network.
                </span>
              )}
            </p>
            {heldUp.length < waiting.length && (
              <Button
                busy={send.isPending}
                onClick={() => {
                  send.mutate();
                }}
              >
                Send now
              </Button>
            )}
          </div>
        )}
        <SentNote outcome={send.data} isSending={send.isPending} waiting={waiting.length} />
      </DoneNote>
      {send.error !== null && <ErrorNote failed="Not sent." stands={send.error.message} />}
      {heldUp.map((visit) => (
        <HeldUpVisit key={visit.id} visit={visit} />
      ))}
    </>
  );
}
