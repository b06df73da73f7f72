import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import type { ImportAnswer, ImportRow } from '../../../../shared/schemas/imports.ts';
import { ROWS_PER_PAGE, rowsQuery, type RowsAsked } from '../api/list-rows.ts';
import type { CheckedImport } from './use-last-checked.ts';
import { findPage } from '../find-page.ts';
import type { RowFilter } from '../outcomes.ts';

/** Which line is open, and whether it was pressed on the map. */
type Opened = { readonly open: number | null; readonly isOnMap: boolean };

const ALL: RowsAsked = { filter: null, offset: 0 };
const NOTHING: Opened = { open: null, isOnMap: false };
const NO_ROWS: readonly ImportRow[] = [];

/** The lines of a report: which are shown, and which one is open. */
export function useReport(schemeId: string, answer: ImportAnswer, checked: CheckedImport | null) {
  const client = useQueryClient();
  const [asked, setAsked] = useState<RowsAsked>(ALL);
  const [{ open, isOnMap }, setOpened] = useState<Opened>(NOTHING);
  const page = useQuery({
    ...rowsQuery(schemeId, checked ?? answer, asked),
    enabled: checked !== null,
  });
  const rows = page.data?.rows ?? NO_ROWS;
  const places = useMemo(() => rows.flatMap(({ centre }) => (centre ? [centre] : [])), [rows]);
  const shown = rows.find(({ row }) => row === open);

  async function openByRow(row: number): Promise<void> {
    setOpened({ open: row, isOnMap: true });
    if (rows.some((one) => one.row === row)) return;
    const offset = await findPage(row, ROWS_PER_PAGE, (from) =>
      client.query(rowsQuery(schemeId, checked ?? answer, { filter: null, offset: from })),
    );
    if (offset !== null) setAsked({ filter: null, offset });
  }
  return {
    page,
    asked,
    open,
    shown,
    places,
    /** Where the open row is, unless it was pressed there. */
    centre: isOnMap ? null : (shown?.centre ?? null),
    setOpen: (row: number | null) => {
      setOpened({ open: row, isOnMap: false });
    },
    openByRow,
    narrow: (filter: RowFilter | null) => {
      setAsked({ filter, offset: 0 });
      setOpened(NOTHING);
    },
    goTo: (offset: number) => {
      setAsked((now) => ({ ...now, offset }));
    },
  };
}

export type Report = ReturnType<typeof useReport>;
