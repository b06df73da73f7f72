import type { CreatedBuilding } from '../../server/register/register-edits.ts';
import { seededRandom } from './seeded-random.ts';

const PITCH = 15;
const [EAST, NORTH] = [500_000, 6_080_000];
const STREETS = ['Quay Street', 'Rope Wharf', 'Fish Lane', 'High Street', 'Mill Row'];

/** A house with a back wing. */
function footprint(index: number, across: number): CreatedBuilding['footprint'] {
  const e = EAST + (index % across) * PITCH;
  const n = NORTH + Math.floor(index / across) * PITCH;
  return [[[[e, n], [e + 10, n], [e + 10, n + 6], [e + 12, n + 6], [e + 12, n + 10], [e, n + 10]]]]; // prettier-ignore
}

/** Houses in a square of rows with values of every kind, many of them unknown, the same every time. */
export function* townOfBoxes(count: number): Generator<CreatedBuilding> {
  const random = seededRandom(11);
  const across = Math.ceil(Math.sqrt(count));
  const pick = <T>(choices: readonly T[]) => choices[Math.floor(random() * choices.length)] ?? null;
  const known = <T>(share: number, value: () => T) => (random() < share ? value() : null);
  for (let index = 0; index < count; index += 1) {
    const number = (index * 7919) % count;
    yield {
      reference: `PD-${number}`,
      footprint: footprint(index, across),
      attributes: {
        name: known(0.05, () => `House ${number}`),
        address: `${1 + Math.floor(random() * 200)} ${pick(STREETS) ?? ''} ${index % 500}`,
        use: pick(['dwelling', 'offices', 'shop', 'warehouse', null]),
        storeys: known(0.9, () => 1 + Math.floor(random() * 6)),
        eavesHeight: known(0.8, () => Math.round(random() * 200) / 10 + 1),
        groundLevel: known(0.7, () => Math.round(random() * 1000) / 100),
        foundingLevel: known(0.5, () => -Math.round(random() * 300) / 100),
        foundation: pick(['strip', 'raft', 'piled', null]),
        construction: pick(['masonry', 'framed', 'steel framed', 'timber framed', null]),
        eOverG: known(0.1, () => 2.6),
        poisson: known(0.1, () => 0.3),
        listedGrade: pick(['listed', 'not listed', null]),
        condition: pick(['good', 'fair', 'poor', null]),
        inspected: pick(['inside', 'outside', null]),
      },
    };
  }
}
