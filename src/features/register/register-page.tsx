import { Content } from '../../components/layout/content.tsx';
import { PageTitle } from '../../components/layout/page-title.tsx';
import { EmptyState } from '../../components/ui/empty-state.tsx';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { RegisterWork } from './components/register-work.tsx';

/** The register of a scheme: every building, to be found, read, compared and changed. */
export function RegisterPage() {
  const scheme = useScheme();
  return (
    <Content className="flex flex-col overflow-hidden print:block">
      <PageTitle>{`Register of ${scheme.name}`}</PageTitle>
      {can(scheme, 'readRegister') ? (
        <RegisterWork key={scheme.id} />
      ) : (
        <div className="p-8 max-sm:p-4">
          <EmptyState>The register is for those who work on the scheme.</EmptyState>
        </div>
      )}
    </Content>
  );
}
