import { MOST_CRS, type CrsPurpose, type CrsRow } from '../../shared/schemas/crs.ts';
import { countryShare, sizeOfBox } from './country-share.ts';
import type { CrsEntry } from './crs-entry.ts';
import { foldedWords } from './folded-words.ts';
import { crsList, fileCrsList, type ListedCrs } from './crs-list.ts';
import { canPlace } from './file-crs.ts';
import { stretchFault } from './stretch-fault.ts';
import { usableCrs } from './usable-crs.ts';

function begin(words: readonly string[], wanted: readonly string[]): boolean {
  return wanted.every((word) => words.some((one) => one.startsWith(word)));
}

type Fit = readonly [kind: number, order: number];

/** The largest area that begins with a country's name: about where the country is. */
function countryOf(list: readonly ListedCrs[], wanted: readonly string[]) {
  const joined = wanted.join('');
  return list
    .filter(({ areaWords }) => areaWords.join('').startsWith(joined))
    .map(({ entry }) => entry.bbox)
    .reduce<CrsEntry['bbox'] | undefined>(
      (best, box) => (best !== undefined && sizeOfBox(best) >= sizeOfBox(box) ? best : box),
      undefined,
    );
}

/** A number that is whole, or that is begun; words beside it must fit too. */
function rankByNumber({ entry, nameWords, areaWords }: ListedCrs, wanted: readonly string[]) {
  const code = String(entry.code);
  const others = wanted.filter((word) => word !== code);
  const isWhole = others.length < wanted.length && begin([...nameWords, ...areaWords], others);
  if (isWhole) return [0, 0] as const;
  const joined = wanted.join('');
  const isBegun = /^\d{2,}$/.test(joined) && code.startsWith(joined);
  return isBegun ? ([1, code.length] as const) : undefined;
}

/** How well a system fits, the smaller the better, then in which order those that fit alike come. */
function rank(
  one: ListedCrs,
  wanted: readonly string[],
  country: CrsEntry['bbox'] | undefined,
): Fit | undefined {
  const { entry, nameWords, areaWords } = one;
  const byNumber = rankByNumber(one, wanted);
  if (byNumber !== undefined) return byNumber;
  const placed = begin(areaWords, wanted);
  if (placed && country !== undefined) return [2, -countryShare(entry, country)];
  // the joined words find "OSGB 36" in OSGB36
  const named = begin(nameWords, wanted) || nameWords.join('').includes(wanted.join(''));
  if (named) return [3, nameWords.length];
  if (placed) return [4, areaWords.length];
  return begin([...nameWords, ...areaWords], wanted) ? [5, areaWords.length] : undefined;
}

/** Whether a scheme can be drawn on a system without its walls changing their lengths. */
function isTrue(entry: CrsEntry): boolean {
  const usable = usableCrs(entry);
  return 'crs' in usable && stretchFault(usable.crs) === undefined;
}

/**
 * Systems by number, name or place, the best first: projected ones in true metres for schemes, for files
 * all that their coordinates can be placed by.
 */
export async function searchCrs(search: string, purpose: CrsPurpose): Promise<CrsRow[]> {
  const wanted = foldedWords(search.replace(/^\s*epsg\s*:?\s*(?=\d)/i, ''));
  if (wanted.length === 0) return [];
  const [list, isWanted] =
    purpose === 'file' ? [await fileCrsList(), canPlace] : [await crsList(), isTrue];
  const country = countryOf(list, wanted);
  const found = list
    .flatMap((one) => {
      const fit = rank(one, wanted, country);
      return fit === undefined ? [] : [{ fit, entry: one.entry, words: one.nameWords.length }];
    })
    .sort((a, b) => {
      const [kind, order] = [a.fit[0] - b.fit[0], a.fit[1] - b.fit[1]];
      return kind || order || a.words - b.words || a.entry.code - b.entry.code;
    });
  const rows: CrsRow[] = [];
  for (const { entry } of found) {
    const { code, name, area } = entry;
    if (isWanted(entry)) rows.push({ code, name, area: area ?? '' });
    if (rows.length === MOST_CRS) break;
  }
  return rows;
}
