import { useQuery } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { capital } from '../../../../shared/presentation/capital.ts';
import type { Party } from '../../../../shared/schemas/parties.ts';
import type { PartyDetail } from '../../../../shared/schemas/party-answers.ts';
import { Button } from '../../../components/ui/button.tsx';
import { buttonStyle } from '../../../components/ui/button-style.ts';
import { Facts } from '../../../components/ui/facts.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { apiPath } from '../../../lib/api-path.ts';
import { formatDay } from '../../../lib/format-date.ts';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { partyQuery } from '../api/get-party.ts';
import { CHANNEL_WORDS } from '../party-words.ts';
import { EraseDialog } from './erase-dialog.tsx';
import { MergeDialog } from './merge-dialog.tsx';
import { PartyDialog } from './party-dialog.tsx';
import { PartyHistory } from './party-history.tsx';
import { PartyInterests } from './party-interests.tsx';
import { PartyName } from './party-name.tsx';

type PartyViewProps = { readonly partyId: string; readonly onOpen: (id: string | null) => void };
type Detailed = { readonly detail: PartyDetail };
type Asks = 'change' | 'merge' | 'erase' | null;

function factsOf(party: Party, onOpen: PartyViewProps['onOpen']) {
  const { kind, address, email, channel, representedBy, person } = party;
  const facts: (readonly [string, ReactNode])[] = [
    ['Kind', capital(kind)],
    ['Address', <bdi className="whitespace-pre-line">{address.join('\n')}</bdi>],
    ['E-mail', email ?? 'not known'],
    ['Letters', CHANNEL_WORDS[channel]],
    [
      'Represented by',
      representedBy === null ? (
        'nobody'
      ) : (
        <button
          type="button"
          className="cursor-pointer text-left break-words text-clay-deep underline max-sm:min-h-11"
          onClick={() => {
            onOpen(representedBy.id);
          }}
        >
          <PartyName name={representedBy.name} />
        </button>
      ),
    ],
    ['Signs in', person === null ? 'nobody yet' : `${person.name}, ${person.email}`],
  ];
  return facts;
}

/** Why a party is no longer one of the list. */
function Ended({ detail, onOpen }: Pick<PartyViewProps, 'onOpen'> & Detailed) {
  const { erasedAt, mergedInto } = detail.party;
  const keptUntil = detail.lettersKeptUntil;
  if (erasedAt !== null) {
    return (
      <p className="text-roomy">
        {`What was known of this party was erased on ${formatDay(erasedAt)}.`}
        {keptUntil !== null &&
          ` Letters and what they wrote are kept until ${formatDay(keptUntil)}, for the administrator alone.`}
      </p>
    );
  }
  return (
    <p className="flex flex-wrap items-center gap-2 text-roomy">
      This party was merged into another.
      <Button
        onClick={() => {
          onOpen(mergedInto);
        }}
      >
        Open that one
      </Button>
    </p>
  );
}

function Actions({
  party,
  onAsk,
}: {
  readonly party: Party;
  readonly onAsk: (asks: Asks) => void;
}) {
  const scheme = useScheme();
  const ask = (asks: Asks) => () => {
    onAsk(asks);
  };
  return (
    <div className="mb-3 flex flex-wrap gap-2">
      {can(scheme, 'updateParties') && (
        <>
          <Button kind="main" onClick={ask('change')}>
            Change…
          </Button>
          <Button onClick={ask('merge')}>Merge…</Button>
        </>
      )}
      <a
        download
        className={buttonStyle('plain')}
        href={apiPath`/api/schemes/${scheme.id}/parties/${party.id}/personal-data`}
      >
        Personal data (JSON)
      </a>
      {can(scheme, 'erasePersonalData') && <Button onClick={ask('erase')}>Erase…</Button>}
    </div>
  );
}

function Whole({ detail, onOpen }: Pick<PartyViewProps, 'onOpen'> & Detailed) {
  const scheme = useScheme();
  const [asks, setAsks] = useState<Asks>(null);
  const { party, history } = detail;
  const isLive = party.erasedAt === null && party.mergedInto === null;
  const close = () => {
    setAsks(null);
  };
  return (
    <>
      <h1 className="mb-3 max-w-[60ch] min-w-0 text-h3 break-words">
        <PartyName name={party.name} />
      </h1>
      {isLive ? <Actions party={party} onAsk={setAsks} /> : <Ended {...{ detail, onOpen }} />}
      {isLive && (
        <div className="grid grid-cols-[minmax(0,320px)_minmax(0,1fr)] gap-x-8 max-lg:block">
          <Panel title="Who">
            <Facts facts={factsOf(party, onOpen)} />
          </Panel>
          <Panel title="Interests" className="lg:mt-0">
            <PartyInterests schemeId={scheme.id} interests={party.interests} />
          </Panel>
        </div>
      )}
      <Panel title="History">
        <PartyHistory history={history} />
      </Panel>
      {asks === 'change' && (
        <PartyDialog schemeId={scheme.id} party={party} onKept={close} onClose={close} />
      )}
      {asks === 'merge' && (
        <MergeDialog
          schemeId={scheme.id}
          partyId={party.id}
          otherId={null}
          onClose={close}
          onMerged={({ id }) => {
            close();
            onOpen(id);
          }}
        />
      )}
      {asks === 'erase' && <EraseDialog schemeId={scheme.id} party={party} onClose={close} />}
    </>
  );
}

/** One party: who they are, what they hold, what they were before, and what can be done. */
export function PartyView({ partyId, onOpen }: PartyViewProps) {
  const scheme = useScheme();
  const { data, error, refetch } = useQuery(partyQuery(scheme.id, partyId));
  return (
    <>
      <Button
        kind="quiet"
        className="mb-1 -ml-1.5"
        onClick={() => {
          onOpen(null);
        }}
      >
        All parties
      </Button>
      {error !== null && (
        <QueryError what="The party" error={error} onRetry={() => void refetch()} />
      )}
      {error === null && data === undefined && <LoadingRows what="the party" />}
      {data !== undefined && <Whole key={data.party.id} detail={data} onOpen={onOpen} />}
    </>
  );
}
