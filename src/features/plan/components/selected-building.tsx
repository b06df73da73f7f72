import type { UseQueryResult } from '@tanstack/react-query';
import type { ComponentProps } from 'react';
import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import type { RunAnswer } from '../../../../shared/schemas/runs.ts';
import { Button } from '../../../components/ui/button.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { isRefusal } from '../../../lib/api-error.ts';
import { RunResult } from '../../runs/components/run-result.tsx';
import { BuildingSheet } from '../../buildings/components/building-sheet.tsx';

export type BuildingQuery = Pick<UseQueryResult<BuildingAnswer>, 'data' | 'error' | 'refetch'>;

/** How the selected building is shown and changed. */
export type SheetProps = Omit<
  ComponentProps<typeof BuildingSheet>,
  'building' | 'action' | 'found'
>;

type SelectedBuildingProps = {
  readonly building: BuildingQuery;
  readonly sheet: SheetProps;
  /** The run that is shown. */
  readonly run: RunAnswer | null;
  readonly onDeselect: () => void;
};

function Content({ building, sheet, run }: Omit<SelectedBuildingProps, 'onDeselect'>) {
  const { data, error, refetch } = building;
  if (data !== undefined) {
    const { schemeId } = sheet;
    const found = run !== null && <RunResult {...{ schemeId, run }} buildingId={data.id} />;
    return <BuildingSheet {...sheet} building={data} found={found} />;
  }
  if (isRefusal(error, 'not-found')) {
    return <p className="text-body text-ink-2">There is no such building in this scheme.</p>;
  }
  if (error !== null) {
    return <QueryError what="The building" error={error} onRetry={() => void refetch()} />;
  }
  return <LoadingRows what="the building" rows={8} />;
}

/** The selected building, and the way to let go of it. */
export function SelectedBuilding({ building, sheet, run, onDeselect }: SelectedBuildingProps) {
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
      <Content {...{ building, sheet, run }} />
    </div>
  );
}
