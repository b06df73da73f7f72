import type { IMPORT_FORMATS } from '../../shared/schemas/imports.ts';

export type Scalar = string | number | boolean | null;
/** Without a prototype, so that a column may have any name. */
export type Properties = Readonly<Record<string, Scalar>>;

/** What a file itself says about its system of coordinates, not yet judged. */
export type FileCrs = { readonly code?: number; readonly wkt?: string; readonly said: string };

/** A row as its format has it: a geometry like those of GeoJSON, of which nothing is checked. */
export type SourceRow = {
  /** From 1, as people count in that format. */
  readonly row: number;
  readonly geometry: unknown;
  /** Why the geometry or the row cannot be used, as a sentence. */
  readonly fault: string | null;
  readonly properties: Properties;
};

/** A file whose format is known and whose rows can be read, more than once. */
export type Source = {
  readonly format: keyof typeof IMPORT_FORMATS;
  readonly kind: 'footprints' | 'values';
  readonly layer: string | null;
  /** All layers that could be read, where there are several; left out where there is one. */
  readonly layers?: readonly string[];
  readonly crs: FileCrs | null;
  /** What people should know about how the file was read, as sentences. */
  readonly notes: readonly string[];
  /** Those of a heading; where the format has none they are found in the rows. */
  readonly columns: readonly string[];
  readonly rows: () => Iterable<SourceRow> | AsyncIterable<SourceRow>;
};
