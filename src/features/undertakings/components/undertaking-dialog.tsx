import { useQuery } from '@tanstack/react-query';
import { useState, type SubmitEvent } from 'react';
import type { Undertaking } from '../../../../shared/schemas/undertakings.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ConflictChoice } from '../../../components/ui/conflict-choice.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { isRefusal } from '../../../lib/api-error.ts';
import { faultsOfError, type Faults } from '../../../lib/faults-by-path.ts';
import type { ChosenBuilding } from '../../appointments/components/building-choice.tsx';
import { useKeepUndertaking } from '../api/keep-undertaking.ts';
import { undertakingsQuery } from '../api/list-undertakings.ts';
import { rebasedUndertaking, undertakingChanges } from '../rebased-undertaking.ts';
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

const FASTER = 'Somebody else changed it meanwhile. What you wrote is still here.';

/** What is written, on top of the version that was seen; a newer one is shown where it stood in the way. */
function useUndertakingForm({ schemeId, undertaking, building, onClose }: UndertakingDialogProps) {
  const [base, setBase] = useState(undertaking);
  const [draft, setDraft] = useState(() =>
    base === null ? newUndertaking(building ?? null) : draftOfUndertaking(base),
  );
  const [own, setOwn] = useState<Faults>({});
  const keep = useKeepUndertaking(schemeId, base, onClose);
  const { data } = useQuery({ ...undertakingsQuery(schemeId), enabled: base !== null });
  const newest = data?.find(({ id }) => id === base?.id);
  const isLate = isRefusal(keep.error, 'conflict');
  const isNewer = isLate && newest !== undefined && newest.version !== base?.version;
  function save(event: SubmitEvent) {
    event.preventDefault();
    const read = readUndertaking(draft);
    setOwn('faults' in read ? read.faults : {});
    if ('values' in read) keep.mutate(read.values);
  }
  function keepMine(from: Undertaking, onto: Undertaking) {
    setDraft(rebasedUndertaking(draft, draftOfUndertaking(from), draftOfUndertaking(onto)));
    setBase(onto);
    keep.reset();
  }
  const clash = base !== null && isNewer ? { base, theirs: newest } : null;
  const faults = { ...faultsOfError(keep.error), ...own };
  return { draft, setDraft, keep, save, keepMine, isLate, clash, faults };
}

/** Adds or changes an undertaking, or says that it is done. */
export function UndertakingDialog(props: UndertakingDialogProps) {
  const { schemeId, undertaking, onClose } = props;
  const { draft, setDraft, keep, save, keepMine, isLate, clash, faults } =
    useUndertakingForm(props);
  const title = undertaking === null ? 'Add an undertaking' : `Undertaking ${undertaking.number}`;
  return (
    <Dialog open title={title} onClose={onClose}>
      <form onSubmit={save} noValidate className="grid gap-3">
        <MutationError
          failed="Nothing was kept."
          error={keep.error}
          shown={FIELDS}
          stands={isLate ? FASTER : undefined}
          action={
            clash === null ? undefined : (
              <ConflictChoice
                changes={undertakingChanges(clash.base, clash.theirs)}
                onKeepMine={() => {
                  keepMine(clash.base, clash.theirs);
                }}
              />
            )
          }
        />
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
