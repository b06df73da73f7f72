import { groupBy } from '../models/group-by.ts';
import { sameWords } from './same-words.ts';

export type KnownBuilding = {
  readonly id: number;
  readonly reference: string;
  readonly address: string | null;
};

export type BuildingOfRow =
  { readonly building: KnownBuilding } | { readonly building: null; readonly problem: string };

/** Finds buildings of a register by the reference or the address that a row gives. */
export function buildingFinder(buildings: readonly KnownBuilding[]) {
  const byReference = groupBy(buildings, ({ reference }) => reference.trim().toLowerCase());
  const byAddress = groupBy(buildings, ({ address }) => sameWords(address ?? ''));
  function oneOf(found: readonly KnownBuilding[], none: string, several: string): BuildingOfRow {
    const [building, ...others] = found;
    if (building === undefined) return { building: null, problem: none };
    return others.length === 0 ? { building } : { building: null, problem: several };
  }
  return (reference: string, address: string): BuildingOfRow => {
    if (reference !== '') {
      return oneOf(
        byReference.get(reference.toLowerCase()) ?? [],
        `No building has the reference ${reference}. Mend it, or leave it empty and give the address of the building.`,
        `Several buildings have the reference ${reference} but for capital letters.`,
      );
    }
    if (address === '') {
      const problem = 'It names no building. Give the reference or the address of the building.';
      return { building: null, problem };
    }
    const found = byAddress.get(sameWords(address)) ?? [];
    return oneOf(
      found,
      `No building has the address ${address}. Give the reference of the building.`,
      `${found.length} buildings have the address ${address}. Give the reference of the one that is meant.`,
    );
  };
}
