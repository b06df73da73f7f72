import { useQuery } from '@tanstack/react-query';
import type { RunAnswer, RunBuilding } from '../../../../shared/schemas/runs.ts';
import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { sheetPath } from '../../../config/paths.ts';
import { isRefusal } from '../../../lib/api-error.ts';
import { runBuildingQuery } from '../api/get-run-building.ts';
import { runName } from '../../../../shared/presentation/run-words.ts';
import { FoundCategory } from './found-category.tsx';
import { FoundFigures } from './found-figures.tsx';

type RunResultProps = {
  readonly schemeId: string;
  readonly run: RunAnswer;
  readonly buildingId: number;
};

function Found({ result, changedSince }: RunBuilding) {
  return (
    <>
      {result.fault === null ? (
        <FoundCategory result={result} />
      ) : (
        <p className="text-small">Not worked out: {result.fault}</p>
      )}
      <FoundFigures result={result} />
      {changedSince && (
        <p className="mt-1.5 text-cap text-clay-deep">
          The register has changed for this building since.
        </p>
      )}
    </>
  );
}

/** What the run that is shown found of a building. */
export function RunResult({ schemeId, run, buildingId }: RunResultProps) {
  const { data, error, refetch } = useQuery(runBuildingQuery(schemeId, run.id, buildingId));
  const heading = `What ${runName(run).toLowerCase()} found`;
  return (
    <section aria-label={heading} className="mt-3 border-t-2 border-ink pt-2.5">
      {data !== undefined && (
        <>
          <Found {...data} />
          <ButtonLink to={sheetPath(schemeId, buildingId, run.id)} className="mt-2.5">
            Open sheet
          </ButtonLink>
        </>
      )}
      {data === undefined && error === null && <LoadingRows what="what the run found" rows={4} />}
      {isRefusal(error, 'not-found') && (
        <p className="text-small text-ink-2">
          This building was not in {runName(run).toLowerCase()}.
        </p>
      )}
      {error !== null && !isRefusal(error, 'not-found') && (
        <QueryError what="What the run found" error={error} onRetry={() => void refetch()} />
      )}
    </section>
  );
}
