import type { LayerSpecification } from 'maplibre-gl';
import type { MapPlan } from '../map-plan.ts';
import { backgroundLabelLayers, backgroundLayers } from './background-layers.ts';
import { buildingLabelLayers, buildingLayers } from './building-layers.ts';
import { draftLayers } from './draft-layers.ts';
import { gridLayers } from './grid-layers.ts';
import { groundLayers, harbourLayers } from './ground-layers.ts';
import { labelLayers } from './label-layers.ts';
import { bandLayers, lineLabelLayers, lineLayers } from './line-layers.ts';
import { MAP_COLOURS } from './map-colours.ts';
import { meantLayers } from './meant-layers.ts';
import { faintLayers, rowLayers } from './row-layers.ts';
import { shadeLabelLayers, withShades } from './shade-layers.ts';
import { bridgeLayers, streetLayers, treeLayers } from './street-layers.ts';

/** Paper; round the demo town, which is an island, the colour of the sea. */
function paper({ basemap }: MapPlan): LayerSpecification {
  const colour = basemap === null ? MAP_COLOURS.land : MAP_COLOURS.water;
  return { id: 'paper', type: 'background', paint: { 'background-color': colour } };
}

/** The demo's own map without its labels. */
function basemapLayers(latitude: number): LayerSpecification[] {
  return [
    ...groundLayers(),
    ...streetLayers(latitude),
    ...harbourLayers(),
    ...bridgeLayers(latitude),
    ...treeLayers(latitude),
  ];
}

/** Buildings and their names: plain, faint under the rows of a file, only some of them plain, or coloured. */
function ofBuildings({
  buildings,
  rows,
  meant,
  shades,
  latitude,
}: MapPlan): Record<'shapes' | 'names', LayerSpecification[]> {
  if (buildings === null) return { shapes: [], names: [] };
  const [shapes, names] = [buildingLayers(), buildingLabelLayers()];
  if (rows !== undefined) return { shapes: faintLayers(shapes), names: [] };
  if (meant !== undefined) return { shapes: meantLayers(shapes), names: meantLayers(names) };
  if (shades === undefined) return { shapes, names };
  return { shapes: withShades(shapes), names: [...names, ...shadeLabelLayers(latitude)] };
}

/** Every layer of what the plan shows, from the ground up. */
export function layersOfPlan(plan: MapPlan): LayerSpecification[] {
  const { latitude, basemap, background, rows } = plan;
  const { shapes, names } = ofBuildings(plan);
  const layers: (LayerSpecification[] | false)[] = [
    [paper(plan)],
    basemap !== null && basemapLayers(latitude),
    background !== null && backgroundLayers(latitude),
    plan.hasLine === true && bandLayers(),
    shapes,
    rows !== undefined && rowLayers(),
    plan.hasLine === true && lineLayers(),
    gridLayers(),
    background !== null && backgroundLabelLayers(),
    basemap !== null && labelLayers(),
    names,
    plan.hasLine === true && lineLabelLayers(),
    plan.canDraw === true && draftLayers(),
  ];
  return layers.flatMap((group) => (group === false ? [] : group));
}
