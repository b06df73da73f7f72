import type { Measure } from './marks.ts';
import type { PlanMaterial } from './plan-material.ts';
import type { PlannedSheet } from './planned-sheets.ts';
import { planSheets } from './plan-sheets.ts';
import { sectionSheets } from './section-sheets.ts';
import type { AboutSheets, Sheet } from './sheet.ts';

/**
 * Draws one of the sheets of a print, with sheets behind it that hold labels and notes without room.
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
    : sectionSheets({ planned, section: what, all, material, about, measure });
}
