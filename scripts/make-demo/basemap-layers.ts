import type { BasemapLayer } from '../../shared/schemas/basemap.ts';
import { closed, type Feature } from './features.ts';
import { inLonLat } from './lon-lat.ts';
import {
  gardenFeatures, landFeatures, openFeatures, quayFeatures, streetFeatures, treeFeatures, wallFeatures, waterFeatures,
} from './map-features.ts'; // prettier-ignore
import { standingQuays } from './quay-walls.ts';
import type { Town } from './town.ts';
import { widestPlace } from './widest-place.ts';

/** What a layer of the basemap holds, in longitude and latitude. */
export type LayerContent = {
  readonly name: BasemapLayer;
  /** The first zoom at which it can be told apart. */
  readonly from: number;
  readonly features: GeoJSON.Feature[];
};

/** Names of waters and open ground, each once: as an area it would be named again in every tile. */
function placesOf(features: readonly Feature[], { terrain }: Town): Feature[] {
  // the harbour reaches far out before its mouth
  const coast = closed(terrain.water.coast, false);
  return features.flatMap(({ id, properties, geometry }) => {
    const [ring] = geometry.type === 'Polygon' ? geometry.coordinates : [];
    if (ring === undefined || properties.kind === 'sea') return [];
    return [
      {
        type: 'Feature',
        id,
        properties,
        geometry: { type: 'Point', coordinates: widestPlace(ring, coast) },
      },
    ];
  });
}

/** What the basemap shows of the town, from the ground up. */
export function basemapLayers(town: Town): LayerContent[] {
  function drawn(name: BasemapLayer, from: number, features: readonly Feature[]): LayerContent {
    return { name, from, features: features.map(inLonLat) };
  }
  const water = waterFeatures(town);
  const land = landFeatures(town);
  const parks = openFeatures(town);
  return [
    drawn('water', 11, water),
    drawn('land', 11, land),
    drawn('quays', 12, standingQuays(quayFeatures(town), land)),
    drawn('gardens', 12, gardenFeatures(town)),
    drawn('garden-walls', 15, wallFeatures(town)),
    drawn('parks', 11, parks),
    drawn('trees', 14, treeFeatures(town)),
    drawn('streets', 11, streetFeatures(town)),
    drawn('places', 13, placesOf([...water, ...parks], town)),
  ];
}
