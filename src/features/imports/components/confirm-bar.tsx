import { useId } from 'react';
import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useConfirmImport } from '../api/confirm-import.ts';
import type { ImportDraft } from '../hooks/use-import-draft.ts';
import { isWorking } from '../import-states.ts';
import { readinessOf } from '../readiness.ts';
import { CancelImport } from './cancel-import.tsx';
import { WorkProgress } from './work-progress.tsx';

type ConfirmBarProps = { readonly answer: ImportAnswer; readonly draft: ImportDraft };

/** Brings the buildings in, or says what is missing before. */
function Confirm({ answer }: Pick<ConfirmBarProps, 'answer'>) {
  const scheme = useScheme();
  const id = useId();
  const confirm = useConfirmImport(scheme.id, answer.id);
  const { label, reason } = readinessOf(answer);
  return (
    <>
      <div className="w-full empty:hidden">
        <MutationError failed="Nothing was brought in." error={confirm.error} />
      </div>
      <Button
        kind="main"
        busy={reason !== null || confirm.isPending}
        aria-describedby={reason === null ? undefined : id}
        onClick={() => {
          confirm.mutate(answer.version);
        }}
      >
        {label}
      </Button>
      {reason !== null && (
        <p id={id} className="min-w-0 text-small text-ink-2 max-sm:order-first max-sm:w-full">
          {reason}
        </p>
      )}
    </>
  );
}

/** What was chosen and not checked yet. */
function CheckAgain({ draft }: Pick<ConfirmBarProps, 'draft'>) {
  return (
    <>
      <Button kind="main" busy={!draft.isSound || draft.isSending} onClick={draft.check}>
        Check again
      </Button>
      <Button kind="quiet" onClick={draft.takeBack}>
        Take it back
      </Button>
      <p className="min-w-0 text-small text-ink-2 max-sm:order-first max-sm:w-full">
        {draft.isSound ? 'You chose otherwise; the figures are older.' : 'Mend what is marked.'}
      </p>
    </>
  );
}

/** At the foot of the page: what is to be done next, or how far the server is. */
export function ConfirmBar({ answer, draft }: ConfirmBarProps) {
  return (
    <section
      aria-label="What to do"
      className="flex flex-none flex-wrap items-center gap-x-3 gap-y-1.5 border-t border-ink bg-paper-raised px-6 py-2.5 max-md:sticky max-md:bottom-0 max-md:z-30 max-sm:px-4"
    >
      {draft.error !== null && (
        <div className="w-full">
          <MutationError failed="It was not checked again." error={draft.error} />
        </div>
      )}
      {isWorking(answer.state) ? (
        <div className="min-w-0 flex-1">
          <WorkProgress answer={answer} />
        </div>
      ) : draft.isAhead ? (
        <CheckAgain draft={draft} />
      ) : (
        <Confirm answer={answer} />
      )}
      <div className="ml-auto">
        <CancelImport answer={answer} />
      </div>
    </section>
  );
}
