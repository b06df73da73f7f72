import { useQuery } from '@tanstack/react-query';
import { Content } from '../../components/layout/content.tsx';
import { Page } from '../../components/layout/page.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { Panel } from '../../components/ui/panel.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { SchemeBasis } from '../../features/schemes/components/scheme-basis.tsx';
import { can } from '../../features/schemes/can.ts';
import { useScheme } from '../../features/schemes/scheme-context.ts';
import { importsQuery } from '../../features/imports/api/list-imports.ts';
import { ImportsTable } from '../../features/imports/components/imports-table.tsx';
import { NewImport } from '../../features/imports/components/new-import.tsx';
import { NotFoundPage } from './not-found.tsx';

/** Brings buildings in, and lists what was brought in before. */
function Imports() {
  const scheme = useScheme();
  const { data: imports, error, refetch } = useQuery(importsQuery(scheme.id));
  return (
    <>
      <SchemeBasis scheme={scheme} />
      <Content>
        <Page
          title="Bring in buildings"
          lead="You see what will happen before anything is written. Buildings that are there already are updated by their reference; what was changed by hand is kept."
        >
          <NewImport schemeId={scheme.id} />
          <Panel title="Earlier imports" className="mt-8 max-w-[860px]">
            {error !== null && (
              <QueryError what="The list" error={error} onRetry={() => void refetch()} />
            )}
            {imports === undefined && error === null && <LoadingRows what="the imports" rows={3} />}
            {imports?.length === 0 && (
              <p className="py-3 text-body text-ink-2">None yet. The first one stands here.</p>
            )}
            {imports !== undefined && imports.length > 0 && (
              <ImportsTable schemeId={scheme.id} imports={imports} />
            )}
          </Panel>
        </Page>
      </Content>
    </>
  );
}

/** For who may change the register. */
export function ImportsPage() {
  return can(useScheme(), 'updateRegister') ? (
    <Imports />
  ) : (
    <Content>
      <NotFoundPage />
    </Content>
  );
}
