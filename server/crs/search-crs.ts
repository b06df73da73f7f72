import { MOST_CRS, type CrsRow } from '../../shared/schemas/crs.ts';
import { foldedWords } from './folded-words.ts';
import { crsList, type ListedCrs } from './crs-list.ts';
import { usableCrs } from './usable-crs.ts';

function begin(words: readonly string[], wanted: readonly string[]): boolean {
  return wanted.every((word) => words.some((one) => one.startsWith(word)));
}

/** How large the system's box is; one across the date line counts as small. */
function size({ bbox: [north, west, south, east] }: ListedCrs['entry']): number {
  return (north - south) * Math.max(0, east - west);
}

/** How well a system fits, the smaller the better, then in which order those that fit alike come. */
function rank({ entry, nameWords, areaWords }: ListedCrs, wanted: readonly string[]) {
  const joined = wanted.join('');
  const code = String(entry.code);
  if (code === joined) return [0, 0] as const;
  if (/^\d{2,}$/.test(joined) && code.startsWith(joined)) return [1, code.length] as const;
  // the joined words find "OSGB 36" in OSGB36
  const named = begin(nameWords, wanted) || nameWords.join('').includes(joined);
  if (named) return [2, nameWords.length] as const;
  // a country's own system begins with its name and is larger than those of its towns
  if (areaWords.join('').startsWith(joined)) return [3, -size(entry)] as const;
  if (begin(areaWords, wanted)) return [4, areaWords.length] as const;
  return begin([...nameWords, ...areaWords], wanted) ? ([5, areaWords.length] as const) : undefined;
}

/** Projected systems in metres by number, name or place, the best first. */
export async function searchCrs(search: string): Promise<CrsRow[]> {
  const wanted = foldedWords(search.replace(/^\s*epsg\s*:?\s*(?=\d)/i, ''));
  if (wanted.length === 0) return [];
  const found = (await crsList())
    .flatMap((one) => {
      const fit = rank(one, wanted);
      return fit === undefined ? [] : [{ fit, entry: one.entry }];
    })
    .sort((a, b) => {
      const [kind, order] = [a.fit[0] - b.fit[0], a.fit[1] - b.fit[1]];
      return kind || order || a.entry.code - b.entry.code;
    });
  const rows: CrsRow[] = [];
  for (const { entry } of found) {
    const usable = usableCrs(entry);
    if ('crs' in usable) {
      const { code, name, area } = usable.crs;
      rows.push({ code, name, area });
    }
    if (rows.length === MOST_CRS) break;
  }
  return rows;
}
