import type { RegisterRow } from '../../../../shared/schemas/register.ts';
import type { VisitedBuilding } from '../../../../shared/schemas/visits.ts';
import { CATEGORIES } from '../../../../shared/damage/categories.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { Button } from '../../../components/ui/button.tsx';
import { DamageChip } from '../../../components/ui/damage-chip.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { formatShortDay } from '../../../lib/format-date.ts';
import type { useToVisit } from '../hooks/use-to-visit.ts';
import { BuildingLine } from './building-line.tsx';

type ToVisitProps = {
  readonly schemeId: string;
  readonly toVisit: ReturnType<typeof useToVisit>;
  readonly visited: ReadonlyMap<number, VisitedBuilding>;
  /** The buildings of which a visit waits on this phone. */
  readonly waiting: ReadonlySet<number>;
};

function FoundMark({ category }: Pick<RegisterRow, 'category'>) {
  const found = CATEGORIES.find((one) => one.category === category);
  return found === undefined ? null : <DamageChip category={found.category} />;
}

function noteOf(row: RegisterRow, visit: VisitedBuilding | undefined, isWaiting: boolean) {
  if (isWaiting) return <b className="font-medium text-clay-deep">Visit kept on this phone</b>;
  if (visit !== undefined) {
    return (
      <b className="font-medium text-ink">
        Visited {formatShortDay(visit.visitedAt)}, {visit.part}
      </b>
    );
  }
  const held = row.heldBy === null ? '' : `, held: ${row.heldBy}`;
  return `Not visited${held}`;
}

/** The buildings that the run leads on to a visit; those that have been visited say when. */
export function ToVisit({ schemeId, toVisit, visited, waiting }: ToVisitProps) {
  const { rows, found, error } = toVisit;
  if (error !== null) {
    return <QueryError what="The buildings to visit" error={error} onRetry={toVisit.retry} />;
  }
  if (toVisit.isPending) return <LoadingRows what="the buildings to visit" rows={10} />;
  if (!toVisit.hasRun) {
    return <EmptyState>No run is complete yet. Find a building above to visit it.</EmptyState>;
  }
  if (rows.length === 0) {
    return <EmptyState>The newest run leads no building on to stage 3.</EmptyState>;
  }
  return (
    <>
      <p className="mt-2 text-small text-ink-2">
        {formatCount(found)} at stage 3 of the newest run, the smallest reserve first.
      </p>
      <ul className="mt-1 border-t border-ink">
        {rows.map((row) => (
          <BuildingLine
            key={row.id}
            schemeId={schemeId}
            building={row}
            note={noteOf(row, visited.get(row.id), waiting.has(row.id))}
            mark={<FoundMark category={row.category} />}
          />
        ))}
      </ul>
      {rows.length < found && (
        <div className="mt-3">
          <Button onClick={toVisit.more}>Show more</Button>
        </div>
      )}
    </>
  );
}
