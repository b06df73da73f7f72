import { useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { Segments } from '../../../components/ui/segments.tsx';
import { visitPath } from '../../../config/paths.ts';
import { BuildingSearch } from '../../plan/components/building-search.tsx';
import { visitedQuery } from '../api/list-visited.ts';
import { useKeptVisits } from '../hooks/use-kept-visits.ts';
import { useToVisit } from '../hooks/use-to-visit.ts';
import { BegunVisits } from './begun-visits.tsx';
import { KeptOnPhone } from './kept-on-phone.tsx';
import { ToVisit } from './to-visit.tsx';
import { VisitedList } from './visited-list.tsx';
import { VisitsMap } from './visits-map.tsx';

const VIEWS = [
  { value: 'to visit', label: 'To visit' },
  { value: 'visited', label: 'Visited' },
  { value: 'map', label: 'Map' },
] as const;

/** Which buildings are to be visited and which have been, as a list or on the map. */
export function VisitsDesk({ schemeId }: { readonly schemeId: string }) {
  const navigate = useNavigate();
  const [view, setView] = useState<(typeof VIEWS)[number]['value']>('to visit');
  const toVisit = useToVisit(schemeId);
  const { data: visited = [], error, refetch } = useQuery(visitedQuery(schemeId));
  const byBuilding = useMemo(
    () => new Map(visited.map((visit) => [visit.buildingId, visit])),
    [visited],
  );
  const { data: kept = [] } = useKeptVisits();
  const waiting = new Set(
    kept.filter(({ state }) => state !== 'draft').map(({ buildingId }) => buildingId),
  );
  return (
    <div className="max-w-[720px]">
      <KeptOnPhone schemeId={schemeId} />
      <BegunVisits schemeId={schemeId} />
      <div className="mt-3">
        <BuildingSearch
          schemeId={schemeId}
          onChoose={({ id }) => void navigate(visitPath(schemeId, id))}
        />
      </div>
      <div className="mt-3">
        <Segments label="Buildings" segments={VIEWS} value={view} onChange={setView} />
      </div>
      {error !== null && (
        <QueryError what="Who was visited" error={error} onRetry={() => void refetch()} />
      )}
      {view === 'to visit' && <ToVisit {...{ schemeId, toVisit, waiting }} visited={byBuilding} />}
      {view === 'visited' && <VisitedList schemeId={schemeId} visited={visited} />}
      {view === 'map' && <VisitsMap rows={toVisit.rows} />}
    </div>
  );
}
