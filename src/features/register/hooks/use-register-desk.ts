import { useState } from 'react';
import { NARROW, useMedia } from '../../../hooks/use-media.ts';
import type { SheetView } from '../../buildings/components/building-sheet.tsx';
import type { Done } from '../components/done-line.tsx';
import { useActiveBuilding } from './use-active-building.ts';
import { useMapPane } from './use-map-pane.ts';
import { useMarks } from './use-marks.ts';
import { useRegisterAddress } from './use-register-address.ts';
import { useRegisterRows } from './use-register-rows.ts';
import { useShowOnPlan } from './use-show-on-plan.ts';

/** The register at work: its rows, the row that is reached, what is marked, opened and shown on the map. */
export function useRegisterDesk(schemeId: string, personId: string) {
  const address = useRegisterAddress();
  const { which, opened } = address;
  const rows = useRegisterRows(schemeId, which);
  const active = useActiveBuilding(schemeId, which, rows, opened);
  const marks = useMarks(which.filter, rows.page?.found ?? 0);
  const mapPane = useMapPane(personId);
  const onPlan = useShowOnPlan(schemeId, { activeId: active.id, opened, mapPane });
  const [sideView, setSideView] = useState<SheetView>('facts');
  const [done, setDone] = useState<Done | null>(null);
  // there an opened building covers the whole page
  const isCovered = useMedia(NARROW) && opened !== null;

  /** What is opened goes along with the row, unless it is being changed. */
  function follow(buildingId: number | undefined) {
    if (opened === null || buildingId === undefined || sideView === 'edit') return;
    address.open(buildingId);
  }
  return {
    address,
    rows,
    active,
    marks,
    mapPane,
    ...onPlan,
    sideView,
    setSideView,
    done: { inSide: isCovered ? done : null, inFoot: isCovered ? null : done },
    setDone,
    reachRow: (index: number) => {
      active.reachRow(index);
      follow(rows.rowAt(index)?.id);
    },
    pressOnMap: (buildingId: number | null) => {
      active.reachBuilding(buildingId);
      follow(buildingId ?? undefined);
    },
    open: (buildingId: number | null) => {
      if (buildingId === null || sideView === 'edit') return;
      setSideView('facts');
      address.open(buildingId);
    },
    close: () => {
      if (sideView === 'edit') return;
      setSideView('facts');
      address.open(null);
    },
  };
}

export type RegisterDesk = ReturnType<typeof useRegisterDesk>;
