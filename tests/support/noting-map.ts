import type { MapPort } from '../../src/features/map/controller/map-port.ts';

export type NotingMap = {
  readonly map: MapPort;
  /** Draws a frame: whoever waited for it is told. */
  readonly drawFrame: () => void;
  /** What the map was told since it was last asked, in words. */
  readonly told: () => string[];
};

/** A map that draws nothing, notes what it is told and, like a real one, refuses what cannot be; `seen` from near. */
export function notingMap(seen: ReadonlySet<number> | null = null): NotingMap {
  let notes: string[] = [];
  let waiting: (() => void)[] = [];
  const sources = new Set<string>();
  const layers = new Map<string, string | undefined>();

  function need(condition: boolean, what: string): void {
    if (!condition) throw new Error(what);
  }
  function note(...words: readonly unknown[]): void {
    notes.push(
      words.map((word) => (typeof word === 'string' ? word : JSON.stringify(word))).join(' '),
    );
  }
  const map: MapPort = {
    addSource: (name) => {
      need(!sources.has(name), `There is a source ${name} already.`);
      sources.add(name);
      note('add source', name);
    },
    removeSource: (name) => {
      need(![...layers.values()].includes(name), `Layers draw from ${name}.`);
      sources.delete(name);
      note('remove source', name);
    },
    addLayer: (layer) => {
      const source = layer.type === 'background' ? undefined : layer.source;
      need(source === undefined || sources.has(source), `There is no source for ${layer.id}.`);
      layers.set(layer.id, source);
      note('add layer', layer.id);
    },
    removeLayer: (id) => {
      layers.delete(id);
      note('remove layer', id);
    },
    moveLayer: (id) => {
      note('move layer', id);
    },
    setTiles: (name, urls) => {
      note('set tiles', name, urls);
    },
    setPaintProperty: (layer, name, value) => {
      note('paint', layer, name, value);
    },
    setLayoutProperty: (layer, name, value) => {
      note('layout', layer, name, value);
    },
    setFilter: (layer, filter) => {
      note('filter', layer, filter);
    },
    setLayerZoomRange: (layer, least, most) => {
      note('zooms', layer, least, most);
    },
    setFeatureState: ({ source, sourceLayer, id }, state) => {
      need(sources.has(source), `There is no source ${source}.`);
      note('mark', sourceLayer, id, state);
    },
    buildingsSeenNear: () => seen,
    afterFrame: (then) => {
      waiting.push(then);
    },
    setData: (name, data) => {
      note('draw', name, data.features.length);
    },
  };
  return {
    map,
    drawFrame: () => {
      const told = waiting;
      waiting = [];
      for (const then of told) then();
    },
    told: () => {
      const since = notes;
      notes = [];
      return since;
    },
  };
}
