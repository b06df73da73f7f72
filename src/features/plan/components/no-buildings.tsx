import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { importsPath, settingsPath } from '../../../config/paths.ts';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { can } from '../../schemes/can.ts';

type NoBuildingsProps = {
  readonly scheme: SchemeAnswer;
  /** Whether streets, water, rail or parks are there already. */
  readonly hasBackground: boolean;
};

/** In place of a building where a scheme has none. */
export function NoBuildings({ scheme, hasBackground }: NoBuildingsProps) {
  if (can(scheme, 'updateRegister')) {
    return (
      <EmptyState
        action={
          <ButtonLink kind="main" to={importsPath(scheme.id)}>
            Bring in footprints
          </ButtonLink>
        }
      >
        No buildings yet. Bring in footprints to start the register.
      </EmptyState>
    );
  }
  const canBring = can(scheme, 'updateBackground') && !hasBackground;
  return (
    <EmptyState
      action={
        canBring && (
          <ButtonLink kind="main" to={settingsPath(scheme.id, 'background')}>
            Bring in streets and water
          </ButtonLink>
        )
      }
    >
      {canBring
        ? 'No buildings yet. Bring in streets and water to see where they will stand.'
        : 'No buildings yet. They stand here once the register has some.'}
    </EmptyState>
  );
}
