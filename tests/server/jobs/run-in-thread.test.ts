import { readdirSync } from 'node:fs';
import { expect, test } from 'vitest';
import { askPrint } from '../../../server/commands/ask-print.ts';
import { keptPrint } from '../../../server/commands/kept-print.ts';
import { Building } from '../../../server/models/building.ts';
import { RegisterImport } from '../../../server/models/register-import.ts';
import { aPlan } from '../../support/evidence.ts';
import { aMember, aScheme } from '../../support/factories.ts';
import { geojson, houses } from '../../support/import-files.ts';
import { importSession } from '../../support/import-session.ts';
import { E, N } from '../../support/register.ts';
import { aRun, aTownToRun } from '../../support/runs.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const started = testApp({ threads: true });
const { app, services } = started;

async function begin() {
  const scheme = await aScheme();
  const agent = await signIn(app(), await aMember(scheme, 'assessor'));
  return { scheme, agent, session: importSession(agent, scheme, services()) };
}

test('an import is read, checked and taken over in threads', async () => {
  const { scheme, session } = await begin();
  const row = await session.send(geojson(houses(50)));
  expect(row).toMatchObject({ state: 'asking', counts: { new: 50 } });
  expect((await session.confirm(row)).state).toBe('done');
  expect(await Building.count({ where: { schemeId: scheme.id } })).toBe(50);
});

test('a refusal in a thread is told in its words', async () => {
  const { session } = await begin();
  const row = await session.send('nothing of the kind', 'town.geojson');
  expect(row.state).toBe('failed');
  expect(row.fault).not.toContain('our side');
});

test('cancelling ends the thread, wherever it is, and leaves nothing', async () => {
  const { scheme, agent, session } = await begin();
  const row = await session.sent(geojson(houses(5000)));
  await agent.delete(`${session.base}/${row.id}`);
  expect((await session.settled(row.id)).state).toBe('cancelled');
  const again = await session.send(geojson(houses(5000)));
  await agent.post(`${session.base}/${again.id}/confirm`).send({ version: again.version });
  await agent.delete(`${session.base}/${again.id}`);
  expect((await RegisterImport.findByPk(again.id))?.state).toBe('cancelled');
  expect(await Building.count({ where: { schemeId: scheme.id } })).toBe(0);
  expect(readdirSync(services().env.UPLOADS_FOLDER)).toEqual([]);
});

test('a print is drawn in a thread', async () => {
  const { scheme, option } = await aTownToRun();
  const { id: runId } = await aRun(started, scheme, option);
  const asked = { runId, name: 'Quay', layout: aPlan([E, N]) };
  const id = await askPrint(services(), null, scheme, asked);
  await services().jobs.idle();
  expect(await keptPrint(services().database, scheme.id, id)).toMatchObject({ state: 'done' });
});
