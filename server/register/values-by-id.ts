import { unpackIds } from './packed-ids.ts';

/** Buildings that are alike, four bytes a number. */
export type AlikeIds<T> = { readonly value: T; readonly ids: Buffer };

/** Numbers of buildings are given one after the other, so that a table of them has few gaps. */
const WIDEST = 50_000_000;

function tableOf<T>(groups: readonly { value: T; ids: Int32Array }[], least: number, most: number) {
  const places = new Uint16Array(most - least + 1);
  groups.forEach(({ ids }, k) => {
    for (const id of ids) places[id - least] = k + 1;
  });
  return (id: number): T | undefined => {
    const place = id < least || id > most ? 0 : (places[id - least] ?? 0);
    return groups[place - 1]?.value;
  };
}

/** Tells the value of a building among a hundred thousand at once; undefined where it has none. */
export function valuesById<T>(alike: readonly AlikeIds<T>[]): (id: number) => T | undefined {
  const groups = alike.map(({ value, ids }) => ({ value, ids: unpackIds(ids) }));
  let [least, most] = [Infinity, -Infinity];
  for (const { ids } of groups) {
    for (const id of ids) {
      if (id < least) least = id;
      if (id > most) most = id;
    }
  }
  if (most < least) return () => undefined;
  if (most - least < WIDEST) return tableOf(groups, least, most);
  const values = new Map(groups.flatMap(({ value, ids }) => [...ids].map((id) => [id, value])));
  return (id) => values.get(id);
}
