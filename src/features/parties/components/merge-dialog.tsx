import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import type { Party } from '../../../../shared/schemas/parties.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { classNames } from '../../../lib/class-names.ts';
import { partyQuery } from '../api/get-party.ts';
import { useMergeParties } from '../api/merge-parties.ts';
import { CHANNEL_WORDS } from '../party-words.ts';
import { PartyName } from './party-name.tsx';
import { PartySearch } from './party-search.tsx';

type MergeDialogProps = {
  readonly schemeId: string;
  readonly partyId: string;
  /** The other one, where it is known already. */
  readonly otherId: string | null;
  readonly onMerged: (party: Party) => void;
  readonly onClose: () => void;
};

type OneSideProps = {
  readonly party: Party;
  readonly stays: boolean;
  readonly onChoose: () => void;
};

const NAMED = 5;

function OneSide({ party, stays, onChoose }: OneSideProps) {
  const { name, address, email, channel, interests, person } = party;
  const more = interests.length - NAMED;
  return (
    <label
      className={classNames(
        'block min-w-0 cursor-pointer border p-2 text-small break-words',
        stays ? 'border-ink bg-select-wash' : 'border-control',
      )}
    >
      <span className="mb-1 flex min-h-6 items-center gap-2 font-semibold max-sm:min-h-11">
        <input type="radio" name="stays" checked={stays} onChange={onChoose} className="size-4" />
        {stays ? 'This one stays' : 'Keep this one'}
      </span>
      <span className="block">
        <PartyName name={name} />
      </span>
      <bdi className="block whitespace-pre-line text-ink-2">{address.join('\n')}</bdi>
      <span className="block text-ink-2">{email ?? 'no e-mail'}</span>
      <span className="block text-ink-2">{CHANNEL_WORDS[channel]}</span>
      {person !== null && <span className="block text-ink-2">Signs in as {person.email}</span>}
      <ul className="mt-1 border-t border-hairline pt-1">
        {interests.slice(0, NAMED).map((one) => (
          <li key={one.id}>{`${one.kind} of ${one.building.reference}`}</li>
        ))}
        {more > 0 && <li className="text-ink-2">and {formatCount(more)} more</li>}
        {interests.length === 0 && <li className="text-ink-2">no interests</li>}
      </ul>
    </label>
  );
}

function useBoth({ schemeId, partyId }: MergeDialogProps, otherId: string | null) {
  const one = useQuery({ ...partyQuery(schemeId, partyId), staleTime: 0 });
  const other = useQuery({
    ...partyQuery(schemeId, otherId ?? ''),
    enabled: otherId !== null,
    staleTime: 0,
  });
  return [one.data?.party, otherId === null ? undefined : other.data?.party] as const;
}

/** Shows two parties side by side and makes one of them. */
export function MergeDialog(props: MergeDialogProps) {
  const { schemeId, partyId, onMerged, onClose } = props;
  const [otherId, setOtherId] = useState(props.otherId);
  const [staysId, setStaysId] = useState(partyId);
  const [one, other] = useBoth(props, otherId);
  const merge = useMergeParties(schemeId, onMerged);
  const both = one === undefined || other === undefined ? [] : [one, other];
  const stays = both.find(({ id }) => id === staysId);
  const goes = both.find(({ id }) => id !== staysId);
  return (
    <Dialog open title="Merge two parties" onClose={onClose}>
      <div className="grid grid-cols-1 gap-3">
        <MutationError failed="Nothing was merged." error={merge.error} />
        {otherId === null && (
          <PartySearch
            schemeId={schemeId}
            label="Which is the same party?"
            except={partyId}
            onChoose={({ id }) => {
              setOtherId(id);
            }}
          />
        )}
        {otherId !== null && both.length === 0 && <LoadingRows what="both" rows={3} />}
        {stays !== undefined && goes !== undefined && (
          <>
            <div className="grid grid-cols-2 gap-3 max-sm:grid-cols-1">
              {both.map((party) => (
                <OneSide
                  key={party.id}
                  party={party}
                  stays={party.id === stays.id}
                  onChoose={() => {
                    setStaysId(party.id);
                  }}
                />
              ))}
            </div>
            <p className="text-small text-ink-2">
              Name, address and e-mail of the one that stays are kept, and it gets the interests
              that it lacks. Letters to the other are found with it. This cannot be undone.
            </p>
            <div className="flex gap-2">
              <Button
                kind="main"
                busy={merge.isPending}
                onClick={() => {
                  merge.mutate({ stays, goes });
                }}
              >
                Merge them
              </Button>
              <Button onClick={onClose}>Leave both</Button>
            </div>
          </>
        )}
      </div>
    </Dialog>
  );
}
