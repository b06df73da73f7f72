import { EmptyState } from '../../components/ui/empty-state.tsx';
import { Content } from '../../components/layout/content.tsx';
import { PageTitle } from '../../components/layout/page-title.tsx';
import { useScheme } from '../schemes/scheme-context.ts';
import { PlanDesk } from './components/plan-desk.tsx';

/** The plan of a scheme: its map, and at the side what is selected. */
export function PlanPage() {
  const scheme = useScheme();
  const title = `Plan of ${scheme.name}`;
  return (
    <Content className="flex flex-col overflow-hidden max-md:overflow-auto">
      <PageTitle>{title}</PageTitle>
      <h1 className="sr-only">{title}</h1>
      {scheme.abilities.readRegister === true ? (
        <PlanDesk key={scheme.id} />
      ) : (
        <div className="p-8 max-sm:p-4">
          <EmptyState>The plan is for those who work on the scheme.</EmptyState>
        </div>
      )}
    </Content>
  );
}
