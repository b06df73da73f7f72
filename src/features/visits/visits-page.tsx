import { NotFoundPage } from '../../app/routes/not-found.tsx';
import { Content } from '../../components/layout/content.tsx';
import { Page } from '../../components/layout/page.tsx';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { VisitsDesk } from './components/visits-desk.tsx';

/** The buildings to visit, for who walks along them with a phone. */
export function VisitsPage() {
  const scheme = useScheme();
  return (
    <Content>
      {can(scheme, 'recordVisits') ? (
        <Page title="Visits">
          <VisitsDesk key={scheme.id} schemeId={scheme.id} />
        </Page>
      ) : (
        <NotFoundPage />
      )}
    </Content>
  );
}
