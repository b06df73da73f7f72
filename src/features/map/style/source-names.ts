/** The sources of the map, by name. */
export const SOURCES = {
  basemap: 'basemap',
  background: 'background',
  grid: 'grid',
  buildings: 'buildings',
  rows: 'rows',
  line: 'line',
  section: 'section',
  draft: 'draft',
} as const;

/** The layer of a tile in which the server puts buildings. */
export const BUILDINGS_TILE_LAYER = 'buildings';

/** The layer of a tile in which the server says where to write on buildings. */
export const LABELS_TILE_LAYER = 'labels';

/** The map layer that a click on a building meets. */
export const BUILDINGS_LAYER = 'buildings';

/** The layer of a tile in which the server puts the rows of an import. */
export const ROWS_TILE_LAYER = 'rows';

/** The map layer that a click on a row of an import meets. */
export const ROWS_LAYER = 'rows';
