import { useQuery } from '@tanstack/react-query';
import { useLocation, useParams } from 'react-router-dom';
import { NotFoundPage } from '../../app/routes/not-found.tsx';
import { Content } from '../../components/layout/content.tsx';
import { Page } from '../../components/layout/page.tsx';
import { ErrorNote } from '../../components/ui/error-note.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { isRefusal } from '../../lib/api-error.ts';
import { buildingQuery } from '../buildings/api/get-building.ts';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { VisitDesk } from './components/visit-desk.tsx';
import { useOpenedDraft } from './hooks/use-opened-draft.ts';
import { titleOfBuilding } from './visit-words.ts';

type VisitOfProps = { readonly schemeId: string; readonly buildingId: number };

function VisitOf({ schemeId, buildingId }: VisitOfProps) {
  const { key } = useLocation();
  const building = useQuery(buildingQuery(schemeId, buildingId));
  const title =
    building.data === undefined ? `Building ${buildingId}` : titleOfBuilding(building.data);
  const isReady = building.data !== undefined || building.error !== null;
  const draft = useOpenedDraft({ schemeId, buildingId, title }, key, isReady);
  if (isRefusal(building.error, 'not-found')) return <NotFoundPage />;
  return (
    <Page title={`Visit: ${draft.data?.title ?? title}`}>
      {draft.error !== null && (
        <ErrorNote failed="This browser cannot keep visits." stands={draft.error.message} />
      )}
      {draft.data === undefined && draft.error === null && <LoadingRows what="the building" />}
      {draft.data !== undefined && (
        <VisitDesk key={draft.data.id} opened={draft.data} building={building.data ?? null} />
      )}
    </Page>
  );
}

/** Recording a visit of one building, with a network or without. */
export function VisitPage() {
  const scheme = useScheme();
  const { key } = useLocation();
  const id = Number(useParams().buildingId);
  const isKnown = can(scheme, 'recordVisits') && Number.isSafeInteger(id) && id > 0;
  return (
    <Content>
      {isKnown ? <VisitOf key={key} schemeId={scheme.id} buildingId={id} /> : <NotFoundPage />}
    </Content>
  );
}
