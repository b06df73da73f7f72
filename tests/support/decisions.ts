import type TestAgent from 'supertest/lib/agent.js';
import type { z } from 'zod';
import type { newDecisionsSchema } from '../../shared/schemas/decisions.ts';
import {
  buildingDecisionsSchema,
  type BuildingDecisions,
} from '../../shared/schemas/decision-answers.ts';
import { registerPageSchema, type RegisterRow } from '../../shared/schemas/register.ts';
import { aMember } from './factories.ts';
import { aRun, aTownToRun } from './runs.ts';
import { signIn } from './sign-in.ts';
import type { TestApp } from './test-app.ts';

/** The small town after a run, with two assessors at their desks. */
export async function twoAssessors(tested: Pick<TestApp, 'app' | 'services' | 'runQueue'>) {
  const { scheme, option } = await aTownToRun();
  const run = await aRun(tested, scheme, option);
  const first = await aMember(scheme, 'assessor');
  const second = await aMember(scheme, 'assessor');
  return {
    ...{ scheme, option, run, first, second },
    address: `/api/schemes/${scheme.id}`,
    firstAgent: await signIn(tested.app(), first),
    secondAgent: await signIn(tested.app(), second),
  };
}

/** The rows of a register by their references. */
export async function rowsOf(agent: TestAgent, address: string): Promise<Map<string, RegisterRow>> {
  const page = registerPageSchema.parse((await agent.get(`${address}/register`)).body);
  return new Map(page.rows.map((row) => [row.reference, row]));
}

/** The decisions on a building, as somebody sees them. */
export async function decisionsOn(
  agent: TestAgent,
  address: string,
  { runId, buildingId }: { readonly runId: string; readonly buildingId: number },
): Promise<BuildingDecisions> {
  const answer = await agent.get(`${address}/runs/${runId}/buildings/${buildingId}/decisions`);
  return buildingDecisionsSchema.parse(answer.body);
}

type Office = Awaited<ReturnType<typeof twoAssessors>>;

/** The first assessor prepares a decision on one building; gives its number. */
export async function decide(
  { firstAgent, address, run }: Pick<Office, 'firstAgent' | 'address' | 'run'>,
  reference: string,
  decision: Pick<z.input<typeof newDecisionsSchema>, 'kind' | 'reason' | 'category'>,
): Promise<string> {
  const row = (await rowsOf(firstAgent, address)).get(reference);
  if (row === undefined) throw new Error(`There is no building ${reference}.`);
  const asked = { ...decision, runId: run.id, filter: { ids: [row.id] }, expected: 1 };
  const answer = await firstAgent.post(`${address}/decisions`).send(asked);
  if (answer.status !== 201) throw new Error(`Deciding was answered by ${answer.text}.`);
  const place = { runId: run.id, buildingId: row.id };
  const [newest] = (await decisionsOn(firstAgent, address, place)).decisions;
  return newest?.id ?? '';
}
