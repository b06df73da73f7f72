import { useState } from 'react';
import type { RegisterFilter } from '../../../../shared/schemas/register.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { DecideForm, NOTHING_PROPOSED, type Proposal } from './decide-form.tsx';
import { DecideReview } from './decide-review.tsx';

export type DecideDialogProps = {
  readonly schemeId: string;
  readonly runId: string;
  readonly marks: { readonly filter: RegisterFilter; readonly count: number };
  readonly onClose: () => void;
  readonly onDone: (words: string) => void;
};

/** Prepares a decision for all buildings that are marked: what, then what that means, then done. */
export function DecideDialog({ schemeId, runId, marks, onClose, onDone }: DecideDialogProps) {
  // what was marked when it was opened
  const [{ filter, count }] = useState(marks);
  const [draft, setDraft] = useState(NOTHING_PROPOSED);
  const [proposal, setProposal] = useState<Proposal | null>(null);
  const many = count === 1 ? 'one building' : `${formatCount(count)} buildings`;
  return (
    <Dialog open title={`Decide for ${many}`} onClose={onClose}>
      {proposal === null ? (
        <DecideForm
          draft={draft}
          onClose={onClose}
          onPropose={(next) => {
            setDraft(next);
            setProposal(next);
          }}
        />
      ) : (
        <DecideReview
          {...{ schemeId, filter, runId, proposal }}
          onBack={() => {
            setProposal(null);
          }}
          onDone={(words) => {
            onDone(words);
            onClose();
          }}
        />
      )}
    </Dialog>
  );
}
