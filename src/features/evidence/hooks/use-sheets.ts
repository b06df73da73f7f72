import { useQuery } from '@tanstack/react-query';
import { useDeferredValue, useMemo } from 'react';
import { boxOfSheet } from '../../../../shared/evidence/box-of-sheet.ts';
import { drawnSheets } from '../../../../shared/evidence/drawn-sheets.ts';
import { lineOnGround } from '../../../../shared/evidence/line-on-ground.ts';
import { plannedSheets, type PlannedSheet } from '../../../../shared/evidence/planned-sheets.ts';
import type { AboutSheets, Sheet } from '../../../../shared/evidence/sheet.ts';
import { MethodError } from '../../../../shared/method-error.ts';
import type { DrawnLayout, EvidenceLayout } from '../../../../shared/schemas/evidence.ts';
import { materialQuery } from '../api/material.ts';
import type { Faults } from '../layout-draft.ts';
import { screenMeasure, sheetFonts } from '../measure.ts';

type About = Omit<AboutSheets, 'fields'>;
type Planned = { readonly sheets: readonly PlannedSheet[]; readonly faults: Faults };

const NOTHING: Planned = { sheets: [], faults: {} };

function plan(layout: DrawnLayout, about: About): Planned {
  try {
    return { sheets: plannedSheets(layout, about.run.design), faults: {} };
  } catch (error) {
    if (!(error instanceof MethodError)) throw error;
    return { sheets: [], faults: { [error.field ?? 'denominator']: error.message } };
  }
}

function isDrawn(layout: EvidenceLayout | null): layout is DrawnLayout {
  return layout !== null && layout.kind !== 'schedule';
}

/** The sheets of a layout, and one of them as it will be printed. */
export function useSheets(
  schemeId: string,
  about: About | undefined,
  asked: EvidenceLayout | null,
  wanted: number,
) {
  // what is written goes on while a sheet is drawn
  const layout = useDeferredValue(asked);
  const planned = useMemo(
    () => (about === undefined || !isDrawn(layout) ? NOTHING : plan(layout, about)),
    [about, layout],
  );
  const fonts = useQuery({ queryKey: ['sheet fonts'], queryFn: sheetFonts, staleTime: Infinity });
  const hasFonts = fonts.isFetched;
  const measure = useMemo(() => (hasFonts ? screenMeasure() : null), [hasFonts]);
  const one = planned.sheets[Math.min(wanted, planned.sheets.length) - 1];
  const box = useMemo(
    () =>
      about === undefined || one === undefined
        ? null
        : boxOfSheet(one, lineOnGround(about.run.design.line)),
    [about, one],
  );
  const nowhere = { west: 0, south: 0, east: 0, north: 0 };
  const found = useQuery({
    ...materialQuery(schemeId, about?.run.id ?? '', box ?? nowhere),
    enabled: box !== null,
  });
  const material = found.data?.material;
  const drawn = useMemo((): readonly Sheet[] => {
    if (about === undefined || one === undefined || material === undefined) return [];
    if (layout === null || measure === null) return [];
    const words = { ...about, fields: layout.fields };
    return drawnSheets(one, planned.sheets, material, words, measure);
  }, [about, one, material, layout, planned, measure]);
  return {
    count: planned.sheets.length,
    faults: planned.faults,
    one,
    drawn,
    error: found.error,
    retry: () => void found.refetch(),
    isStale: found.isPlaceholderData || layout !== asked,
  };
}
