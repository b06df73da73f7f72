import type { VisitAnswer } from '../../../../shared/schemas/visits.ts';
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
        <ul aria-label="Photographs" className="mt-1.5 flex flex-wrap gap-2">
          {there.map(({ id, caption }, index) => (
            <li key={id} className="w-24">
              <a
                href={photographPath(schemeId, visit.id, id)}
                target="_blank"
                rel="noreferrer"
                className="block text-cap text-ink-2 no-underline"
              >
                <img
                  src={photographPath(schemeId, visit.id, id)}
                  alt={caption === '' ? `Photograph ${index + 1}` : ''}
                  loading="lazy"
                  className="size-24 border border-rule object-cover"
                />
                {caption}
              </a>
            </li>
          ))}
        </ul>
      )}
      {missing > 0 && (
        <p className="mt-1 text-cap text-ink-3">
          {countWords(missing, 'photograph')} on the way, still on the phone.
        </p>
      )}
    </>
  );
}
