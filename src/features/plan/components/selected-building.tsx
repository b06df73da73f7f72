import type { UseQueryResult } from '@tanstack/react-query';
import type { ComponentProps } from 'react';
import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import { Button } from '../../../components/ui/button.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { isRefusal } from '../../../lib/api-error.ts';
import { BuildingSheet } from '../../buildings/components/building-sheet.tsx';

export type BuildingQuery = Pick<UseQueryResult<BuildingAnswer>, 'data' | 'error' | 'refetch'>;

/** How the selected building is shown and changed. */
export type SheetProps = Omit<ComponentProps<typeof BuildingSheet>, 'building' | 'action'>;

type SelectedBuildingProps = {
  readonly building: BuildingQuery;
  readonly sheet: SheetProps;
  readonly onDeselect: () => void;
};

function Content({ building, sheet }: Omit<SelectedBuildingProps, 'onDeselect'>) {
  const { data, error, refetch } = building;
  if (data !== undefined) return <BuildingSheet {...sheet} building={data} />;
  if (isRefusal(error, 'not-found')) {
    return <p className="text-body text-ink-2">There is no such building in this scheme.</p>;
  }
  if (error !== null) {
    return <QueryError what="The building" error={error} onRetry={() => void refetch()} />;
  }
  return <LoadingRows what="the building" rows={8} />;
}

/** The selected building, and the way to let go of it. */
export function SelectedBuilding({ building, sheet, onDeselect }: SelectedBuildingProps) {
  return (
    <div className="relative">
      {sheet.view !== 'edit' && (
        <Button
          kind="quiet"
          className="float-right -mt-1.5 -mr-1.5 max-sm:-mt-3.5"
          onClick={onDeselect}
        >
          Deselect{' '}
          <span className="max-sm:hidden">
            <KeyCap>Esc</KeyCap>
          </span>
        </Button>
      )}
      <Content {...{ building, sheet }} />
    </div>
  );
}
