import type TestAgent from 'supertest/lib/agent.js';
import { describe, expect, test } from 'vitest';
import { runBuildingSchema } from '../../../shared/schemas/runs.ts';
import { percentFigure } from '../../../server/documents/sheet/figures.ts';
import { aMember, anAdministrator } from '../../support/factories.ts';
import { factsOfPdf, textOfPdf } from '../../support/pdf-tools.ts';
import { change, registered } from '../../support/register.ts';
import { aRun, aTownToRun } from '../../support/runs.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID, UNKNOWN_NUMBER } from '../../support/unknown-ids.ts';

const tested = testApp();

async function aTown() {
  const { scheme, option } = await aTownToRun();
  const agent = await signIn(tested.app(), await aMember(scheme, 'assessor'));
  const run = await aRun(tested, scheme, option);
  const known = await registered(scheme);
  const address = `/api/schemes/${scheme.id}/runs/${run.id}/buildings`;
  const idOf = (wanted: string) => known.find(({ reference }) => reference === wanted)?.id ?? 0;
  return { scheme, option, agent, run, address, idOf };
}

async function sheetOf(agent: TestAgent, path: string): Promise<Buffer> {
  const answer = await agent.get(path).responseType('blob');
  expect([answer.status, answer.headers['content-type']]).toEqual([200, 'application/pdf']);
  return answer.body as Buffer;
}

describe('the sheet of a building as a file', () => {
  test('holds the figures that are on record, under a plain name', async () => {
    const { agent, address, idOf, scheme } = await aTown();
    const at = `${address}/${idOf('T1-2')}`;
    const { result } = runBuildingSchema.parse((await agent.get(at)).body);
    const answer = await agent.get(`${at}/sheet.pdf`).responseType('blob');
    expect(answer.headers['content-disposition']).toBe('attachment; filename=sheet-T1-2-run-1.pdf');
    expect(answer.headers['cache-control']).toBe('no-store');
    const pdf = answer.body as Buffer;
    expect(pdf.subarray(0, 5).toString()).toBe('%PDF-');
    const text = textOfPdf(pdf);
    expect(text).toContain(`${scheme.name}: sheet of one building`);
    expect(text).toContain(percentFigure(result.strain ?? NaN, 3));
    expect(text).toContain(`${(result.settlement * 1000).toFixed(1)} mm at most`);
    expect(text).toContain('the same figures as recorded, to the last digit');
  });

  test('is that of the run, whatever the register says since', async () => {
    const { agent, address, idOf, scheme } = await aTown();
    const id = idOf('near');
    await change(scheme, { changed: [{ id, version: 1, attributes: { storeys: 9 } }] });
    const text = textOfPdf(await sheetOf(agent, `${address}/${id}/sheet.pdf`));
    expect(text).toContain('The register has changed since.');
    expect(text).toContain('the same figures as recorded, to the last digit');
  });

  test('has a sampled run where its seed is given, the same each time, and none otherwise', async () => {
    const { agent, address, idOf } = await aTown();
    const path = `${address}/${idOf('near')}/sheet.pdf`;
    const asked = textOfPdf(await sheetOf(agent, `${path}?samples=7`));
    expect(asked).toContain('500 samples, seed 7');
    expect(textOfPdf(await sheetOf(agent, `${path}?samples=7`))).toBe(asked);
    expect(textOfPdf(await sheetOf(agent, path))).not.toContain('Sampled run');
  });

  test.each(['x', '', '-1', '1.5', '4294967296', '99999999999999999999'])(
    'is refused with the seed “%s”, by name',
    async (seed) => {
      const { agent, address, idOf } = await aTown();
      const answer = await agent.get(`${address}/${idOf('near')}/sheet.pdf?samples=${seed}`);
      expect(answer.status).toBe(422);
      expect(answer.body).toMatchObject({ error: { fields: [{ path: 'samples' }] } });
    },
  );

  test('is short for a building that screening lets go', async () => {
    const { agent, address, idOf } = await aTown();
    const pdf = await sheetOf(agent, `${address}/${idOf('far')}/sheet.pdf`);
    expect(Number(factsOfPdf(pdf).Pages)).toBeLessThan(3);
    expect(textOfPdf(pdf)).toContain('Let go at stage 1');
  });

  test('is read by witnesses and administrators, and not by owners or who is not signed in', async () => {
    const { scheme, address, idOf } = await aTown();
    const path = `${address}/${idOf('far')}/sheet.pdf`;
    for (const person of [await aMember(scheme, 'witness'), await anAdministrator()]) {
      expect((await (await signIn(tested.app(), person)).get(path)).status).toBe(200);
    }
    const owner = await signIn(tested.app(), await aMember(scheme, 'owner'));
    expect((await owner.get(path)).status).toBe(403);
    expect((await (await visitor(tested.app())).get(path)).status).toBe(401);
  });

  test('of another scheme answers like one that is not there', async () => {
    const foreign = await aTown();
    const { agent, scheme, run } = await aTown();
    const own = `/api/schemes/${scheme.id}/runs`;
    for (const path of [
      `${foreign.address}/${foreign.idOf('far')}`,
      `${own}/${foreign.run.id}/buildings/${foreign.idOf('far')}`,
      `${own}/${run.id}/buildings/${foreign.idOf('far')}`,
      `${own}/${UNKNOWN_ID}/buildings/1`,
      `${own}/${run.id}/buildings/${UNKNOWN_NUMBER}`,
      `${own}/${run.id}/buildings/x`,
    ]) {
      expect((await agent.get(`${path}/sheet.pdf`)).status).toBe(404);
    }
  });
});
