import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Facts } from '../../../components/ui/facts.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { crsQuery } from '../api/get-crs.ts';
import { boundsInWords } from '../crs-words.ts';

/** A projected system explained: what it is called, where it is used, and how it is worked out. */
export function CrsFacts({
  code,
  children,
}: {
  readonly code: number;
  readonly children?: ReactNode;
}) {
  const { data: crs, error, refetch } = useQuery(crsQuery(code));
  return (
    <section aria-label="Coordinate system">
      <p className="mb-1 text-small font-semibold">Coordinate system</p>
      <div className="border border-rule bg-sheet px-3 pt-2 pb-2.5">
        <div className="flex flex-wrap items-baseline justify-between gap-x-3 border-b border-hairline pb-1">
          <b className="text-body font-semibold">
            EPSG:{code} {crs?.name}
          </b>
          {children}
        </div>
        {error !== null && (
          <QueryError what="Its definition" error={error} onRetry={() => void refetch()} />
        )}
        {crs !== undefined && (
          <Facts
            facts={[
              ['Used in', crs.area],
              ['Between', boundsInWords(crs.bounds)],
              ['Axes', 'easting and northing, in metres'],
              [
                'Definition',
                <code key="d" className="text-cap break-words">
                  {crs.definition}
                </code>,
              ],
            ]}
          />
        )}
      </div>
    </section>
  );
}
