import { useEffect, useEffectEvent, useRef, useState } from 'react';
import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { QueryError } from '../../../components/ui/query-error.tsx';
import type { MapHandle } from '../../map/map-handle.ts';
import { LazyPlanMap } from '../../plan/components/lazy-plan-map.tsx';
import { MapPause } from '../../plan/components/map-pause.tsx';
import { useScheme } from '../../schemes/scheme-context.ts';
import { homeOfRows } from '../home-of-rows.ts';
import type { CheckedImport } from '../hooks/use-last-checked.ts';
import { useImportPlan } from '../hooks/use-import-plan.ts';
import { OutcomeLegend } from './outcome-legend.tsx';

type Place = readonly [longitude: number, latitude: number];

type ImportMapProps = {
  readonly fileName: string;
  /** The import as it was last checked, if ever. */
  readonly checked: CheckedImport | null;
  /** The row whose line is open, and where it is. */
  readonly row: number | null;
  readonly centre: Place | null;
  /** Where the rows of the report are that are at hand. */
  readonly places: readonly Place[];
  readonly onRow: (row: number | null) => void;
};

type Box = readonly [number, number, number, number];

function meets(a: Box, b: Box): boolean {
  return a[0] <= b[2] && b[0] <= a[2] && a[1] <= b[3] && b[1] <= a[3];
}

/** Shows where the rows are when they are first there, and again when they have gone somewhere else. */
function useFollowRows(
  handle: MapHandle | null,
  bounds: ImportAnswer['bounds'],
  places: readonly Place[],
): void {
  const fitted = useRef<{ readonly handle: MapHandle; readonly bounds: Box }>(null);
  const home = bounds === null ? null : homeOfRows(bounds, places);
  const isKnown = home !== null;
  const fit = useEffectEvent(() => {
    if (handle === null || bounds === null || home === null) return;
    const last = fitted.current;
    if (last?.handle === handle && meets(last.bounds, bounds)) return;
    fitted.current = { handle, bounds };
    handle.fit(home);
  });
  useEffect(() => {
    fit();
  }, [handle, bounds, isKnown]);
}

function useShowRow(
  handle: MapHandle | null,
  { row, centre }: Pick<ImportMapProps, 'row' | 'centre'>,
): void {
  const show = useEffectEvent(() => {
    if (handle === null || centre === null) return;
    const [longitude, latitude] = centre;
    handle.bringIntoView([longitude, latitude, longitude, latitude]);
  });
  const isKnown = centre !== null;
  useEffect(() => {
    show();
  }, [handle, row, isKnown]);
}

/** The rows of a file over the background and what the scheme has already, by what becomes of them. */
export function ImportMap({ fileName, checked, row, centre, places, onRow }: ImportMapProps) {
  const scheme = useScheme();
  const { ready, error, retry } = useImportPlan(scheme.id, checked, places);
  const [handle, setHandle] = useState<MapHandle | null>(null);
  useFollowRows(handle, checked?.bounds ?? null, places);
  useShowRow(handle, { row, centre });
  if (ready === null) {
    if (error === null) return <MapPause />;
    return (
      <div className="p-4">
        <QueryError what="The map" error={error} onRetry={retry} />
      </div>
    );
  }
  return (
    <div className="relative size-full max-md:flex max-md:flex-col">
      <div className="size-full min-h-0 max-md:flex-1">
        <LazyPlanMap
          plan={ready.plan}
          label={`Map of ${fileName}`}
          home={ready.home}
          gridDefinition={ready.crs.definition}
          selected={ready.hasRows ? row : null}
          onSelect={(id) => {
            // without rows, what is pressed is a building
            if (ready.hasRows) onRow(id);
          }}
          onHandle={setHandle}
        />
      </div>
      {ready.hasRows && checked !== null && (
        <div className="absolute right-3 bottom-3 max-md:static max-md:border-b max-md:border-rule">
          <OutcomeLegend counts={checked.counts} />
        </div>
      )}
    </div>
  );
}
