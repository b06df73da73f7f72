import type { Transaction } from 'sequelize';
import { insertParty } from '../commands/add-party.ts';
import { Building } from '../models/building.ts';
import type { Person } from '../models/person.ts';
import type { Scheme } from '../models/scheme.ts';
import { metresFromDemoLine } from './metres-from-demo-line.ts';
import type { readTown } from './read-town.ts';

type Town = ReturnType<typeof readTown>;

/** The listed dwelling that stands closest above the demo's first line; a town may have none. */
function houseAboveTheLine(town: Town): Town[number] | undefined {
  const houses = town
    .filter(({ attributes }) => attributes.use === 'dwelling' && attributes.address !== null)
    .filter(({ attributes }) => !(attributes.listedGrade ?? 'not listed').startsWith('not'))
    .map((house) => ({ house, off: metresFromDemoLine(house.footprint[0]?.[0] ?? []) }));
  return houses.sort((a, b) => a.off - b.off)[0]?.house;
}

/** Makes the demo's owner the freeholder of one house above the line. */
export async function giveOwnerAHouse(
  scheme: Scheme,
  owner: Person,
  town: Town,
  transaction: Transaction,
): Promise<void> {
  const house = houseAboveTheLine(town);
  if (house === undefined) return;
  const { reference, attributes } = house;
  const where = { schemeId: scheme.id, reference };
  const { id: buildingId } = await Building.findOne({ where, transaction, rejectOnEmpty: true });
  const { sequelize: database } = scheme;
  const party = await insertParty(
    database,
    null,
    scheme,
    {
      ...{ kind: 'person', name: owner.name, email: owner.email, channel: 'e-mail' },
      address: [attributes.address ?? '', 'Port Dogger'],
      representedBy: null,
      interests: [{ buildingId, kind: 'freeholder', from: '2014-09-01', to: null }],
    },
    transaction,
  );
  await database.query('update parties set person_id = $2 where id = $1', {
    bind: [party.id, owner.id],
    transaction,
  });
}
