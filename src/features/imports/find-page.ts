/** A page of lines as the search for one of them needs it: how many there are, and which stand on it. */
export type PageOfRows = { readonly found: number; readonly rows: readonly { row: number }[] };

const MOST_STEPS = 8;

function pageStart(index: number, found: number, size: number): number {
  const last = Math.max(0, found - 1);
  return Math.floor(Math.min(Math.max(index, 0), last) / size) * size;
}

/**
 * Where the page with a row of the file begins; null where the report has no such row. Rows stand in the
 * file's order with few gaps, so that the first guess is all but right.
 */
export async function findPage(
  row: number,
  size: number,
  fetchPage: (offset: number) => Promise<PageOfRows>,
): Promise<number | null> {
  let offset = 0;
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const { found, rows } = await fetchPage(offset);
    if (rows.some((one) => one.row === row)) return offset;
    const first = rows[0]?.row;
    if (first === undefined) return null;
    const next = pageStart(offset + row - first, found, size);
    const isPast = row < (rows.at(-1)?.row ?? first);
    const nearest = isPast ? offset - size : offset + size;
    const before = offset;
    offset = next === offset ? pageStart(nearest, found, size) : next;
    if (offset === before) return null;
  }
  return null;
}
