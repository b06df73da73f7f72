import { looksLikeGeojson, readGeojsonText, sridOfGeojson } from './geojson-text.ts';
import { readWkb, sridOfWkb } from './read-wkb.ts';
import { looksLikeWkt, readWkt, sridOf } from './read-wkt.ts';

/** Well-known binary in hexadecimal letters, as databases write geometries into tables. */
const HEX = /^\s*(?:\\x)?(0[01](?:[\da-f]{2}){8,})\s*$/i;
/** Its byte order, its kind and the marks of heights and systems, which no number of a house has. */
const HEX_BEGINS = /^\s*(?:\\x)?(?:01[\da-f]{4}00[02468ace]0|00[02468ace]000[\da-f]{4})/i;

function hexBytes(text: string): Buffer | undefined {
  if (!HEX_BEGINS.test(text.slice(0, 50))) return undefined;
  const digits = HEX.exec(text)?.[1];
  return digits === undefined ? undefined : Buffer.from(digits, 'hex');
}

/** Whether a text of a table holds a geometry. */
export function looksLikeGeometry(text: string): boolean {
  return looksLikeWkt(text) || looksLikeGeojson(text) || hexBytes(text) !== undefined;
}

/** The number of the system that a geometry in a text gives itself. */
export function sridOfText(text: string): number | undefined {
  if (looksLikeGeojson(text)) return sridOfGeojson(text);
  const bytes = hexBytes(text);
  return bytes === undefined ? sridOf(text) : sridOfWkb(bytes);
}

/** Reads a geometry of a table, or throws a RowFault. */
export function readGeometryText(text: string): unknown {
  if (looksLikeGeojson(text)) return readGeojsonText(text);
  const bytes = hexBytes(text);
  return bytes === undefined ? readWkt(text) : readWkb(bytes);
}
