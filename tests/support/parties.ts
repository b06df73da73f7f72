import type TestAgent from 'supertest/lib/agent.js';
import { partySchema, type Party, type PartyValues } from '../../shared/schemas/parties.ts';
import type { Scheme } from '../../server/models/scheme.ts';

/** What is written of a party, invented. */
export function partyValues(overrides: Partial<PartyValues> = {}): PartyValues {
  return {
    kind: 'person',
    name: 'Leaseholder of 12 Fishgate',
    address: ['12 Fishgate', 'Port Dogger'],
    email: 'leaseholder@example.org',
    channel: 'e-mail',
    representedBy: null,
    interests: [],
    ...overrides,
  };
}

/** A party that an assessor has added. */
export async function aParty(
  agent: TestAgent,
  scheme: Scheme,
  overrides: Partial<PartyValues> = {},
): Promise<Party> {
  const answer = await agent.post(`/api/schemes/${scheme.id}/parties`).send(partyValues(overrides));
  if (answer.status !== 201) throw new Error(`${answer.status}: ${answer.text}`);
  return partySchema.parse(answer.body);
}
