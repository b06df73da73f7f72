import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { partyImportsPath } from '../../../config/paths.ts';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';

/** What to do first where nobody is known yet. */
export function NoParties() {
  const scheme = useScheme();
  const mayBringIn = can(scheme, 'updateParties');
  return (
    <EmptyState
      action={
        mayBringIn ? (
          <ButtonLink kind="main" to={partyImportsPath(scheme.id)}>
            Bring in a table
          </ButtonLink>
        ) : undefined
      }
    >
      No parties yet. Bring in who owns, rents and manages the buildings, and letters can go to
      them.
      {mayBringIn && ' A form with all buildings to fill in is there too.'}
    </EmptyState>
  );
}
