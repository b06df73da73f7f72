import { describe, expect, test } from 'vitest';
import { assessCaseSchema } from '../../../shared/schemas/assess-case.ts';
import { runBuildingSchema, runDetailSchema } from '../../../shared/schemas/runs.ts';
import { figuresOfCase, figuresOfSheet } from '../../support/figures-of-case.ts';
import { aMember } from '../../support/factories.ts';
import { change, drawn, registered } from '../../support/register.ts';
import { aRun, aTownToRun } from '../../support/runs.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const tested = testApp();

async function aTown() {
  const { scheme, option } = await aTownToRun();
  const agent = await signIn(tested.app(), await aMember(scheme, 'assessor'));
  return { scheme, option, agent };
}

describe('a building of a run', () => {
  test('names those before and after it by reference as people count, as the run took them', async () => {
    const { scheme, option, agent } = await aTown();
    await change(scheme, { created: [drawn('T0-10'), drawn('T0-9')] });
    const run = await aRun(tested, scheme, option);
    // what the register becomes later moves nothing in the run
    const known = await registered(scheme);
    const idOf = (wanted: string) => known.find(({ reference }) => reference === wanted)?.id ?? 0;
    const renamed = { id: idOf('T0-9'), version: 1, reference: 'zoo' };
    await change(scheme, { changed: [renamed], removed: [{ id: idOf('near'), version: 1 }] });
    const order: string[] = [];
    let at: number | null = idOf('far');
    let before: number | null = null;
    while (at !== null) {
      const path = `/api/schemes/${scheme.id}/runs/${run.id}/buildings/${at}`;
      const { facts, previous, next } = runBuildingSchema.parse((await agent.get(path)).body);
      expect(previous).toBe(before);
      order.push(facts.reference);
      [at, before] = [next, at];
    }
    expect(order).toHaveLength(known.length);
    expect(order.slice(0, 5)).toEqual(['far', 'near', 'piled', 'T0-0', 'T0-1']);
    expect(order.slice(7, 11)).toEqual(['T0-4', 'T0-9', 'T0-10', 'T1-0']);
  });

  test('comes as a case that leads to every figure of its sheet and of the record', async () => {
    const { scheme, option, agent } = await aTown();
    const run = await aRun(tested, scheme, option);
    const address = `/api/schemes/${scheme.id}/runs/${run.id}`;
    const detail = runDetailSchema.parse((await agent.get(address)).body);
    let strained = 0;
    for (const { id, reference } of await registered(scheme)) {
      const at = `${address}/buildings/${id}`;
      const building = runBuildingSchema.parse((await agent.get(at)).body);
      const answer = await agent.get(`${at}/case`);
      expect(answer.headers['content-disposition']).toContain('attachment');
      const figures = figuresOfCase(assessCaseSchema.parse(answer.body));
      const { record, ...shown } = figuresOfSheet(detail, building);
      expect([reference, figures]).toStrictEqual([reference, shown]);
      expect([reference, record]).toStrictEqual([reference, building.result]);
      if (building.result.strain === null) continue;
      expect([reference, building.result]).toMatchObject([reference, figures.strain]);
      strained += 1;
    }
    expect(strained).toBe(22);
  });
});
