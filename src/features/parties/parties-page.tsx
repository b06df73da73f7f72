import { useState } from 'react';
import { PageTitle } from '../../components/layout/page-title.tsx';
import { Button } from '../../components/ui/button.tsx';
import { ButtonLink } from '../../components/ui/button-link.tsx';
import { buttonStyle } from '../../components/ui/button-style.ts';
import { EmptyState } from '../../components/ui/empty-state.tsx';
import { FormatMenu } from '../../components/ui/format-menu.tsx';
import { Segments } from '../../components/ui/segments.tsx';
import { partyImportsPath } from '../../config/paths.ts';
import { apiPath } from '../../lib/api-path.ts';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { LikelySame } from './components/likely-same.tsx';
import { PartiesList } from './components/parties-list.tsx';
import { PartyDialog } from './components/party-dialog.tsx';
import { PartyView } from './components/party-view.tsx';
import { usePartiesAddress } from './hooks/use-parties-address.ts';

const VIEWS = [
  { value: 'all', label: 'All' },
  { value: 'likely-same', label: 'Likely the same' },
] as const;

function TakeAlong({ search }: { readonly search: string }) {
  const scheme = useScheme();
  const href = (format: string) =>
    `${apiPath`/api/schemes/${scheme.id}/parties/export`}?${new URLSearchParams({ format, search })}`;
  return (
    <FormatMenu
      button="Take along"
      buttonClassName={buttonStyle('plain')}
      align="right"
      holds={
        search === '' ? 'All parties, a line an interest' : 'The parties found, a line an interest'
      }
      links={[
        { name: 'XLSX', note: 'for spreadsheets', href: href('xlsx') },
        { name: 'CSV', note: 'for everything else', href: href('csv') },
      ]}
    />
  );
}

function Head({
  address,
  onAdd,
}: {
  readonly address: ReturnType<typeof usePartiesAddress>;
  readonly onAdd: () => void;
}) {
  const scheme = useScheme();
  return (
    <div className="mb-3 flex flex-wrap items-center gap-x-4 gap-y-2">
      <h1 className="text-h3">Parties</h1>
      <Segments label="Which" segments={VIEWS} value={address.view} onChange={address.setView} />
      <div className="ml-auto flex flex-wrap gap-2 max-sm:ml-0">
        {can(scheme, 'updateParties') && (
          <>
            <Button kind="main" onClick={onAdd}>
              Add…
            </Button>
            <ButtonLink to={partyImportsPath(scheme.id)}>Bring in</ButtonLink>
          </>
        )}
        <TakeAlong search={address.search} />
      </div>
    </div>
  );
}

/** Everybody who owns, rents or manages the buildings; one of them, where the address names them. */
export function PartiesPage() {
  const scheme = useScheme();
  const address = usePartiesAddress();
  const [isAdding, setAdding] = useState(false);
  const close = () => {
    setAdding(false);
  };
  if (!can(scheme, 'readParties')) {
    return <EmptyState>Parties are for those who write to them.</EmptyState>;
  }
  return (
    <div className="px-8 pt-[22px] pb-8 max-sm:px-4 max-sm:pt-4">
      <PageTitle>{`Parties of ${scheme.name}`}</PageTitle>
      {address.partyId !== null && <PartyView partyId={address.partyId} onOpen={address.open} />}
      {address.partyId === null && (
        <>
          <Head
            address={address}
            onAdd={() => {
              setAdding(true);
            }}
          />
          {address.view === 'all' ? (
            <PartiesList address={address} />
          ) : (
            <LikelySame onOpen={address.open} />
          )}
        </>
      )}
      {isAdding && (
        <PartyDialog
          schemeId={scheme.id}
          party={null}
          onClose={close}
          onKept={({ id }) => {
            close();
            address.open(id);
          }}
        />
      )}
    </div>
  );
}
