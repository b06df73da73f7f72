import { GeoJSONSource, VectorTileSource, type Map as MapLibreMap } from 'maplibre-gl';
import { idsInView } from '../buildings-in-view.ts';
import type { MissedTiles } from '../missed-tiles.ts';
import { NEAR_FROM } from '../style/building-layers.ts';
import type { MapPort } from './map-port.ts';

/** A real map, as the controller asks for it. */
export function portOfMap(map: MapLibreMap, missed: MissedTiles): MapPort {
  const plain: Omit<MapPort, 'buildingsSeenNear' | 'afterFrame' | 'setTiles' | 'setData'> = map;
  return {
    addSource: (name, source) => plain.addSource(name, source),
    removeSource: (name) => plain.removeSource(name),
    addLayer: (layer, before) => plain.addLayer(layer, before),
    removeLayer: (id) => plain.removeLayer(id),
    moveLayer: (id, before) => plain.moveLayer(id, before),
    setPaintProperty: (layer, name, value) => plain.setPaintProperty(layer, name, value),
    setLayoutProperty: (layer, name, value) => plain.setLayoutProperty(layer, name, value),
    setFilter: (layer, filter) => plain.setFilter(layer, filter),
    setLayerZoomRange: (layer, least, most) => plain.setLayerZoomRange(layer, least, most),
    setFeatureState: (building, state) => plain.setFeatureState(building, state),
    buildingsSeenNear: () => (map.getZoom() < NEAR_FROM ? null : idsInView(map)),
    afterFrame: (then) => map.once('render', then),
    setTiles: (name, urls) => {
      const source = map.getSource(name);
      if (!(source instanceof VectorTileSource)) return;
      // what did not come from the old address would be waited for for ever
      missed.fetchAgain(name);
      source.setTiles(urls);
    },
    setData: (name, data) => {
      const source = map.getSource(name);
      if (source instanceof GeoJSONSource) void source.setData(data);
    },
  };
}
