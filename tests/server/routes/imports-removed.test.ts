import { describe, expect, test } from 'vitest';
import { aMember, aScheme } from '../../support/factories.ts';
import { feature, geojson, houses, rectangle } from '../../support/import-files.ts';
import { importSession } from '../../support/import-session.ts';
import { registered } from '../../support/register.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app, services } = testApp();

async function begin() {
  const own = await aScheme();
  const agent = await signIn(app(), await aMember(own, 'assessor'));
  return { own, agent, session: importSession(agent, own, services()) };
}

describe('buildings that somebody took out', () => {
  test('come back with a word about it, those of a join beside what they became', async () => {
    const { own, agent, session } = await begin();
    const houseRow = ['A', 'B', 'C', 'D'].map((ref, k) => feature({ ref }, rectangle(10 * k, 0)));
    await session.confirm(await session.send(geojson(houseRow)));
    const [, b, c, d] = (await registered(own)).map(({ id }) => ({ id, version: 1 }));
    const base = `/api/schemes/${own.id}/buildings`;
    await agent.delete(`${base}/${d?.id ?? 0}`).send({ version: 1 });
    await agent.post(`${base}/joins`).send({ buildings: [b, c] });
    const more = [...houseRow, feature({ ref: 'E' }, rectangle(100, 0))];
    const again = await session.send(geojson(more));
    expect(again.counts).toMatchObject({ rows: 5, new: 3, noted: 2 });
    const rows = await session.rows(again);
    const today = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' }).format();
    expect(rows.map(({ reference, remarks }) => [reference, remarks])).toEqual([
      ['A', []],
      ['B', []],
      [
        'C',
        [
          `C was joined into B on ${today}. It would come back beside it.`,
          'The footprint overlaps B of the register by 80 m².',
        ],
      ],
      ['D', [`D was taken out of the register on ${today}. It would come back.`]],
      ['E', []],
    ]);
  });

  test('say nothing where an import was undone', async () => {
    const { own, agent, session } = await begin();
    const { changeId } = await session.confirm(await session.send(geojson(houses(2))));
    await agent.post(`/api/schemes/${own.id}/register-changes/${changeId ?? ''}/undo`);
    const again = await session.send(geojson(houses(2)));
    expect(again.counts).toMatchObject({ new: 2, noted: 0 });
  });
});
