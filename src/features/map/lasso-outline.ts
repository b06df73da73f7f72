import { thinnedLine } from '../../../shared/ground/thinned-line.ts';
import { OUTLINE_CORNERS } from '../../../shared/schemas/map-outline.ts';
import type { DraftShape } from './map-drawing.ts';
import type { GridPlace, GridProjection, LonLat } from './place/grid-projection.ts';

/** Decimals of a degree: a tenth of a metre. */
const DECIMALS = 6;

function thinned(places: readonly GridPlace[], slack: number): readonly GridPlace[] {
  return thinnedLine(places.map((point) => ({ point, slack })));
}

function rounded(degrees: number): number {
  return Number(degrees.toFixed(DECIMALS));
}

/**
 * What was drawn as an outline in degrees, without what strays from it by less than some metres, or by more
 * where it would have too many corners; null where it encloses nothing.
 */
export function lassoOutline(
  places: readonly GridPlace[],
  metres: number,
  projection: GridProjection,
): readonly LonLat[] | null {
  let [slack, corners] = [metres, thinned(places, metres)];
  while (corners.length > OUTLINE_CORNERS.most) {
    slack *= 2;
    corners = thinned(places, slack);
  }
  const outline = corners.flatMap((place): LonLat[] => {
    const lonLat = projection.toLonLat(place);
    return lonLat === null ? [] : [[rounded(lonLat[0]), rounded(lonLat[1])]];
  });
  return outline.length < OUTLINE_CORNERS.least ? null : outline;
}

/** What is seen while it is drawn: the line to the pointer, and the place to come back to. */
export function lassoShapes(
  places: readonly GridPlace[],
  under: GridPlace | null,
): readonly DraftShape[] {
  const [first] = places;
  if (first === undefined) return [];
  const line = under === null ? places : [...places, under];
  return [
    { kind: 'line', look: 'outline', places: line },
    { kind: 'point', look: 'corner', place: first },
  ];
}

/** What is seen of an outline once it is closed. */
export function closedShapes(
  outline: readonly LonLat[] | null,
  projection: GridProjection,
): readonly DraftShape[] {
  const places = (outline ?? []).flatMap((lonLat): GridPlace[] => {
    const place = projection.toGrid(lonLat);
    return place === null ? [] : [place];
  });
  if (places.length === 0) return [];
  return [{ kind: 'line', look: 'ghost', places: [...places, ...places.slice(0, 1)] }];
}
