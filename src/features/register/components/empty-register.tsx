import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { importsPath } from '../../../config/paths.ts';

/** In place of the table where a scheme has no buildings. */
export function EmptyRegister({
  schemeId,
  mayEdit,
}: {
  readonly schemeId: string;
  readonly mayEdit: boolean;
}) {
  return (
    <div className="px-8 pt-4 max-sm:px-4">
      <h1 className="text-h1 max-sm:text-h2">Register</h1>
      <EmptyState
        action={
          mayEdit && (
            <ButtonLink kind="main" to={importsPath(schemeId)}>
              Bring in footprints
            </ButtonLink>
          )
        }
      >
        {mayEdit
          ? 'No buildings yet. Bring in footprints to start the register.'
          : 'No buildings yet. They stand here once an assessor has brought in footprints.'}
      </EmptyState>
    </div>
  );
}
