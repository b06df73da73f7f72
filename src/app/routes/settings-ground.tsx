import { useQuery } from '@tanstack/react-query';
import { Page } from '../../components/layout/page.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { Panel } from '../../components/ui/panel.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { groundQuery } from '../../features/ground/api/get-ground.ts';
import { GroundFacts } from '../../features/ground/components/ground-facts.tsx';
import { LevelForm } from '../../features/ground/components/level-form.tsx';
import { LevelsFileForm } from '../../features/ground/components/levels-file-form.tsx';
import { can } from '../../features/schemes/can.ts';
import { useScheme } from '../../features/schemes/scheme-context.ts';
import { NotFoundPage } from './not-found.tsx';

function Ground() {
  const scheme = useScheme();
  const { data: answer, error, refetch } = useQuery(groundQuery(scheme.id));
  const mayChange = can(scheme, 'updateRegister');
  return (
    <Page
      title="Ground"
      lead="Buildings that bring no ground level take it from here: read between spot heights or cells, at the middle of each footprint. New ground takes the place of the one before."
    >
      <div className="max-w-[760px]">
        {error !== null && (
          <QueryError what="The ground" error={error} onRetry={() => void refetch()} />
        )}
        {answer === undefined && error === null && <LoadingRows what="the ground" rows={4} />}
        {answer !== undefined && (
          <GroundFacts schemeId={scheme.id} answer={answer} mayChange={mayChange} />
        )}
        {mayChange && (
          <div className="mt-6 grid grid-cols-2 gap-x-10 gap-y-6 max-sm:grid-cols-1 [&>section]:mt-0">
            <Panel title="Spot heights or a grid">
              <LevelsFileForm schemeId={scheme.id} schemeCrs={scheme.crs} />
            </Panel>
            <Panel title="One level for all">
              <LevelForm schemeId={scheme.id} />
            </Panel>
          </div>
        )}
      </div>
    </Page>
  );
}

export function GroundPage() {
  return can(useScheme(), 'readRegister') ? <Ground /> : <NotFoundPage />;
}
