import type { Box } from '../geometry/bounding-box.ts';
import type { LineOnGround } from './line-on-ground.ts';
import { boxOfSection } from './planned-sections.ts';
import type { PlannedSheet } from './planned-sheets.ts';

/**
 * The ground that a sheet shows: what is to be sought for it.
 *
 * Units: m. Valid: any sheet of the line's design. Source: [own].
 */
export function boxOfSheet({ what }: PlannedSheet, line: LineOnGround): Box {
  return what.kind === 'plan' ? what.frame.box : boxOfSection(what, line);
}
