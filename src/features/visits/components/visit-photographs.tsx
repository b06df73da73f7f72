import type { VisitAnswer } from '../../../../shared/schemas/visits.ts';
import { PhotographList } from '../../../components/ui/photograph-list.tsx';
import { photographPath } from '../api/photograph-path.ts';
import { countWords } from '../visit-words.ts';

type VisitPhotographsProps = { readonly schemeId: string; readonly visit: VisitAnswer };

/** The photographs of a visit, small; each opens whole. */
export function VisitPhotographs({ schemeId, visit }: VisitPhotographsProps) {
  const there = visit.photographs.filter(({ hasArrived }) => hasArrived);
  const missing = visit.photographs.length - there.length;
  return (
    <>
      {there.length > 0 && (
        <PhotographList
          photographs={there.map(({ id, caption }) => ({
            ...{ id, caption },
            href: photographPath(schemeId, visit.id, id),
          }))}
        />
      )}
      {missing > 0 && (
        <p className="mt-1 text-cap text-ink-3">
          {countWords(missing, 'photograph')} on the way, still on the phone.
        </p>
      )}
    </>
  );
}
