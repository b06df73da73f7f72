import type { LayerSpecification } from 'maplibre-gl';
import { NO_MARKS, type BuildingMarks, type MapPlan } from '../map-plan.ts';
import { layersOfPlan } from '../style/layers-of-plan.ts';
import {
  BUILDINGS_TILE_LAYER,
  LABELS_TILE_LAYER,
  ROWS_TILE_LAYER,
  SOURCES,
} from '../style/source-names.ts';
import { sourcesOfPlan, type SourcesByName } from '../style/sources-of-plan.ts';
import { layerChanges, type LayerChange } from './layer-changes.ts';
import type { MapPort } from './map-port.ts';
import { createMeantBuildings } from './meant-buildings.ts';
import { createShadedBuildings } from './shaded-buildings.ts';
import { sourceChanges } from './source-changes.ts';

export type MapController = {
  /** Shows another plan. */
  readonly show: (plan: MapPlan) => void;
  /** Marks the selected building and the one under the cursor. */
  readonly mark: (marks: BuildingMarks) => void;
  /** Draws other crosses of the grid. */
  readonly drawGrid: (crosses: GeoJSON.FeatureCollection) => void;
  /** Draws the designed line and its settlement. */
  readonly drawLine: (shapes: GeoJSON.FeatureCollection) => void;
  /** Draws the mark of a section across the line. */
  readonly drawSection: (shapes: GeoJSON.FeatureCollection) => void;
  /** Draws what is being drawn by hand. */
  readonly drawDraft: (shapes: GeoJSON.FeatureCollection) => void;
};

/** The layers of a tile whose shapes and names can be marked, by source. */
const MARKED = {
  [SOURCES.rows]: [ROWS_TILE_LAYER],
  [SOURCES.buildings]: [BUILDINGS_TILE_LAYER, LABELS_TILE_LAYER],
} as const;

function carryOut(map: MapPort, change: LayerChange): void {
  switch (change.kind) {
    case 'remove':
      map.removeLayer(change.id);
      break;
    case 'add':
      map.addLayer(change.layer, change.before);
      break;
    case 'move':
      map.moveLayer(change.id, change.before);
      break;
    case 'paint':
      map.setPaintProperty(change.id, change.name, change.value);
      break;
    case 'layout':
      map.setLayoutProperty(change.id, change.name, change.value);
      break;
    case 'filter':
      map.setFilter(change.id, change.filter);
      break;
    case 'zooms':
      map.setLayerZoomRange(change.id, change.least, change.most);
      break;
  }
}

function drawingInto(map: MapPort, name: string): (shapes: GeoJSON.FeatureCollection) => void {
  return (shapes) => {
    map.setData(name, shapes);
  };
}

/** Keeps a map as the plans ask, and sets only what changed from one to the next. */
export function createMapController(map: MapPort): MapController {
  let sources: SourcesByName = {};
  let layers: readonly LayerSpecification[] = [];
  let marks = NO_MARKS;
  const showMeant = createMeantBuildings(map);
  const shade = createShadedBuildings(map);

  function setMark(name: keyof BuildingMarks, id: number | null, value: boolean): void {
    const source = [SOURCES.rows, SOURCES.buildings].find((one) => sources[one] !== undefined);
    if (id === null || source === undefined) return;
    for (const sourceLayer of MARKED[source]) {
      map.setFeatureState({ source, sourceLayer, id }, { [name]: value });
    }
  }

  function show(plan: MapPlan): void {
    const [nextSources, nextLayers] = [sourcesOfPlan(plan), layersOfPlan(plan)];
    const { removed, added, readdressed } = sourceChanges(sources, nextSources);
    const changes = layerChanges(layers, nextLayers, new Set(removed));
    // a source can go only after its layers, and has to be there before them
    for (const change of changes) if (change.kind === 'remove') carryOut(map, change);
    for (const name of removed) map.removeSource(name);
    for (const [name, source] of added) map.addSource(name, source);
    for (const [name, urls] of readdressed) map.setTiles(name, urls);
    for (const change of changes) if (change.kind !== 'remove') carryOut(map, change);
    [sources, layers] = [nextSources, nextLayers];
    if (added.some(([name]) => name === SOURCES.buildings || name === SOURCES.rows)) {
      setMark('selected', marks.selected, true);
      setMark('hovered', marks.hovered, true);
    }
    if (sources[SOURCES.buildings] !== undefined) {
      const isNew = added.some(([name]) => name === SOURCES.buildings);
      showMeant(plan.meant, isNew);
      shade(plan.shades, isNew);
    }
  }

  function mark(next: BuildingMarks): void {
    for (const name of ['selected', 'hovered'] as const) {
      if (marks[name] === next[name]) continue;
      setMark(name, marks[name], false);
      setMark(name, next[name], true);
    }
    marks = next;
  }

  return {
    show,
    mark,
    drawGrid: drawingInto(map, SOURCES.grid),
    drawLine: drawingInto(map, SOURCES.line),
    drawSection: drawingInto(map, SOURCES.section),
    drawDraft: drawingInto(map, SOURCES.draft),
  };
}
