import { useState, type SubmitEvent } from 'react';
import type { Party } from '../../../../shared/schemas/parties.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { ApiError } from '../../../lib/api-error.ts';
import { useKeepParty } from '../api/keep-party.ts';
import { draftOfParty, NO_PARTY, readParty, type PartyDraft } from '../party-draft.ts';
import { InterestFields } from './interest-fields.tsx';
import { PartyFields } from './party-fields.tsx';

type PartyDialogProps = {
  readonly schemeId: string;
  /** The party that is changed; null for a new one. */
  readonly party: Party | null;
  readonly onKept: (party: Party) => void;
  readonly onClose: () => void;
};

const SHOWN = ['name', 'address', 'email', 'representedBy', 'interests'];

function faultsOf(error: Error | null): Readonly<Record<string, string>> {
  if (!(error instanceof ApiError)) return {};
  return Object.fromEntries(error.fields.map(({ path, message }) => [path, message]));
}

/** Adds or changes a party and its interests. */
export function PartyDialog({ schemeId, party, onKept, onClose }: PartyDialogProps) {
  const [draft, setDraft] = useState(party === null ? NO_PARTY : draftOfParty(party));
  const [found, setFound] = useState<Readonly<Record<string, string | undefined>>>({});
  const keep = useKeepParty(schemeId, party, onKept);
  const faults = { ...faultsOf(keep.error), ...found };
  function set(change: Partial<PartyDraft>) {
    setDraft({ ...draft, ...change });
  }
  function save(event: SubmitEvent) {
    event.preventDefault();
    const read = readParty(draft);
    setFound('faults' in read ? read.faults : {});
    if ('values' in read) keep.mutate(read.values);
  }
  return (
    <Dialog open title={party === null ? 'Add a party' : 'Change the party'} onClose={onClose}>
      <form onSubmit={save} noValidate className="grid grid-cols-1 gap-3">
        <MutationError failed="Nothing was kept." error={keep.error} shown={SHOWN} />
        <PartyFields {...{ schemeId, draft, faults }} partyId={party?.id} onChange={set} />
        <InterestFields
          {...{ schemeId, faults }}
          interests={draft.interests}
          onChange={(interests) => {
            set({ interests });
          }}
        />
        <div className="flex gap-2">
          <Button kind="main" type="submit" busy={keep.isPending}>
            {party === null ? 'Add it' : 'Keep it'}
          </Button>
          <Button onClick={onClose}>Leave it</Button>
        </div>
      </form>
    </Dialog>
  );
}
