import { useState } from 'react';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { Button } from '../../../components/ui/button.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { SchemeCard } from './scheme-card.tsx';

function Cards({ schemes }: { readonly schemes: readonly SchemeAnswer[] }) {
  return (
    <ul className="max-lg:grid max-lg:grid-cols-2 max-lg:items-start max-lg:gap-x-4 max-sm:block">
      {schemes.map((scheme) => (
        <SchemeCard key={scheme.id} scheme={scheme} />
      ))}
    </ul>
  );
}

/** The schemes at work; archived ones on request. */
export function SchemeList({ schemes }: { readonly schemes: readonly SchemeAnswer[] }) {
  const [showsArchived, setShowsArchived] = useState(false);
  const open = schemes.filter(({ archivedAt }) => archivedAt === null);
  const archived = schemes.filter(({ archivedAt }) => archivedAt !== null);
  return (
    <>
      {open.length === 0 ? (
        <EmptyState>No scheme is at work.</EmptyState>
      ) : (
        <Cards schemes={open} />
      )}
      {archived.length > 0 && (
        <Button
          kind="quiet"
          aria-expanded={showsArchived}
          className="mb-3 -ml-1.5"
          onClick={() => {
            setShowsArchived(!showsArchived);
          }}
        >
          {showsArchived ? 'Hide the archived' : `Show ${archived.length} archived`}
        </Button>
      )}
      {showsArchived && <Cards schemes={archived} />}
    </>
  );
}
