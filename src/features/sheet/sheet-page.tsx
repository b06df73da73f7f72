import { useQuery } from '@tanstack/react-query';
import { useParams, useSearchParams } from 'react-router-dom';
import { NotFoundPage } from '../../app/routes/not-found.tsx';
import { Page } from '../../components/layout/page.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { isRefusal } from '../../lib/api-error.ts';
import { runBuildingQuery } from '../runs/api/get-run-building.ts';
import { runQuery } from '../runs/api/get-run.ts';
import { runsQuery } from '../runs/api/list-runs.ts';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { SheetDesk } from './components/sheet-desk.tsx';

type SheetOfRunProps = {
  readonly schemeId: string;
  readonly runId: string;
  readonly buildingId: number;
};

function SheetOfRun({ schemeId, runId, buildingId }: SheetOfRunProps) {
  const run = useQuery(runQuery(schemeId, runId));
  const building = useQuery(runBuildingQuery(schemeId, runId, buildingId));
  if (run.data !== undefined && building.data !== undefined) {
    return <SheetDesk schemeId={schemeId} run={run.data} building={building.data} />;
  }
  const error = run.error ?? building.error;
  if (isRefusal(error, 'not-found')) {
    return (
      <Page title="Sheet">
        <p className="text-roomy">This building was not in that run, or there is no such run.</p>
      </Page>
    );
  }
  return (
    <Page title="Sheet">
      {error === null ? (
        <LoadingRows what="the sheet" rows={12} />
      ) : (
        <QueryError
          what="The sheet"
          error={error}
          onRetry={() => void Promise.all([run.refetch(), building.refetch()])}
        />
      )}
    </Page>
  );
}

function NewestSheet({ schemeId, buildingId }: Omit<SheetOfRunProps, 'runId'>) {
  const { data: runs, error, refetch } = useQuery(runsQuery(schemeId));
  const shown = runs?.find(({ isShown }) => isShown);
  if (shown !== undefined) {
    return <SheetOfRun schemeId={schemeId} runId={shown.id} buildingId={buildingId} />;
  }
  return (
    <Page title="Sheet">
      {error !== null && (
        <QueryError what="The runs" error={error} onRetry={() => void refetch()} />
      )}
      {error === null && runs === undefined && <LoadingRows what="the sheet" rows={12} />}
      {runs !== undefined && (
        <p className="text-roomy">No run yet. Run an option on the plan to see what it does.</p>
      )}
    </Page>
  );
}

/** One building in one run, with everything that its figures rest on. */
export function SheetPage() {
  const scheme = useScheme();
  const { buildingId = '' } = useParams();
  const [search] = useSearchParams();
  const id = Number(buildingId);
  if (!can(scheme, 'readRuns') || !Number.isSafeInteger(id) || id < 1) return <NotFoundPage />;
  const runId = search.get('run');
  const place = { schemeId: scheme.id, buildingId: id };
  return runId === null ? <NewestSheet {...place} /> : <SheetOfRun {...place} runId={runId} />;
}
