import type { LineOnGround } from './line-on-ground.ts';
import type { Mark, Measure } from './marks.ts';
import type { PlanMaterial } from './plan-material.ts';
import type { AboutSheets } from './sheet.ts';

/**
 * What sections are drawn from.
 *
 * Units: as the parts. Valid: material of the ground of the sections. Source: [own].
 */
export type SectionRoom = {
  readonly line: LineOnGround;
  readonly material: PlanMaterial;
  readonly about: AboutSheets;
  readonly measure: Measure;
};

/**
 * Sections on paper, and the buildings in them whose reference has no room.
 *
 * Units: mm. Valid: buildings with a reference in the marks and those without are all that the cut meets.
 * Source: [own].
 */
export type DrawnSections = {
  readonly marks: readonly Mark[];
  readonly unnamed: readonly { readonly reference: string; readonly where: string }[];
};

/**
 * Sections that were laid one under the other, as one drawing.
 *
 * Units: mm. Valid: any. Source: [own].
 */
export function oneUnderTheOther(drawn: readonly DrawnSections[]): DrawnSections {
  return {
    marks: drawn.flatMap(({ marks }) => marks),
    unnamed: drawn.flatMap(({ unnamed }) => unnamed),
  };
}
