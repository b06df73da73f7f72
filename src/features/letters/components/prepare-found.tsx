import { useNavigate } from 'react-router-dom';
import type { LetterWords } from '../../../../shared/presentation/letter-text.ts';
import type { BatchPreview, Recipients } from '../../../../shared/schemas/letter-batches.ts';
import { Button } from '../../../components/ui/button.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { UnsavedEdits } from '../../../components/ui/unsaved-edits.tsx';
import { letterPagePath } from '../../../config/paths.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { usePrepareBatch } from '../api/letter-batches.ts';
import { lettersWords } from '../letter-words.ts';
import { HadAlready } from './had-already.tsx';
import { RecipientsTable } from './recipients-table.tsx';

function countsWords({ letters, byMail, byPost, without, runNumber }: Recipients): string {
  const run = runNumber === null ? 'No run is complete yet' : `By run ${runNumber}`;
  const nobody =
    without === 0
      ? ''
      : ` ${without.toLocaleString('en-GB')} buildings are named in which nobody has an interest: bring their parties in.`;
  return `${run}: ${lettersWords(letters)}, ${byMail} by e-mail and ${byPost} by post.${nobody}`;
}

type PrepareFoundProps = {
  readonly found: Recipients;
  readonly asked: BatchPreview;
  /** What is written for this batch, where it is free text. */
  readonly text: LetterWords | null;
  /** Whether anything was written that leaving would throw away. */
  readonly hasWritten: boolean;
  readonly onChange: (asked: BatchPreview) => void;
};

/** Who gets a letter and why; their letters are written from here. */
export function PrepareFound({ found, asked, text, hasWritten, onChange }: PrepareFoundProps) {
  const scheme = useScheme();
  const navigate = useNavigate();
  const prepare = usePrepareBatch(scheme.id);
  function write() {
    prepare.mutate(
      { ...asked, text, expected: found.letters },
      { onSuccess: ({ id }) => void navigate(letterPagePath(scheme.id, id)) },
    );
  }
  return (
    <>
      <p className="mt-4 text-body">{countsWords(found)}</p>
      <HadAlready {...{ found, asked, onChange }} />
      <MutationError failed="No letter was written." error={prepare.error} />
      {found.letters > 0 && (
        <Button kind="main" className="mt-3" busy={prepare.isPending} onClick={write}>
          {`Write ${lettersWords(found.letters)}`}
        </Button>
      )}
      <p className="mt-2 mb-3 text-small text-ink-2">
        Nothing is sent yet: you can read each letter, and a second person checks them.
      </p>
      {found.recipients.length === 0 ? (
        <EmptyState>
          The rules name nobody who has an interest today. Choose somebody by hand, or look at the
          rules.
        </EmptyState>
      ) : (
        <RecipientsTable found={found} asked={asked} onChange={onChange} />
      )}
      <UnsavedEdits
        hasEdits={hasWritten && !prepare.isPending}
        what="What you wrote of this letter"
      />
    </>
  );
}
