import { useState } from 'react';
import type { Decision } from '../../../../shared/schemas/decision-answers.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { TextArea } from '../../../components/ui/text-area.tsx';
import { useCheckDecision } from '../api/check-decision.ts';

type CheckActionsProps = { readonly schemeId: string; readonly decision: Decision };

/** Checks the decision that is shown, or returns it with a comment. */
export function CheckActions({ schemeId, decision }: CheckActionsProps) {
  const [comment, setComment] = useState('');
  const [isTried, setTried] = useState(false);
  const check = useCheckDecision(schemeId, decision.id);
  const isChanged = decision.changes.length > 0;

  function settle(verdict: 'checked' | 'returned') {
    setTried(verdict === 'returned');
    if (verdict === 'returned' && comment.trim() === '') return;
    check.mutate({ verdict, comment });
  }
  return (
    <div className="grid gap-2 print:hidden">
      <MutationError failed="Nothing was changed." error={check.error} />
      <TextArea
        label="Comment"
        rows={2}
        value={comment}
        error={isTried && comment.trim() === '' ? 'Say why it is returned.' : undefined}
        onChange={({ target }) => {
          setComment(target.value);
        }}
      />
      <div className="flex gap-2">
        {!isChanged && (
          <Button
            kind="main"
            busy={check.isPending}
            onClick={() => {
              settle('checked');
            }}
          >
            Check
          </Button>
        )}
        <Button
          busy={check.isPending}
          onClick={() => {
            settle('returned');
          }}
        >
          Return
        </Button>
      </div>
    </div>
  );
}
