import { packIds, unpackFigures, unpackIds } from './packed-ids.ts';
import { placesById } from './places-by-id.ts';

/** What a column beside buildings says of one of them. */
export type Value = string | number;

/** A column put in order: how many values it has, and which of them a building has, -1 for none. */
export type Ranked = {
  readonly count: number;
  readonly rankOf: (buildingId: number) => number;
};

/** The same with its values, ascending. */
export type RankedValues = Ranked & { readonly values: readonly Value[] };

function ranked(ids: Int32Array, ranks: Int32Array): Ranked {
  const placeOf = placesById(ids);
  return { count: (ranks.at(-1) ?? -1) + 1, rankOf: (id) => ranks[placeOf(id)] ?? -1 };
}

/** A column of figures, one a building, ascending. */
export function rankedFigures(ids: Buffer, figures: Buffer): RankedValues {
  const ascending = unpackFigures(figures);
  const values: number[] = [];
  const ranks = new Int32Array(ascending.length);
  ascending.forEach((figure, place) => {
    if (figure !== ascending[place - 1]) values.push(figure);
    ranks[place] = values.length - 1;
  });
  return { ...ranked(unpackIds(ids), ranks), values };
}

/** A column of which nothing is asked but its order: how many are alike, ascending. */
export function rankedSizes(ids: Buffer, sizes: Buffer): Ranked {
  const ranks = new Int32Array(unpackIds(ids).length);
  let from = 0;
  unpackIds(sizes).forEach((size, rank) => {
    ranks.fill(rank, from, from + size);
    from += size;
  });
  return ranked(unpackIds(ids), ranks);
}

/** Buildings that are alike, four bytes a number. */
export type AlikeIds = { readonly value: string; readonly ids: Buffer };

/** A column of few values, given ascending. */
export function rankedGroups(groups: readonly AlikeIds[]): RankedValues {
  const sizes = Int32Array.from(groups, ({ ids }) => unpackIds(ids).length);
  const ids = Buffer.concat(groups.map((group) => group.ids));
  const { rankOf } = rankedSizes(ids, packIds(sizes));
  return { count: groups.length, values: groups.map(({ value }) => value), rankOf };
}

/** How many buildings have each of the values that are among them, ascending; null is for those without. */
export function countsOf(
  { values, rankOf }: RankedValues,
  ids: Iterable<number>,
): { readonly value: Value | null; readonly count: number }[] {
  const counts = new Int32Array(values.length + 1);
  for (const id of ids) {
    const place = (rankOf(id) + counts.length) % counts.length;
    counts[place] = (counts[place] ?? 0) + 1;
  }
  return Array.from(counts, (count, rank) => ({ value: values[rank] ?? null, count })).filter(
    ({ count }) => count > 0,
  );
}

/** Tells whether what a column says of a building is meant. */
export function meantBy(
  { values, rankOf }: RankedValues,
  isMeant: (value: Value | null) => boolean,
): (buildingId: number) => boolean {
  const meant = values.map(isMeant);
  const isUnknownMeant = isMeant(null);
  return (id) => meant[rankOf(id)] ?? isUnknownMeant;
}

/**
 * Buildings in the order of a column, those alike as they came, those that have no value last: places are
 * counted off, and nothing is compared.
 */
export function inOrderOf(
  { count, rankOf }: Ranked,
  ids: Int32Array,
  descending: boolean,
): Int32Array {
  const ranks = ids.map((id) => {
    const rank = rankOf(id);
    if (rank === -1) return count;
    return descending ? count - 1 - rank : rank;
  });
  const places = new Int32Array(count + 2);
  for (const rank of ranks) places[rank + 1] = (places[rank + 1] ?? 0) + 1;
  for (let rank = 1; rank <= count; rank += 1) {
    places[rank] = (places[rank] ?? 0) + (places[rank - 1] ?? 0);
  }
  const ordered = new Int32Array(ids.length);
  ids.forEach((id, k) => {
    const rank = ranks[k] ?? count;
    const place = places[rank] ?? 0;
    ordered[place] = id;
    places[rank] = place + 1;
  });
  return ordered;
}
