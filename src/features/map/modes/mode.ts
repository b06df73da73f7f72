import type { Map as MapLibreMap } from 'maplibre-gl';

/** What a mode may tell the page. */
export type ModeHost = {
  readonly select: (buildingId: number | null) => void;
  readonly hover: (buildingId: number | null) => void;
};

/** Lets the pointer do one thing on the map; what it returns takes that away again. */
export type InstallMode = (map: MapLibreMap, host: ModeHost) => () => void;
