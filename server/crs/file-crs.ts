import proj4 from 'proj4';
import { crsList } from './crs-list.ts';
import type { CrsEntry } from './crs-entry.ts';
import { findEntry } from './find-crs.ts';
import { mapDefinition } from './map-definition.ts';
import { wktMeasures } from './wkt-measures.ts';

/** A system that a file may be in: projected in any unit, or in degrees of longitude and latitude. */
export type FileCrs = {
  readonly code: number;
  readonly name: string;
  /** Where it is used, in words. */
  readonly area: string;
  /** West, south, east, north in degrees. */
  readonly bounds: readonly [number, number, number, number];
  /** For proj4; grids of shifts are replaced by published parameters. */
  readonly definition: string;
  readonly isInDegrees: boolean;
  /** What its coordinates stand on: the name of the geographic system under it. */
  readonly datum: string;
  /** The file of shifts that would be exact and is not here. */
  readonly grid: string | null;
  /** Of the published shift to WGS 84, in metres; null where none is known. */
  readonly accuracy: number | null;
};

const GRID = /\+nadgrids=(?!@null)(?:"([^"]*)"|(\S+))/;
const SHIFT = /\+(towgs84|nadgrids|datum)=/;
/** On these a system without a shift is WGS 84 to a metre or two. */
const MODERN = /\+(ellps=(GRS80|WGS84)|datum=WGS84)/;

/** The geographic system that a system stands on, by its name in the index. */
export function datumOf({ kind, name, wkt }: Pick<CrsEntry, 'kind' | 'name' | 'wkt'>): string {
  if (kind !== 'CRS-PROJCRS') return name;
  const under = /GEOGCS\["([^"]+)"/.exec(wkt ?? '')?.[1];
  return under ?? name.split(' / ')[0] ?? name;
}

/** Geographic systems are listed without a shift where their projected ones have one. */
async function shifted(entry: CrsEntry): Promise<CrsEntry> {
  const own = entry.proj4 ?? '';
  if (entry.kind === 'CRS-PROJCRS' || SHIFT.test(own) || MODERN.test(own)) return entry;
  const twin = (await crsList()).find(
    (one) => datumOf(one.entry) === entry.name && SHIFT.test(one.entry.proj4 ?? ''),
  );
  const shift = /\+(?:towgs84|nadgrids)=\S+/.exec(twin?.entry.proj4 ?? '')?.[0];
  if (twin === undefined || shift === undefined) return entry;
  const proj4 = own.replace(/ \+no_defs/, ` ${shift} +no_defs`);
  return { ...entry, proj4, accuracy: twin.entry.accuracy };
}

function faultOf({ code, kind, name, unit, proj4 }: CrsEntry): string | undefined {
  const called = `EPSG:${code} (${name})`;
  if (kind !== 'CRS-PROJCRS' && kind !== 'CRS-GEOGCRS' && kind !== 'CRS-GEOG3DCRS') {
    return `${called} has no eastings and northings. Choose the flat system that it stands on.`;
  }
  if (unit === 'grad') return `${called} is in grads. Send the file in degrees or metres.`;
  if (proj4?.includes('+axis=') === true) {
    return `The axes of ${called} do not run east and north. Send the file in one whose axes do.`;
  }
  return undefined;
}

/** Whether the way of projecting is known here: of some only the name is. */
function isProjectable(definition: string | undefined): definition is string {
  if (definition === undefined || definition === '') return false;
  try {
    proj4(definition);
    return true;
  } catch {
    return false;
  }
}

/** Whether coordinates of a file can be placed by a system. */
export function canPlace(entry: CrsEntry): boolean {
  return faultOf(entry) === undefined && isProjectable(mapDefinition(entry.proj4 ?? ''));
}

/** The number of the flat system in one with heights. */
function flatCodeOf({ code, kind, wkt }: CrsEntry): number | undefined {
  if (kind !== 'CRS-COMPOUNDCRS') return undefined;
  const flat = wktMeasures(wkt ?? '')?.code;
  return flat === code ? undefined : flat;
}

/** The system of a file by its EPSG number, or why its coordinates cannot be placed; undefined where there is none. */
export async function findFileCrs(
  code: number,
): Promise<{ readonly crs: FileCrs } | { readonly fault: string } | undefined> {
  const found = await findEntry(code);
  if (found === undefined) return undefined;
  const flat = flatCodeOf(found);
  if (flat !== undefined) return findFileCrs(flat);
  const fault = faultOf(found);
  if (fault !== undefined) return { fault };
  const entry = await shifted(found);
  const given = entry.proj4 ?? '';
  const definition = mapDefinition(given);
  const [north, west, south, east] = entry.bbox;
  if (!isProjectable(definition)) {
    return { fault: `EPSG:${code} (${entry.name}) cannot be placed here. Send another system.` };
  }
  const grid = GRID.exec(given);
  const isKnown = SHIFT.test(given) || MODERN.test(given);
  return {
    crs: {
      code,
      name: entry.name,
      area: entry.area ?? '',
      bounds: [west, south, east, north],
      definition,
      isInDegrees: entry.kind !== 'CRS-PROJCRS',
      datum: datumOf(entry),
      grid: grid?.[1] ?? grid?.[2] ?? null,
      accuracy: isKnown ? (entry.accuracy ?? 1) : null,
    },
  };
}
