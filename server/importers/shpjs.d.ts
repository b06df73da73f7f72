declare module 'shpjs' {
  /** The shapes of a file in order, as GeoJSON geometries; null for a record without a shape. */
  export function parseShp(shp: Uint8Array): unknown[];
  /** The rows of a table; `cpg` names its encoding. */
  export function parseDbf(dbf: Uint8Array, cpg?: string): Record<string, unknown>[];
}
