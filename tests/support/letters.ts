import type TestAgent from 'supertest/lib/agent.js';
import { batchSchema, type Batch, type NewBatch } from '../../shared/schemas/letter-batches.ts';
import {
  heldLetterSettingsSchema,
  type HeldLetterSettings,
  type LetterKind,
  type LetterSettings,
} from '../../shared/schemas/letter-settings.ts';
import type { PartyValues } from '../../shared/schemas/parties.ts';
import { rowsOf, twoAssessors } from './decisions.ts';
import { aParty } from './parties.ts';
import type { TestApp } from './test-app.ts';

/** The small town after a run, and owners of two houses above the line: one by mail, one by post. */
export async function aTownOfOwners(
  tested: Pick<TestApp, 'app' | 'services' | 'runQueue'>,
  ada: Partial<PartyValues> = {},
) {
  const office = await twoAssessors(tested);
  const { firstAgent, scheme, address } = office;
  const rows = await rowsOf(firstAgent, address);
  const house = (reference: string) => rows.get(reference)?.id ?? 0;
  const interest = { kind: 'freeholder', from: null, to: null } as const;
  const byMail = await aParty(firstAgent, scheme, {
    ...{ name: 'Ada of the second house', email: 'ada@example.org' },
    interests: [{ ...interest, buildingId: house('T1-2') }],
    ...ada,
  });
  const byPost = await aParty(firstAgent, scheme, {
    ...{ name: 'Bea of the third house', email: null, channel: 'post' },
    address: ['3 Middle Row', 'Port Dogger'],
    interests: [{ ...interest, buildingId: house('T2-2') }],
  });
  return { ...office, rows, house, byMail, byPost };
}

type Town = Awaited<ReturnType<typeof aTownOfOwners>>;

/** A batch that the first assessor has prepared. */
export async function aBatch(
  { firstAgent, address }: Pick<Town, 'firstAgent' | 'address'>,
  kind: LetterKind = 'first information',
  expected = 2,
  some: Partial<NewBatch> = {},
): Promise<Batch> {
  const asked = { kind, leftOut: [], chosen: [], text: null, expected, ...some };
  const answer = await firstAgent.post(`${address}/letter-batches`).send(asked);
  if (answer.status !== 201) throw new Error(`${answer.status}: ${answer.text}`);
  return batchSchema.parse(answer.body);
}

/** The same, checked and sent by the second. */
export async function aSentBatch(
  tested: Pick<TestApp, 'outbox'>,
  town: Pick<Town, 'firstAgent' | 'secondAgent' | 'address'>,
  kind?: LetterKind,
  expected?: number,
): Promise<Batch> {
  const { id } = await aBatch(town, kind, expected);
  await checked(town.secondAgent, town.address, id);
  const sent = await town.secondAgent.post(`${town.address}/letter-batches/${id}/send`);
  await tested.outbox().idle();
  return batchSchema.parse(sent.body);
}

async function checked(agent: TestAgent, address: string, batchId: string): Promise<void> {
  const check = { verdict: 'checked', comment: '' };
  await agent.post(`${address}/letter-batches/${batchId}/check`).send(check).expect(200);
}

/** The next version of a scheme's settings of letters, with some of it changed. */
export async function keepSettings(
  administrator: TestAgent,
  { id }: { readonly id: string },
  some: Partial<LetterSettings>,
): Promise<HeldLetterSettings> {
  const at = `/api/schemes/${id}/letter-settings`;
  const { version, settings } = heldLetterSettingsSchema.parse((await administrator.get(at)).body);
  const next = { basedOn: version, settings: { ...settings, ...some } };
  const answer = await administrator.post(at).send(next);
  if (answer.status !== 201) throw new Error(`${answer.status}: ${answer.text}`);
  return heldLetterSettingsSchema.parse(answer.body);
}
