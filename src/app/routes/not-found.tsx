import { Page } from '../../components/layout/page.tsx';
import { ButtonLink } from '../../components/ui/button-link.tsx';
import { EmptyState } from '../../components/ui/empty-state.tsx';
import { PATHS } from '../../config/paths.ts';

/** For addresses that lead nowhere, and for what is not the person's to see: both look alike. */
export function NotFoundPage() {
  return (
    <Page title="Nothing here">
      <EmptyState action={<ButtonLink to={PATHS.schemes}>Schemes</ButtonLink>}>
        There is nothing at this address, or it is not yours to see.
      </EmptyState>
    </Page>
  );
}
