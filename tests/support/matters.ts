import { randomUUID } from 'node:crypto';
import type { Server } from 'node:http';
import type { NewMatter } from '../../shared/schemas/matters.ts';
import type { PartyValues } from '../../shared/schemas/parties.ts';
import type { Scheme } from '../../server/models/scheme.ts';
import type { Services } from '../../server/services.ts';
import { aBuilding, aMember } from './factories.ts';
import { aParty } from './parties.ts';
import { signIn } from './sign-in.ts';

type Running = { readonly app: () => Server; readonly services: () => Services };

/** An owner who is signed in, with a building of theirs, through the register of parties. */
export async function aSignedInOwner(
  { app, services }: Running,
  scheme: Scheme,
  values: Partial<PartyValues> = {},
) {
  const building = await aBuilding(scheme, { address: '12 Fishgate', storeys: 2 });
  const assessor = await signIn(app(), await aMember(scheme, 'assessor'));
  const interest = { buildingId: building.id, kind: 'freeholder', from: null, to: null } as const;
  const party = await aParty(assessor, scheme, { interests: [interest], ...values });
  const person = await aMember(scheme, 'owner');
  const bind = [party.id, person.id];
  await services().database.query('update parties set person_id = $2 where id = $1', { bind });
  return { building, party, person, agent: await signIn(app(), person) };
}

/** A matter as a browser sends it: a concern without photographs. */
export function aMatter(buildingId: number, overrides: Partial<NewMatter> = {}): NewMatter {
  return {
    id: randomUUID(),
    buildingId,
    kind: 'concern',
    title: 'A crack over the front door',
    text: 'It is new.\nIt has grown since Sunday.',
    suggestion: null,
    photographs: [],
    ...overrides,
  };
}
