import { useQuery } from '@tanstack/react-query';
import type { RefObject } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { isRefusal } from '../../../lib/api-error.ts';
import { buildingQuery } from '../../buildings/api/get-building.ts';
import { BuildingSheet, type SheetView } from '../../buildings/components/building-sheet.tsx';
import type { Done } from './done-line.tsx';

type BuildingSideProps = {
  readonly schemeId: string;
  readonly buildingId: number;
  readonly mayEdit: boolean;
  readonly view: SheetView;
  readonly onView: (view: SheetView) => void;
  readonly onShowOnPlan: () => void;
  readonly onDone: (done: Done) => void;
  readonly onClose: () => void;
  /** Gets the focus when a building is opened. */
  readonly frame: RefObject<HTMLElement | null>;
};

/** The opened building beside the table: what is known, changed by hand, and its history. */
export function BuildingSide({
  buildingId,
  onShowOnPlan,
  onDone,
  onClose,
  frame,
  ...sheet
}: BuildingSideProps) {
  const { schemeId } = sheet;
  const { data, error, refetch } = useQuery(buildingQuery(schemeId, buildingId));
  return (
    <section
      ref={frame}
      tabIndex={-1}
      aria-label="Opened building"
      className="relative px-4 pt-3 pb-6 outline-none"
    >
      {sheet.view !== 'edit' && (
        <Button
          kind="quiet"
          className="float-right -mt-1 -mr-1.5 max-sm:-mt-2"
          aria-label="Close the building"
          onClick={onClose}
        >
          Close{' '}
          <span className="max-sm:hidden">
            <KeyCap>Esc</KeyCap>
          </span>
        </Button>
      )}
      {data !== undefined && (
        <BuildingSheet
          {...sheet}
          building={data}
          onChanged={({ changeId }) => {
            onDone({ words: `${data.reference} changed.`, changeIds: [changeId] });
          }}
          action={<Button onClick={onShowOnPlan}>Show on plan</Button>}
        />
      )}
      {data === undefined && error === null && <LoadingRows what="the building" rows={8} />}
      {data === undefined && isRefusal(error, 'not-found') && (
        <p className="text-body text-ink-2">There is no such building in this scheme.</p>
      )}
      {data === undefined && error !== null && !isRefusal(error, 'not-found') && (
        <QueryError what="The building" error={error} onRetry={() => void refetch()} />
      )}
    </section>
  );
}
