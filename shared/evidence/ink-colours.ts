import type { Ink } from './marks.ts';

/**
 * The colours of inks on paper, the same for whoever draws a sheet. The ground under buildings stays pale, so
 * that only what was found carries tone.
 *
 * Units: as CSS writes colours. Valid: read only. Source: [own].
 */
export const INK_COLOURS: Readonly<Record<Ink, string>> = {
  ink: '#16212e',
  second: '#3b4754',
  third: '#5c6570',
  hairline: '#d5ccb9',
  rule: '#a39a87',
  contour: '#2e4f78',
  band: '#b9c4cf',
  buildingEdge: '#a2977f',
  paper: '#ffffff',
  street: '#f7f5ee',
  streetEdge: '#dcd6c8',
  park: '#f5f7ef',
  water: '#f1f6f7',
  waterEdge: '#a9bfc4',
};
