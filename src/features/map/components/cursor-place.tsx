import type { Map as MapLibreMap } from 'maplibre-gl';
import { useCursor } from '../hooks/use-cursor.ts';
import { formatPlace } from '../place/format-place.ts';
import type { GridPlace, GridProjection } from '../place/grid-projection.ts';
import type { WordsAt } from './plan-map-props.ts';
import { gridPlaceAt, placeAtCentre } from '../place/view-of-map.ts';
import { useMapFigure } from '../hooks/use-map-figure.ts';

type CursorPlaceProps = {
  readonly map: MapLibreMap;
  readonly projection: GridProjection;
  /** What else is said of a place. */
  readonly wordsAt: WordsAt | undefined;
};

const OUTSIDE = 'outside the grid';
const SEPARATOR = '\n';

function words(place: GridPlace | null, more: WordsAt | undefined): string {
  if (place === null) return OUTSIDE;
  return [...formatPlace(place), ...(more?.(place) ?? [])].join(SEPARATOR);
}

/** Easting and northing under the cursor, or in the middle of the map where there is none. */
export function CursorPlace({ map, projection, wordsAt }: CursorPlaceProps) {
  const cursor = useCursor(map);
  const place = useMapFigure(map, () =>
    words(
      cursor === null ? placeAtCentre(map, projection) : gridPlaceAt(map, projection, ...cursor),
      wordsAt,
    ),
  );
  const parts = [...(cursor === null ? ['Middle'] : []), ...place.split(SEPARATOR)];
  return (
    <p className="flex rounded border border-rule bg-paper-raised px-2 py-1 text-cap text-ink-2">
      {parts.map((part) => (
        <span key={part} className="[&+&]:ml-2.5 [&+&]:border-l [&+&]:border-hairline [&+&]:pl-2.5">
          {part}
        </span>
      ))}
    </p>
  );
}
