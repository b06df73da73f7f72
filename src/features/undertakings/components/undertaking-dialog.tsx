import { useState, type SubmitEvent } from 'react';
import type { Undertaking } from '../../../../shared/schemas/undertakings.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { faultsOfError, type Faults } from '../../../lib/faults-by-path.ts';
import type { ChosenBuilding } from '../../appointments/components/building-choice.tsx';
import { useKeepUndertaking } from '../api/keep-undertaking.ts';
import { draftOfUndertaking, newUndertaking, readUndertaking } from '../undertaking-draft.ts';
import { UndertakingFields } from './undertaking-fields.tsx';

type UndertakingDialogProps = {
  readonly schemeId: string;
  /** The one that is changed; null for a new one. */
  readonly undertaking: Undertaking | null;
  /** Where a new one begins at a building. */
  readonly building?: ChosenBuilding;
  readonly onClose: () => void;
};

const FIELDS = ['promise', 'madeTo', 'source', 'buildingId', 'partyId', 'responsible', 'evidence'];

/** Adds or changes an undertaking, or says that it is done. */
export function UndertakingDialog(props: UndertakingDialogProps) {
  const { schemeId, undertaking, building = null, onClose } = props;
  const [draft, setDraft] = useState(() =>
    undertaking === null ? newUndertaking(building) : draftOfUndertaking(undertaking),
  );
  const [own, setOwn] = useState<Faults>({});
  const keep = useKeepUndertaking(schemeId, undertaking, onClose);
  function save(event: SubmitEvent) {
    event.preventDefault();
    const read = readUndertaking(draft);
    setOwn('faults' in read ? read.faults : {});
    if ('values' in read) keep.mutate(read.values);
  }
  const faults = { ...faultsOfError(keep.error), ...own };
  const title = undertaking === null ? 'Add an undertaking' : `Undertaking ${undertaking.number}`;
  return (
    <Dialog open title={title} onClose={onClose}>
      <form onSubmit={save} noValidate className="grid gap-3">
        <MutationError failed="Nothing was kept." error={keep.error} shown={FIELDS} />
        <UndertakingFields
          {...{ schemeId, draft, faults }}
          onChange={(change) => {
            setDraft({ ...draft, ...change });
          }}
        />
        <div className="flex gap-2">
          <Button kind="main" type="submit" busy={keep.isPending}>
            {undertaking === null ? 'Add it' : 'Keep it'}
          </Button>
          <Button onClick={onClose}>Leave it</Button>
        </div>
      </form>
    </Dialog>
  );
}
