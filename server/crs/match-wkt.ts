import type { CrsEntry } from './crs-entry.ts';
import { everyCrs } from './crs-list.ts';
import { datumOf, findFileCrs } from './file-crs.ts';
import { WKT_NUMBERS, wktMeasures, type WktMeasures } from './wkt-measures.ts';

type Candidate = { readonly code: number; readonly name: string };

/** The system that a description means where only one fits, and others that fit besides. */
export type WktMatch = {
  readonly code: number | null;
  readonly candidates: readonly Candidate[];
};

const MOST_CANDIDATES = 8;
const WEB_MERCATOR = 3857;
/** As likenesses count: from here on the datum is the same. */
const SAME_DATUM = 8;

/** What a parameter is where a description leaves it out. */
const DEFAULTS: Readonly<Record<string, number>> = { k0: 1, x0: 0, y0: 0, lat0: 0, to_meter: 1 };
/** Angles to 1e-9 radians are 6 mm; lengths and the rest to seven figures. */
const CLOSE = { angle: 1e-8, share: 2e-7, axis: 1e-6 } as const;
const ANGLES = ['lat0', 'lat1', 'lat2', 'long0', 'alpha'];

function isClose(key: string, one: number | undefined, other: number | undefined): boolean {
  const [a, b] = [one ?? DEFAULTS[key], other ?? DEFAULTS[key]];
  // what only one of them names is a parameter that the other's wording does without
  if (a === undefined || b === undefined) return true;
  if (ANGLES.includes(key)) return Math.abs(a - b) < CLOSE.angle;
  return Math.abs(a - b) <= CLOSE.axis + CLOSE.share * Math.max(Math.abs(a), Math.abs(b));
}

/** Standard parallels may be named in either order. */
function ordered({ numbers }: WktMeasures): WktMeasures['numbers'] {
  const { lat1, lat2 } = numbers;
  if (lat1 === undefined || lat2 === undefined || lat1 <= lat2) return numbers;
  return { ...numbers, lat1: lat2, lat2: lat1 };
}

/** Degrees do not depend on the length of a metre, which is told differently. */
function fits(given: WktMeasures, listed: WktMeasures): boolean {
  if (given.projection !== listed.projection) return false;
  const [a, b] = [ordered(given), ordered(listed)];
  const isFlat = given.projection !== 'longlat';
  const keys = isFlat ? WKT_NUMBERS : (['a', 'rf'] as const);
  return keys.every((key) => isClose(key, a[key], b[key]));
}

/** How names of datums are written in one word, with those that have two. */
const DATUMS: Readonly<Record<string, string>> = {
  europeanterrestrialreferencesystem1989: 'etrs1989',
  etrs89: 'etrs1989',
  europeanterrestrialreferencesystem1989ensemble: 'etrs1989',
  ordnancesurveyofgreatbritain1936: 'osgb1936',
  osgb36: 'osgb1936',
  wgs84: 'wgs1984',
  worldgeodeticsystem1984: 'wgs1984',
  worldgeodeticsystem1984ensemble: 'wgs1984',
  northamericandatum1983: 'northamerican1983',
  nad83: 'northamerican1983',
  northamericandatum1927: 'northamerican1927',
  nad27: 'northamerican1927',
  militargeographischeinstitut: 'mgi',
  militargeographischesinstitut: 'mgi',
  europeandatum1950: 'european1950',
  deutscheshauptdreiecksnetz: 'deutscheshauptdreiecksnetz',
  reseaugeodesiquefrancais1993: 'rgf1993',
  reseaugeodesiquefrancais1993v1: 'rgf1993',
};

function datumWord(name: string): string {
  const word = name
    .normalize('NFD')
    .replace(/^D_/i, '')
    .toLowerCase()
    .replaceAll(/[^a-z0-9+]+/g, '');
  return DATUMS[word] ?? word;
}

function nameWord(name: string): string {
  return name
    .replace(/^(GCS|PCS)_/i, '')
    .replaceAll(/ETRS_?(19)?89(-extended)?/gi, 'etrs')
    .replaceAll(/WGS[ _]?(19)?84/gi, 'wgs')
    .replaceAll(/Gauss[ _-]Kr[uü]e?ger/gi, 'gauss')
    .toLowerCase()
    .replaceAll(/[^a-z0-9+]+/g, '');
}

/** How well a listed system fits beyond its parameters; the larger the better. */
function likeness(given: WktMeasures, entry: CrsEntry, listed: WktMeasures): number {
  const [ours, theirs] = [nameWord(entry.name), nameWord(given.name)];
  const isNamed = ours === theirs ? 4 : 0;
  const isPart = isNamed === 0 && theirs !== '' && (ours.endsWith(theirs) || ours.startsWith(theirs)); // prettier-ignore
  const sameDatum =
    datumWord(listed.datum) === datumWord(given.datum) ||
    datumWord(datumOf(entry)) === datumWord(given.datum);
  return (sameDatum ? SAME_DATUM : 0) + isNamed + (isPart ? 2 : 0);
}

/** The map of the web says of itself that it lies on a ball, which no listed system does. */
function isWebMercator({ projection, numbers }: WktMeasures): boolean {
  return projection === 'mercatorauxiliarysphere' && (numbers.long0 ?? 0) === 0;
}

async function byParameters(given: WktMeasures): Promise<{ entry: CrsEntry; like: number }[]> {
  const kinds = given.projection === 'longlat' ? ['CRS-GEOGCRS'] : ['CRS-PROJCRS'];
  return (await everyCrs())
    .filter(({ kind }) => kinds.includes(kind))
    .flatMap((entry) => {
      const listed = wktMeasures(entry.wkt ?? '');
      if (listed === undefined || !fits(given, listed)) return [];
      return [{ entry, like: likeness(given, entry, listed) }];
    })
    .sort((a, b) => b.like - a.like || a.entry.name.length - b.entry.name.length || a.entry.code - b.entry.code); // prettier-ignore
}

async function isUsable(code: number): Promise<boolean> {
  const found = await findFileCrs(code);
  return found !== undefined && 'crs' in found;
}

/**
 * The EPSG system that a description means: by the number that it gives itself, else by its projection,
 * parameters and ellipsoid, then by its datum and name. Where several fit alike, none is chosen.
 */
export async function matchWkt(wkt: string): Promise<WktMatch> {
  const given = wktMeasures(wkt);
  if (given === undefined) return { code: null, candidates: [] };
  if (given.code !== undefined && (await isUsable(given.code))) {
    return { code: given.code, candidates: [] };
  }
  if (isWebMercator(given)) return { code: WEB_MERCATOR, candidates: [] };
  const found = await byParameters(given);
  const usable: typeof found = [];
  for (const one of found.slice(0, 3 * MOST_CANDIDATES)) {
    if (await isUsable(one.entry.code)) usable.push(one);
  }
  const [best, second] = usable;
  const isSure = best !== undefined && best.like >= SAME_DATUM && best.like > (second?.like ?? 0);
  const only = best !== undefined && usable.length === 1;
  const code = isSure || only ? best.entry.code : null;
  const others = usable
    .filter(({ entry, like }) => entry.code !== code && (code === null || like >= SAME_DATUM))
    .slice(0, MOST_CANDIDATES);
  return { code, candidates: others.map(({ entry }) => ({ code: entry.code, name: entry.name })) };
}
