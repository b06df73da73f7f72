import { useQuery } from '@tanstack/react-query';
import type { RunBuilding } from '../../../../shared/schemas/runs.ts';
import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { sheetPath } from '../../../config/paths.ts';
import { runBuildingQuery } from '../../runs/api/get-run-building.ts';
import { useSheetKeys } from '../hooks/use-sheet-keys.ts';

type SheetsBesideProps = {
  readonly schemeId: string;
  readonly runId: string;
  readonly building: Pick<RunBuilding, 'previous' | 'next'>;
};

/** Fetches a sheet before it is asked for, so that it is there when it is. */
function useFetched(schemeId: string, runId: string, buildingId: number | null): void {
  useQuery({ ...runBuildingQuery(schemeId, runId, buildingId ?? 0), enabled: buildingId !== null });
}

/** To the sheets before and after this one, by reference. */
export function SheetsBeside({ schemeId, runId, building }: SheetsBesideProps) {
  useFetched(schemeId, runId, building.previous);
  useFetched(schemeId, runId, building.next);
  const pathOf = (id: number | null) => (id === null ? null : sheetPath(schemeId, id, runId));
  const [previous, next] = [pathOf(building.previous), pathOf(building.next)];
  useSheetKeys({ previous, next });
  return (
    <nav aria-label="Sheets by reference" className="flex gap-2">
      {previous !== null && (
        <ButtonLink to={previous}>
          Previous <KeyCap>[</KeyCap>
        </ButtonLink>
      )}
      {next !== null && (
        <ButtonLink to={next}>
          Next <KeyCap>]</KeyCap>
        </ButtonLink>
      )}
    </nav>
  );
}
