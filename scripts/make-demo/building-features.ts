import { collect, polygon } from './features.ts';
import type { Feature } from './features.ts';
import type { Footprint } from './footprints.ts';
import { levelAt } from './ground.ts';
import { centroid } from './polygons.ts';
import { createRandom } from './prng.ts';
import type { Town } from './town.ts';
import { drawTraits } from './traits.ts';

/** References run along the streets: footprints of one street stand together. */
function inOrder(town: Town): Footprint[] {
  const place = new Map(town.footprints.map((footprint, index) => [footprint, index]));
  const streetOf = (footprint: Footprint): number =>
    town.addresses.get(footprint)?.frontage?.street.id ?? 0;
  return [...town.footprints].sort(
    (a, b) => streetOf(a) - streetOf(b) || (place.get(a) ?? 0) - (place.get(b) ?? 0),
  );
}

/** Every building as a feature, with what its register says of it. */
export function buildingFeatures(town: Town, seed: number): Feature[] {
  const random = createRandom(seed).fork('traits');
  const ordered = inOrder(town);
  const digits = Math.max(4, String(ordered.length).length);
  return collect(
    ordered.map((footprint, index) => {
      const middle = centroid(footprint.ring);
      const groundLevel = Math.round(levelAt(middle, town.terrain, seed) * 100) / 100;
      const address = town.addresses.get(footprint);
      const row = random.fork(`${footprint.row} ${address?.frontage?.street.name ?? ''}`);
      const isOld = town.terrain.age(middle) < 0.8;
      const traits = drawTraits(footprint, groundLevel, isOld, row, random.fork(index));
      return {
        geometry: polygon(footprint.ring, footprint.holes),
        properties: {
          reference: `B${String(index + 1).padStart(digits, '0')}`,
          name: traits.name,
          address: address?.text ?? 'Port Dogger',
          kind: footprint.kind,
          use: traits.use,
          storeys: traits.storeys,
          eavesHeight: traits.eavesHeight,
          groundLevel,
          foundingLevel: traits.foundingLevel,
          foundation: traits.foundation,
          construction: traits.construction,
          listed: traits.listed,
          condition: traits.condition,
        },
      };
    }),
  );
}
