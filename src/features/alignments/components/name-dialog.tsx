import { useState, type SubmitEvent } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { ApiError } from '../../../lib/api-error.ts';

type NameDialogProps = {
  readonly title: string;
  readonly doIt: string;
  readonly failed: string;
  readonly startsAs: string;
  readonly busy: boolean;
  readonly error: Error | null;
  readonly onName: (name: string) => void;
  readonly onClose: () => void;
};

function NameForm({ doIt, failed, startsAs, busy, error, onName, onClose }: NameDialogProps) {
  const [name, setName] = useState(startsAs);
  const fault =
    error instanceof ApiError
      ? error.fields.find(({ path }) => path === 'name')?.message
      : undefined;
  function submit(event: SubmitEvent): void {
    event.preventDefault();
    if (!busy) onName(name);
  }
  return (
    <form noValidate onSubmit={submit}>
      <MutationError failed={failed} error={error} shown={['name']} />
      <Field
        label="Name"
        data-first-in-focus
        autoComplete="off"
        value={name}
        error={fault}
        onChange={({ target }) => {
          setName(target.value);
        }}
      />
      <div className="mt-4 flex gap-2">
        <Button kind="main" type="submit" busy={busy}>
          {doIt}
        </Button>
        <Button onClick={onClose}>Leave it as it is</Button>
      </div>
    </form>
  );
}

/** Asks for the name of an option. */
export function NameDialog(props: NameDialogProps) {
  return (
    <Dialog open title={props.title} onClose={props.onClose}>
      <NameForm {...props} />
    </Dialog>
  );
}
