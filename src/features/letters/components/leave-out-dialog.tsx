import { useState, type SubmitEvent } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { Field } from '../../../components/ui/field.tsx';

type LeaveOutProps = {
  /** Whom; nobody while nothing is asked. */
  readonly whom: string | null;
  /** What the reason begins with. */
  readonly begins?: string;
  readonly onKeep: (why: string) => void;
};

function LeaveOutForm({ whom, begins = '', onKeep }: LeaveOutProps) {
  const [why, setWhy] = useState(begins);
  function keep(event: SubmitEvent) {
    event.preventDefault();
    if (why.trim() !== '') onKeep(why.trim());
  }
  return (
    <form onSubmit={keep} className="grid gap-3">
      <p className="text-body break-words">{`No letter of this batch: ${whom ?? ''}`}</p>
      <Field
        required
        data-first-in-focus
        label="Why"
        hint="Kept with the batch"
        value={why}
        onChange={(event) => {
          setWhy(event.target.value);
        }}
      />
      <div>
        <Button kind="main" type="submit">
          Leave them out
        </Button>
      </div>
    </form>
  );
}

/** Leaves one or several out of a batch, with the reason. */
export function LeaveOutDialog({ onClose, ...props }: LeaveOutProps & { onClose: () => void }) {
  return (
    <Dialog open={props.whom !== null} title="Leave somebody out" onClose={onClose}>
      {props.whom !== null && <LeaveOutForm {...props} />}
    </Dialog>
  );
}
