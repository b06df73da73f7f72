import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { settingsPath } from '../../../config/paths.ts';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';

/** In place of a building where a scheme has none. */
export function NoBuildings({ scheme }: { readonly scheme: SchemeAnswer }) {
  const mayBring = scheme.abilities.updateBackground === true;
  return (
    <EmptyState
      action={
        mayBring && (
          <ButtonLink kind="main" to={settingsPath(scheme.id, 'background')}>
            Bring in streets and water
          </ButtonLink>
        )
      }
    >
      {mayBring
        ? 'No buildings yet. Bring in streets and water to see where they will stand.'
        : 'No buildings yet. They stand here once the register has some.'}
    </EmptyState>
  );
}
