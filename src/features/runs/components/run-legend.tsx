import { useMemo } from 'react';
import type { RunMap } from '../../../../shared/schemas/run-map.ts';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { Segments } from '../../../components/ui/segments.tsx';
import { classNames } from '../../../lib/class-names.ts';
import { registerOfResults } from '../../register/register-of-results.ts';
import { foundAsShaded } from '../found-as-shaded.ts';
import { useRunKeys } from '../hooks/use-run-keys.ts';
import type { RunView } from '../hooks/use-run-view.ts';
import { runName } from '../../../../shared/presentation/run-words.ts';
import { countsOfShades, type Colouring, type Shading } from '../shades-of-run.ts';
import { LegendRows } from './legend-rows.tsx';
import { LineLegend } from './line-legend.tsx';

const COLOURINGS_TO_CHOOSE: readonly { value: Colouring; label: string }[] = [
  { value: 'category', label: 'Category' },
  { value: 'stage', label: 'Stage' },
  { value: 'settlement', label: 'Settlement' },
  { value: 'nothing', label: 'Nothing' },
];

const ENDS_TO_CHOOSE = [
  { value: 'low', label: 'Low' },
  { value: 'central', label: 'Central' },
  { value: 'high', label: 'High' },
] as const;

/** Those that take no colour: how many, and why. */
function othersOf({ by, shades }: Shading, { ids, stage }: RunMap): [number, string] | null {
  const count = ids.length - shades.size;
  if (count === 0) return null;
  if (by === 'settlement') return [count, 'Under 1 mm'];
  const letGo = stage.filter((one) => one === 1).length;
  return [count, count === letGo ? 'Let go at stage 1' : 'No category'];
}

/** By what, and at which value, buildings are coloured. */
function Choices({ view: { by, end, colourBy, showEnd } }: { readonly view: RunView }) {
  return (
    <div className="flex flex-wrap items-center gap-x-2 gap-y-1.5 [&_button]:px-2.5">
      <Segments
        label="Colour buildings by"
        segments={COLOURINGS_TO_CHOOSE}
        value={by}
        onChange={colourBy}
      />
      {by === 'category' && (
        <Segments
          label="Value that is shown"
          segments={ENDS_TO_CHOOSE}
          value={end}
          onChange={showEnd}
        />
      )}
    </div>
  );
}

/** On the map: what buildings are coloured by, what each colour stands for, and how many take it. */
export function RunLegend({
  view,
  isPreview,
}: {
  readonly view: RunView;
  readonly isPreview: boolean;
}) {
  const { run, by, end, figures, shading, error, showEnd } = view;
  useRunKeys(showEnd, run !== null && by === 'category');
  const counts = useMemo(() => countsOfShades(shading?.shades ?? new Map()), [shading]);
  if (run === null) return null;
  return (
    <section
      aria-label="Legend"
      className={classNames(
        'z-[5] grid gap-1.5 bg-paper-raised px-3 py-2 max-md:border-t max-md:border-hairline',
        'md:col-start-1 md:row-start-1 md:m-3 md:w-[300px] md:self-end md:justify-self-end',
        'md:rounded md:border md:border-rule md:shadow-lift',
      )}
    >
      <Choices view={view} />
      {isPreview && (
        <p className="text-cap text-clay-deep">
          Buildings as {runName(run).toLowerCase()} found them, before this change.
        </p>
      )}
      {error !== null && figures === undefined && (
        <QueryError what="What the run found" error={error} onRetry={() => void view.refetch()} />
      )}
      {error === null && figures === undefined && (
        <p className="appear-late text-small text-ink-3">Fetching what the run found.</p>
      )}
      {shading !== null && figures !== undefined && (
        <LegendRows
          by={shading.by}
          counts={counts}
          listAt={
            run.isShown
              ? (shade) => registerOfResults(view.schemeId, foundAsShaded(shading.by, end, shade))
              : undefined
          }
          others={othersOf(shading, figures)}
        />
      )}
      <LineLegend />
    </section>
  );
}
