import type { VisitedBuilding } from '../../../../shared/schemas/visits.ts';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { formatShortDay } from '../../../lib/format-date.ts';
import { countWords } from '../visit-words.ts';
import { BuildingLine } from './building-line.tsx';

type VisitedListProps = {
  readonly schemeId: string;
  readonly visited: readonly VisitedBuilding[];
};

/** The buildings that have been visited, the last visit first. */
export function VisitedList({ schemeId, visited }: VisitedListProps) {
  if (visited.length === 0) return <EmptyState>No building has been visited yet.</EmptyState>;
  return (
    <ul className="mt-2 border-t border-ink">
      {visited.map((visit) => (
        <BuildingLine
          key={visit.buildingId}
          schemeId={schemeId}
          building={{ ...visit, id: visit.buildingId }}
          note={`${formatShortDay(visit.visitedAt)}, ${visit.part}, by ${visit.by}`}
          mark={<span className="text-small text-ink-2">{countWords(visit.visits, 'visit')}</span>}
        />
      ))}
    </ul>
  );
}
