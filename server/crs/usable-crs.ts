import proj4 from 'proj4';
import type { CrsAnswer } from '../../shared/schemas/crs.ts';
import type { CrsEntry } from './crs-entry.ts';
import { mapDefinition } from './map-definition.ts';

export type UsableCrs = { readonly crs: CrsAnswer } | { readonly fault: string };

/** How far a point may come back from where it was, in degrees: about a metre. */
const RETURNS_WITHIN = 1e-5;

function middle([west, south, east, north]: CrsAnswer['bounds']): [number, number] {
  const turn = west > east ? 360 : 0;
  const longitude = (west + east + turn) / 2;
  return [longitude > 180 ? longitude - 360 : longitude, (south + north) / 2];
}

/** Whether proj4 knows the projection and finds its way there and back. */
function returns({ definition, bounds }: Pick<CrsAnswer, 'definition' | 'bounds'>): boolean {
  const [longitude, latitude] = middle(bounds);
  try {
    const converter = proj4(definition);
    const [x, y] = converter.inverse(converter.forward([longitude, latitude]));
    const around = Math.abs(x - longitude) % 360;
    const off = Math.min(around, 360 - around) + Math.abs(y - latitude);
    return off < RETURNS_WITHIN;
  } catch {
    return false;
  }
}

function called({ code, name }: CrsEntry): string {
  return `EPSG:${code} (${name})`;
}

/** A system that a scheme can be drawn on, or why it is none. */
export function usableCrs(entry: CrsEntry): UsableCrs {
  const { code, kind, name, proj4: given, bbox, unit, area } = entry;
  if (kind !== 'CRS-PROJCRS') {
    const fault = `${called(entry)} is not a projected system. Choose one with eastings and northings in metres.`;
    return { fault };
  }
  if (unit !== 'metre') {
    return { fault: `${called(entry)} is in ${unit ?? 'an unknown unit'}. Choose one in metres.` };
  }
  if (given?.includes('+axis=') === true) {
    const fault = `The axes of ${called(entry)} do not run east and north. Choose one whose axes do.`;
    return { fault };
  }
  const [north, west, south, east] = bbox;
  const definition = mapDefinition(given ?? '');
  const bounds: CrsAnswer['bounds'] = [west, south, east, north];
  if (definition === undefined || definition === '' || !returns({ definition, bounds })) {
    return { fault: `${called(entry)} cannot be laid on the map here. Choose another.` };
  }
  return { crs: { code, name, area: area ?? '', definition, bounds } };
}
