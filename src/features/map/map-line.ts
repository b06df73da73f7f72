import type { GridPlace } from './place/grid-projection.ts';

/** What is seen of a designed line and its settlement, in the grid. Levels of contours are in mm. */
export type LineShape =
  | { readonly kind: 'band'; readonly rings: readonly (readonly GridPlace[])[] }
  | { readonly kind: 'axis' | 'edge' | 'tick'; readonly places: readonly GridPlace[] }
  | { readonly kind: 'contour'; readonly places: readonly GridPlace[]; readonly level: number }
  | { readonly kind: 'chainage'; readonly place: GridPlace; readonly text: string }
  | { readonly kind: 'shaft'; readonly place: GridPlace; readonly text: string };

/** Where a section is looked at across the line: its mark, and what is written beside it. */
export type SectionShape =
  | { readonly kind: 'mark'; readonly places: readonly GridPlace[] }
  | { readonly kind: 'name'; readonly place: GridPlace; readonly text: string };
