import { everyCrs } from './crs-list.ts';
import type { CrsEntry } from './crs-entry.ts';
import { findFileCrs } from './file-crs.ts';
import type { WktMatch } from './match-wkt.ts';

const MOST_CANDIDATES = 8;
const LONGEST = 2000;
/** These say nothing of where points lie, or only what heights mean. */
const SAYING_NOTHING = [
  'no_defs',
  'type',
  'wktext',
  'vunits',
  'geoidgrids',
  'over',
  'title',
  'no_off',
];
const DEFAULTS: Readonly<Record<string, string>> = { k: '1', k_0: '1', units: 'm', lat_0: '0', lon_0: '0', x_0: '0', y_0: '0' }; // prettier-ignore
/** No shift to WGS 84 at all. */
const NO_SHIFT = /^[0,.]+$/;

/** Whether a description is one by parameters. */
export function isProj4(text: string): boolean {
  return /^\s*\+\w+/.test(text);
}

function folded(text: string): string {
  const number = Number(text);
  return text !== '' && Number.isFinite(number)
    ? String(Number(number.toFixed(9)))
    : text.toLowerCase();
}

/** The parameters of a description by their names, without those that change nothing. */
function parametersOf(text: string): ReadonlyMap<string, string> {
  const found = new Map<string, string>();
  for (const [, name = '', given = ''] of text.matchAll(/\+(\w+)(?:=("[^"]*"|\S+))?/g)) {
    if (SAYING_NOTHING.includes(name) || DEFAULTS[name] === given) continue;
    if (name === 'towgs84' && NO_SHIFT.test(given)) continue;
    if (name === 'datum' && given === 'WGS84') found.set('ellps', 'wgs84');
    else found.set(name === 'k_0' ? 'k' : name, folded(given));
  }
  return found;
}

/** Shifts may be left out of a description, and differ between those that tell them. */
function withoutShift(all: ReadonlyMap<string, string>): string {
  return [...all]
    .filter(([name]) => name !== 'towgs84' && name !== 'nadgrids')
    .map(([name, one]) => `${name}=${one}`)
    .sort()
    .join(' ');
}

function shiftOf(all: ReadonlyMap<string, string>): string {
  return all.get('towgs84') ?? all.get('nadgrids') ?? '';
}

async function areUsable(entries: readonly CrsEntry[]): Promise<CrsEntry[]> {
  const usable: CrsEntry[] = [];
  for (const entry of entries.slice(0, 3 * MOST_CANDIDATES)) {
    const found = await findFileCrs(entry.code);
    if (found !== undefined && 'crs' in found) usable.push(entry);
  }
  return usable;
}

/**
 * The EPSG system that a description by parameters means, where only one has them; else those that have
 * them, of which a person chooses. Where the shift is told, those with the same shift go first.
 */
export async function matchProj4(text: string): Promise<WktMatch> {
  if (text.length > LONGEST) return { code: null, candidates: [] };
  const given = parametersOf(text);
  const [wanted, shift] = [withoutShift(given), shiftOf(given)];
  const found = (await everyCrs()).flatMap((entry) => {
    const listed = parametersOf(entry.proj4 ?? '');
    if (entry.proj4 === null || withoutShift(listed) !== wanted) return [];
    return [{ entry, isSameShift: shiftOf(listed) === shift }];
  });
  const same = found.filter(({ isSameShift }) => isSameShift);
  const sorted = [...same, ...found.filter(({ isSameShift }) => !isSameShift)];
  const usable = await areUsable(sorted.map(({ entry }) => entry));
  const [only, ...others] = usable;
  if (only !== undefined && others.length === 0) return { code: only.code, candidates: [] };
  const candidates = usable.slice(0, MOST_CANDIDATES).map(({ code, name }) => ({ code, name }));
  return { code: null, candidates };
}
