import type { RegisterGroups } from '../models/find-register-order.ts';
import { packIds, unpackIds } from './packed-ids.ts';
import { valuesById } from './values-by-id.ts';

/** Buildings that are all alike. */
export function oneGroup(ids: Buffer): RegisterGroups {
  const { length } = unpackIds(ids);
  return { ids, sizes: packIds(Int32Array.of(length)), unknown: 0 };
}

/**
 * Groups of buildings as far as these are in a register: others are left out, and those of the register
 * that are in no group join the ones whose value is not known.
 */
export function ofRegister(groups: RegisterGroups, references: Buffer): RegisterGroups {
  const isIn = valuesById([{ value: true, ids: references }]);
  const isFound = valuesById([{ value: true, ids: groups.ids }]);
  const found = unpackIds(groups.ids);
  const known = found.length - groups.unknown;
  const ids: number[] = [];
  const sizes: number[] = [];
  let from = 0;
  for (const size of unpackIds(groups.sizes)) {
    if (from >= known) break;
    const kept = found.subarray(from, from + size).filter((id) => isIn(id) === true);
    if (kept.length > 0) sizes.push(kept.length);
    for (const id of kept) ids.push(id);
    from += size;
  }
  const unknown = [
    ...found.subarray(known).filter((id) => isIn(id) === true),
    ...unpackIds(references).filter((id) => isFound(id) !== true),
  ];
  if (unknown.length > 0) sizes.push(unknown.length);
  return {
    ids: packIds(Int32Array.from([...ids, ...unknown])),
    sizes: packIds(Int32Array.from(sizes)),
    unknown: unknown.length,
  };
}
