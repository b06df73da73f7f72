import type { Footprint } from './footprints.ts';
import type { Frontage, StreetFinder } from './named-streets.ts';

export type Address = { readonly text: string; readonly frontage: Frontage | null };

type Fronted = { readonly footprint: Footprint; readonly frontage: Frontage };

function bySide(fronted: readonly Fronted[]): Fronted[][] {
  const sides = new Map<string, Fronted[]>();
  for (const item of fronted) {
    const key = `${item.frontage.street.name} ${String(item.frontage.isLeft)}`;
    const side = sides.get(key);
    if (side === undefined) sides.set(key, [item]);
    else side.push(item);
  }
  return [...sides.values()];
}

function order(a: Fronted, b: Fronted): number {
  return a.frontage.street.id - b.frontage.street.id || a.frontage.chainage - b.frontage.chainage;
}

function behindText(footprint: Footprint, addresses: ReadonlyMap<Footprint, Address>): Address {
  const house = footprint.behind === null ? undefined : addresses.get(footprint.behind);
  return {
    text: house === undefined ? 'Port Dogger' : `Rear of ${house.text}`,
    frontage: house?.frontage ?? null,
  };
}

/** Numbers houses along their streets: odd on the left, even on the right. */
export function addressAll(
  footprints: readonly Footprint[],
  find: StreetFinder,
): Map<Footprint, Address> {
  const addresses = new Map<Footprint, Address>();
  const fronted = footprints.flatMap((footprint): Fronted[] => {
    const frontage = footprint.behind === null ? find(footprint.front) : null;
    return frontage === null ? [] : [{ footprint, frontage }];
  });
  for (const side of bySide(fronted)) {
    for (const [place, { footprint, frontage }] of [...side].sort(order).entries()) {
      const number = 2 * place + (frontage.isLeft ? 1 : 2);
      addresses.set(footprint, { text: `${number} ${frontage.street.name}`, frontage });
    }
  }
  for (const footprint of footprints) {
    if (!addresses.has(footprint)) addresses.set(footprint, behindText(footprint, addresses));
  }
  return addresses;
}
