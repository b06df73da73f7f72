import type { FilterSpecification, LayerSpecification, SourceSpecification } from 'maplibre-gl';

export type BuildingKey = {
  readonly source: string;
  readonly sourceLayer: string;
  readonly id: number;
};

/** What the controller asks of a map; tests give it a map that only notes what it is told. */
export type MapPort = {
  addSource(name: string, source: SourceSpecification): unknown;
  removeSource(name: string): unknown;
  setTiles(name: string, urls: string[]): unknown;
  addLayer(layer: LayerSpecification, before: string | undefined): unknown;
  removeLayer(id: string): unknown;
  moveLayer(id: string, before: string | undefined): unknown;
  setPaintProperty(layer: string, name: string, value: unknown): unknown;
  setLayoutProperty(layer: string, name: string, value: unknown): unknown;
  setFilter(layer: string, filter: FilterSpecification | null): unknown;
  setLayerZoomRange(layer: string, least: number, most: number): unknown;
  setFeatureState(
    building: BuildingKey,
    state: Readonly<Record<string, boolean | number | null>>,
  ): unknown;
  /** Numbers of the buildings that are seen, where they are near; null where more is seen than is soon listed. */
  buildingsSeenNear(): ReadonlySet<number> | null;
  /** Tells once, after the next frame; never once the map is gone. */
  afterFrame(then: () => void): unknown;
  setData(name: string, data: GeoJSON.FeatureCollection): unknown;
};
