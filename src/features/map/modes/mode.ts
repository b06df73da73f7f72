import type { Map as MapLibreMap } from 'maplibre-gl';
import type { AimRequest, Handle } from '../map-drawing.ts';
import type { GridProjection } from '../place/grid-projection.ts';

/** What a mode may tell the page. */
export type ModeHost = {
  readonly select: (buildingId: number | null) => void;
  readonly hover: (buildingId: number | null) => void;
};

/** Lets the pointer do one thing on the map; what it returns takes that away again. */
export type InstallMode = (map: MapLibreMap, host: ModeHost) => () => void;

/** What a mode that draws asks and tells. */
export type DraftHost = {
  readonly handles: () => readonly Handle[];
  /** The pointer is over a place, or over none. */
  readonly show: (request: AimRequest | null) => void;
  /** A place is set, or what is held is let go there. */
  readonly put: (request: AimRequest) => void;
  readonly press: (handle: Handle) => void;
};

/** Lets the pointer draw; what it returns takes that away again. */
export type InstallDraftMode = (
  map: MapLibreMap,
  projection: GridProjection,
  host: DraftHost,
) => () => void;

export type DraftMode = 'line' | 'outline';

/** Whether a finger did it, whichever way the browser tells. */
export function isByFinger(event: Event | undefined): boolean {
  if (typeof TouchEvent !== 'undefined' && event instanceof TouchEvent) return true;
  return event instanceof PointerEvent && event.pointerType === 'touch';
}
