import { useQuery } from '@tanstack/react-query';
import type { VisitAnswer } from '../../../../shared/schemas/visits.ts';
import { Panel } from '../../../components/ui/panel.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { formatDay } from '../../../lib/format-date.ts';
import { visitsQuery } from '../api/list-visits.ts';
import { defectWords } from '../visit-words.ts';
import { VisitPhotographs } from './visit-photographs.tsx';

type VisitsOfBuildingProps = { readonly schemeId: string; readonly buildingId: number };

function OneVisit({ schemeId, visit }: { readonly schemeId: string; readonly visit: VisitAnswer }) {
  const { visitedAt, by, part, condition, construction, defects, notes } = visit;
  const found = [
    condition === null ? null : `condition ${condition}`,
    construction === null ? null : `construction ${construction}`,
  ].filter((words) => words !== null);
  return (
    <li className="border-b border-hairline py-2 text-small print:break-inside-avoid">
      <p>
        <b className="font-semibold">{formatDay(visitedAt)}</b>, {part}, by {by}
      </p>
      {found.length > 0 && <p className="first-letter:uppercase">{found.join(', ')}.</p>}
      {defects.length > 0 && (
        <ul aria-label="Defects" className="list-disc pl-4">
          {defects.map((defect, index) => (
            <li key={index} className="first-letter:uppercase">
              {defectWords(defect)}
            </li>
          ))}
        </ul>
      )}
      {notes !== '' && <p className="mt-1 whitespace-pre-line text-ink-2">{notes}</p>}
      <VisitPhotographs schemeId={schemeId} visit={visit} />
    </li>
  );
}

/** Who visited a building, when, and what they saw; the newest first. */
export function VisitsOfBuilding({ schemeId, buildingId }: VisitsOfBuildingProps) {
  const { data, error, refetch } = useQuery(visitsQuery(schemeId, buildingId));
  return (
    <Panel title="Visits">
      {error !== null && (
        <QueryError what="The visits" error={error} onRetry={() => void refetch()} />
      )}
      {data === undefined && error === null && <LoadingRows what="the visits" rows={2} />}
      {data?.length === 0 && <p className="mt-2 text-small text-ink-2">Not visited yet.</p>}
      {data !== undefined && data.length > 0 && (
        <ol>
          {data.map((visit) => (
            <OneVisit key={visit.id} schemeId={schemeId} visit={visit} />
          ))}
        </ol>
      )}
    </Panel>
  );
}
