import { useNavigate } from 'react-router-dom';
import { Page } from '../../components/layout/page.tsx';
import { schemePath } from '../../config/paths.ts';
import { NewSchemeForm } from '../../features/schemes/components/new-scheme-form.tsx';

export function NewSchemePage() {
  const navigate = useNavigate();
  return (
    <Page
      title="New scheme"
      lead="One line under one town: its own grid, people, rules and register."
    >
      <NewSchemeForm onMade={(scheme) => void navigate(schemePath(scheme.id))} />
    </Page>
  );
}
