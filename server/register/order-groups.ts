import type { RegisterGroups } from '../models/find-register-order.ts';
import { packIds, unpackIds } from './packed-ids.ts';

/** The place of each building by reference, looked up by its number less the least. */
function placesOf(byReference: Int32Array): {
  readonly least: number;
  readonly places: Int32Array;
} {
  let [least, most] = [Infinity, -Infinity];
  for (const id of byReference) [least, most] = [Math.min(least, id), Math.max(most, id)];
  const places = new Int32Array(byReference.length === 0 ? 0 : most - least + 1).fill(-1);
  byReference.forEach((id, place) => {
    places[id - least] = place;
  });
  return { least, places };
}

/** Puts buildings that are alike in a column in the order of their references. */
export function orderGroups(
  groups: RegisterGroups,
  references: Buffer,
  descending: boolean,
): Buffer {
  const byReference = unpackIds(references);
  const { least, places } = placesOf(byReference);
  const later: number[] = [];
  const placed = unpackIds(groups.ids).map((id) => {
    const place = places[id - least] ?? -1;
    // one that came in since references were put in order follows the rest
    return place === -1 ? byReference.length + later.push(id) - 1 : place;
  });
  const ordered = new Int32Array(placed.length);
  const known = placed.length - groups.unknown;
  let from = 0;
  for (const size of unpackIds(groups.sizes)) {
    const to = from + size;
    // the other way round group by group; the unknown ones stay last
    const at = descending && to <= known ? known - to : from;
    if (size === 1) ordered[at] = placed[from] ?? 0;
    else ordered.set(placed.subarray(from, to).sort(), at);
    from = to;
  }
  return packIds(
    ordered.map((place) => byReference[place] ?? later[place - byReference.length] ?? 0),
  );
}
