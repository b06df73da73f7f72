import type { Measure } from './marks.ts';
import type { PlanMaterial } from './plan-material.ts';
import type { PlannedSheet } from './planned-sheets.ts';
import { planSheets } from './plan-sheets.ts';
import { sectionSheet } from './section-sheet.ts';
import type { AboutSheets, Sheet } from './sheet.ts';

/**
 * Draws one of the sheets of a print, with the lists of labels that had no room on it as sheets behind it.
 *
 * Units: as the parts. Valid: `planned` is one of `all`, material of the ground of its box. Source: [own].
 */
export function drawnSheets(
  planned: PlannedSheet,
  all: readonly PlannedSheet[],
  material: PlanMaterial,
  about: AboutSheets,
  measure: Measure,
): Sheet[] {
  const { what } = planned;
  return what.kind === 'plan'
    ? planSheets({ planned, plan: what, all, material, about, measure })
    : [sectionSheet({ planned, section: what, all, material, about, measure })];
}
