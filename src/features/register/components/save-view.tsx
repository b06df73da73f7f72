import { useState, type SubmitEvent } from 'react';
import type { RegisterView } from '../../../../shared/schemas/register-views.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useKeepView } from '../api/keep-view.ts';

type SaveViewProps = {
  readonly schemeId: string;
  readonly shown: Pick<RegisterView, 'filter' | 'sort' | 'columns'>;
  readonly onDone: () => void;
};

/** Keeps what is shown under a name. */
export function SaveView({ schemeId, shown, onDone }: SaveViewProps) {
  const [name, setName] = useState('');
  const [fault, setFault] = useState<string>();
  const keeping = useKeepView(schemeId);
  function save(event: SubmitEvent) {
    event.preventDefault();
    const given = name.trim();
    if (given === '') {
      setFault('Give the view a name.');
      return;
    }
    setFault(undefined);
    keeping.mutate({ name: given, ...shown }, { onSuccess: onDone });
  }
  return (
    <form noValidate onSubmit={save} className="w-[260px] max-sm:w-full">
      <Field
        autoFocus
        label="Name of the view"
        hint="A view of yours by this name is replaced."
        maxLength={80}
        error={fault}
        value={name}
        onChange={({ target }) => {
          setName(target.value);
        }}
      />
      <Button type="submit" kind="main" busy={keeping.isPending} className="mt-2">
        Save the view
      </Button>
      <MutationError failed="The view was not saved." error={keeping.error} />
    </form>
  );
}
