import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import type { Own } from '../../../shared/schemas/own.ts';
import { Content } from '../../components/layout/content.tsx';
import { PageTitle } from '../../components/layout/page-title.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { useScheme } from '../schemes/scheme-context.ts';
import { ownQuery } from './api/get-own.ts';
import { ownAppointmentsQuery } from './api/list-own-appointments.ts';
import { ownMattersQuery } from './api/list-own-matters.ts';
import { BuildingChoice } from './components/building-choice.tsx';
import { BuildingView } from './components/building-view.tsx';
import { OWNER_PAGE } from './owner-page-style.ts';

function NoBuildings() {
  return (
    <>
      <h1 className="mb-2 text-figure max-sm:text-h1">No building is linked to you yet</h1>
      <p className="max-w-[34em]">
        As soon as we know which building is yours, it stands here. If you had a letter from us and
        see nothing, please write to the address in it.
      </p>
    </>
  );
}

function useOwn() {
  const { id } = useScheme();
  const own = useQuery(ownQuery(id));
  const appointments = useQuery(ownAppointmentsQuery(id));
  const matters = useQuery(ownMattersQuery(id));
  const all = [own, appointments, matters];
  return {
    own: own.data,
    appointments: appointments.data,
    matters: matters.data,
    error: all.find(({ error }) => error !== null)?.error ?? null,
    retry: () => {
      for (const one of all) if (one.error !== null) void one.refetch();
    },
  };
}

function chosenIn({ buildings }: Own, asked: string | null) {
  return buildings.find(({ id }) => String(id) === asked) ?? buildings[0];
}

/** What an owner is told of their buildings, and how they answer. */
export function OwnPage() {
  const { own, appointments, matters, error, retry } = useOwn();
  const [search, setSearch] = useSearchParams();
  const isThere = own !== undefined && appointments !== undefined && matters !== undefined;
  const building = own && chosenIn(own, search.get('building'));
  return (
    <Content>
      <PageTitle>My building</PageTitle>
      <div className={OWNER_PAGE}>
        {error !== null && !isThere && (
          <QueryError what="Your page" error={error} onRetry={retry} />
        )}
        {!isThere && error === null && <LoadingRows what="your page" />}
        {isThere && building === undefined && <NoBuildings />}
        {isThere && building !== undefined && (
          <>
            <BuildingChoice
              buildings={own.buildings}
              chosen={building.id}
              onChoose={(id) => {
                setSearch({ building: String(id) }, { replace: true });
              }}
            />
            <BuildingView key={building.id} {...{ own, building, appointments, matters }} />
          </>
        )}
      </div>
    </Content>
  );
}
