/** Numbers of buildings are given one after the other, so that a table of them has few gaps. */
const WIDEST = 50_000_000;

function ends(ids: Int32Array): readonly [least: number, most: number] {
  let [least, most] = [Infinity, -Infinity];
  for (const id of ids) {
    if (id < least) least = id;
    if (id > most) most = id;
  }
  return [least, most];
}

/** Tells where a building stands among a hundred thousand at once; -1 where it does not. The last place counts. */
export function placesById(ids: Int32Array): (id: number) => number {
  const [least, most] = ends(ids);
  if (most < least) return () => -1;
  if (most - least >= WIDEST) {
    const places = new Map([...ids].map((id, place) => [id, place]));
    return (id) => places.get(id) ?? -1;
  }
  const places = new Int32Array(most - least + 1).fill(-1);
  ids.forEach((id, place) => {
    places[id - least] = place;
  });
  return (id) => places[id - least] ?? -1;
}
