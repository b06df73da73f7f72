import { eventsOf, type Parts } from './workbook-parts.ts';

/** Formats of dates and times that every workbook knows by number. */
const BUILT_IN = new Set([14, 15, 16, 17, 18, 19, 20, 21, 22, 27, 28, 29, 30, 31, 36, 45, 46, 47, 50, 51, 52, 53, 54, 55, 56, 57, 58]); // prettier-ignore

/** Whether a format shows a day or time: outside of quotes and brackets it speaks of years to seconds. */
function showsDate(format: string): boolean {
  const bare = format.replaceAll(/"[^"]*"|\\.|_.|\*./g, '').replaceAll(/\[(?!h+\]|m+\]|s+\])[^\]]*\]/gi, ''); // prettier-ignore
  return /[dmyhs]/i.test(bare) && !/general/i.test(bare);
}

/** By the number of a cell's style, whether its number is a date. */
export async function dateStyles(parts: Parts): Promise<readonly boolean[]> {
  const own = new Map<number, boolean>();
  const styles: boolean[] = [];
  let inCells = false;
  for await (const event of eventsOf(parts, 'xl/styles.xml')) {
    if (event.kind === 'text') continue;
    if (event.name === 'cellXfs') inCells = event.kind === 'open';
    if (event.kind !== 'open') continue;
    const { numFmtId = '0', formatCode = '' } = event.attributes;
    const id = Number(numFmtId);
    if (event.name === 'numFmt') own.set(id, showsDate(formatCode));
    if (event.name === 'xf' && inCells) styles.push(own.get(id) ?? BUILT_IN.has(id));
  }
  return styles;
}

const DAY = 86_400_000;
const [FROM_1900, FROM_1904] = [Date.UTC(1899, 11, 30), Date.UTC(1904, 0, 1)];
const LAST_DAY = 2_958_465;

/** A count of days as an ISO text: a day, or a day with its time; undefined where there is none. */
export function isoDate(days: number, from1904: boolean): string | undefined {
  if (!(days >= 0 && days <= LAST_DAY)) return undefined;
  const epoch = from1904 ? FROM_1904 : FROM_1900;
  const text = new Date(epoch + Math.round(days * DAY)).toISOString();
  return Number.isInteger(days) ? text.slice(0, 10) : text.slice(0, 19);
}
