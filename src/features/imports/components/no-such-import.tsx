import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { importsPath } from '../../../config/paths.ts';
import { useScheme } from '../../schemes/scheme-context.ts';

/** In place of an import that is not there, or not any more. */
export function NoSuchImport() {
  const scheme = useScheme();
  return (
    <div className="px-8 py-4 max-sm:px-4">
      <h1 className="text-h1">Nothing here</h1>
      <EmptyState action={<ButtonLink to={importsPath(scheme.id)}>Bring in a file</ButtonLink>}>
        This import is not there any more.
      </EmptyState>
    </div>
  );
}
