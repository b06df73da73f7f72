import { existsSync, readdirSync } from 'node:fs';
import { expect, test } from 'vitest';
import { RegisterImport } from '../../../server/models/register-import.ts';
import { aMember, aScheme } from '../../support/factories.ts';
import { geopackageFile } from '../../support/footprint-files.ts';
import { importSession } from '../../support/import-session.ts';
import { registered } from '../../support/register.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { twinTown } from '../../support/twin-town.ts';

const { app, services } = testApp();
const ROWS = twinTown();

async function begin() {
  const scheme = await aScheme({ crs: 25830 });
  const agent = await signIn(app(), await aMember(scheme, 'assessor'));
  const session = importSession(agent, scheme, services());
  const file = await geopackageFile([
    { name: 'buildings', kind: 'MULTIPOLYGON', rows: ROWS.slice(0, 5), srs: 25830 },
    { name: 'sheds', kind: 'POLYGON', rows: ROWS.slice(5, 7), srs: 25830 },
  ]);
  return { scheme, agent, session, row: await session.send(file, 'town.gpkg') };
}

function fileOf(id: string): Promise<string | null> {
  return RegisterImport.findByPk(id, { rejectOnEmpty: true }).then(({ file }) => file);
}

test('another layer of a file is read when it is chosen, and the file goes when all is done', async () => {
  const { scheme, session, row } = await begin();
  expect(row).toMatchObject({ layer: 'buildings', layers: ['buildings', 'sheds'] });
  expect(row.counts?.rows).toBe(5);
  const other = await session.choose(row, { layer: 'sheds' });
  expect(other).toMatchObject({ state: 'asking', version: 2, layer: 'sheds', layers: row.layers });
  expect(other.counts?.rows).toBe(2);
  expect(await session.rows(other)).toHaveLength(2);
  const kept = (await fileOf(row.id)) ?? '';
  expect(existsSync(kept)).toBe(true);
  const done = await session.confirm(other);
  expect(done).toMatchObject({ state: 'done', layer: 'sheds', layers: [] });
  expect(await registered(scheme)).toHaveLength(2);
  expect([existsSync(kept), await fileOf(row.id)]).toEqual([false, null]);
});

test('a layer that is not there is refused, and one that is chosen already is not read again', async () => {
  const { agent, session, row } = await begin();
  const address = `${session.base}/${row.id}`;
  const options = { ...row.options, layer: 'roads' };
  const answer = await agent.patch(address).send({ version: row.version, options });
  expect([answer.status, JSON.stringify(answer.body)]).toEqual([422, expect.stringContaining('no such layer')]); // prettier-ignore
  const same = await session.choose(row, { layer: 'buildings', prefix: 'H-' });
  expect(same).toMatchObject({ layer: 'buildings', options: { prefix: 'H-' } });
  expect((await agent.delete(address)).status).toBe(200);
  expect(await fileOf(row.id)).toBeNull();
  expect(readdirSync(services().env.UPLOADS_FOLDER)).toEqual([]);
});
