import type { LonLatBounds } from '../../../shared/schemas/basemap.ts';

/** Where vector tiles are fetched from, and how far and how deep they go. */
export type TileSet = {
  readonly url: string;
  /** Outside of these none are asked for; null where nobody knows how far they go. */
  readonly bounds: LonLatBounds | null;
  readonly minzoom: number;
  readonly maxzoom: number;
};

/** What the map shows; sources and layers follow from it. */
export type MapPlan = {
  /** Where widths in metres hold. */
  readonly latitude: number;
  /** The demo's own map, where the scheme stands on it. */
  readonly basemap: TileSet | null;
  /** Streets, water, rail and parks that were uploaded for the scheme. */
  readonly background: TileSet | null;
  readonly buildings: TileSet | null;
  /** Rows of a file that is being brought in; the buildings are then faint, and rows are what is marked. */
  readonly rows?: TileSet;
  /** Of the buildings only these are meant; the others are faint. Without it, all of them are meant. */
  readonly meant?: ReadonlySet<number>;
  /** The numbers of the colours that buildings take; those that are not in it stay plain. */
  readonly shades?: ReadonlyMap<number, number>;
  /** Whether a designed line and its settlement can stand on it. */
  readonly hasLine?: boolean;
  /** Whether something can be drawn on it. */
  readonly canDraw?: boolean;
};

/** What of a scheme's buildings is marked. */
export type BuildingMarks = { readonly selected: number | null; readonly hovered: number | null };

export const NO_MARKS: BuildingMarks = { selected: null, hovered: null };
