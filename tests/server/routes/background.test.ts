import { beforeAll, describe, expect, test } from 'vitest';
import type TestAgent from 'supertest/lib/agent.js';
import {
  backgroundAnswerSchema,
  backgroundLayersSchema,
  type BackgroundLayer,
} from '../../../shared/schemas/background.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { BackgroundFeature } from '../../../server/models/background-feature.ts';
import type { Person } from '../../../server/models/person.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aMember, anAdministrator, aScheme } from '../../support/factories.ts';
import { dbfFile, shpFile, UTM_31_PRJ } from '../../support/shapefile.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { zipFile } from '../../support/zip-file.ts';

const { app } = testApp();
let administrator: Person;

beforeAll(async () => {
  administrator = await anAdministrator();
});

function asAdministrator() {
  return signIn(app(), administrator);
}

const LINE = [[3, 54], [3.1, 54.2]]; // prettier-ignore
const RING = [[3, 54], [3.1, 54], [3.1, 54.1], [3, 54]]; // prettier-ignore

function street(name: unknown = 'Quay Street', coordinates: unknown = LINE): object {
  const geometry = { type: 'LineString', coordinates };
  return { type: 'Feature', properties: { Name: name }, geometry };
}

function collection(features: readonly unknown[], more: object = {}): string {
  return JSON.stringify({ type: 'FeatureCollection', ...more, features });
}

function put(agent: TestAgent, scheme: Scheme, layer: string, file: string | Buffer) {
  const address = `/api/schemes/${scheme.id}/background/${layer}`;
  return agent.put(address).attach('file', Buffer.from(file), 'layer');
}

async function kept(scheme: Scheme, layer: BackgroundLayer = 'streets') {
  return BackgroundFeature.findAll({ where: { schemeId: scheme.id, layer }, order: ['id'] });
}

describe('uploading a layer', () => {
  test('replaces it, moves the version on and tells the trail', async () => {
    const scheme = await aScheme();
    const agent = await asAdministrator();
    await put(agent, scheme, 'streets', collection([street('Old Street'), street()]));
    await put(agent, scheme, 'parks', collection([{ ...street(), geometry: { type: 'Polygon', coordinates: [RING] } }])); // prettier-ignore
    const answer = await put(agent, scheme, 'streets', collection([street(' Fish\nLane ')]));
    expect(answer.status).toBe(200);
    expect(backgroundAnswerSchema.parse(answer.body)).toEqual({
      layer: 'streets',
      features: 1,
      backgroundVersion: 4,
    });
    await scheme.reload();
    expect(scheme.backgroundVersion).toBe(4);
    expect(await kept(scheme)).toMatchObject([
      {
        name: 'Fish Lane',
        geometry: { type: 'LineString', coordinates: LINE },
        ...{ west: 3, south: 54, east: 3.1, north: 54.2 },
      },
    ]);
    expect(await kept(scheme, 'parks')).toHaveLength(1);
    const entries = await AuditEntry.findAll({ where: { schemeId: scheme.id }, order: ['id'] });
    expect(entries.at(-1)).toMatchObject({
      action: 'replace background',
      personId: administrator.id,
      subjectId: 'streets',
      before: { features: 2 },
      after: { features: 1 },
    });
  });

  test.each(['designer', 'assessor'] as const)('is for the %s too', async (role) => {
    const scheme = await aScheme();
    const agent = await signIn(app(), await aMember(scheme, role));
    expect((await put(agent, scheme, 'streets', collection([street()]))).status).toBe(200);
  });

  test.each(['witness', 'owner'] as const)('is not for the %s', async (role) => {
    const scheme = await aScheme();
    const agent = await signIn(app(), await aMember(scheme, role));
    expect((await put(agent, scheme, 'streets', collection([street()]))).status).toBe(403);
    expect(await kept(scheme)).toEqual([]);
  });

  test('is not for strangers or nobody, and not for an archived scheme', async () => {
    const scheme = await aScheme();
    const file = collection([street()]);
    const stranger = await signIn(app(), await aMember(await aScheme(), 'designer'));
    expect((await put(stranger, scheme, 'streets', file)).status).toBe(404);
    expect((await put(await visitor(app()), scheme, 'streets', file)).status).toBe(401);
    await scheme.update({ archivedAt: new Date() });
    const archived = await put(await asAdministrator(), scheme, 'streets', file);
    expect(archived.body).toMatchObject({ error: { code: 'archived' } });
    expect(await kept(scheme)).toEqual([]);
  });

  test('is not there for an unknown layer', async () => {
    const answer = await put(await asAdministrator(), await aScheme(), 'sewers', collection([]));
    expect(answer.status).toBe(404);
  });

  test('reads the grid that the file names', async () => {
    const scheme = await aScheme();
    const crs = { type: 'name', properties: { name: 'urn:ogc:def:crs:EPSG::32631' } };
    const line = [[500_000, 6_080_000], [500_000, 6_081_000]]; // prettier-ignore
    const file = collection([street('Quay', line)], { crs });
    expect((await put(await asAdministrator(), scheme, 'rail', file)).status).toBe(200);
    const [feature] = await kept(scheme, 'rail');
    expect(feature?.west).toBeCloseTo(3, 8);
    expect(feature?.south).toBeCloseTo(54.864, 2);
    expect((feature?.north ?? 0) - (feature?.south ?? 0)).toBeCloseTo(1000 / 111_300, 4);
  });

  test('reads a zipped Shapefile with its grid and its names', async () => {
    const scheme = await aScheme();
    const parts = [[[500_000, 6_080_000], [501_000, 6_080_000], [501_000, 6_081_000]]] as const; // prettier-ignore
    const file = zipFile([
      { name: 'town/Streets.shp', content: shpFile('lines', [{ parts }, { parts }]) },
      { name: 'town/Streets.dbf', content: dbfFile(['Fiskergränd', ''], 'latin1') },
      { name: 'town/Streets.prj', content: UTM_31_PRJ },
      { name: '__MACOSX/town/._Streets.shp', content: 'x' },
    ]);
    expect((await put(await asAdministrator(), scheme, 'streets', file)).status).toBe(200);
    const features = await kept(scheme);
    expect(features.map(({ name }) => name)).toEqual(['Fiskergränd', null]);
    expect(features[0]?.west).toBeCloseTo(3, 8);
    expect(features[0]?.geometry).toMatchObject({ type: 'LineString' });
  });

  test('takes a file of twenty thousand features', async () => {
    const scheme = await aScheme();
    const file = collection(Array.from({ length: 20_000 }, () => street()));
    expect((await put(await asAdministrator(), scheme, 'streets', file)).status).toBe(200);
    expect(await BackgroundFeature.count({ where: { schemeId: scheme.id } })).toBe(20_000);
  });
});

describe('an upload that is not right', () => {
  test('is refused by row and reason, and changes nothing', async () => {
    const scheme = await aScheme();
    const agent = await asAdministrator();
    await put(agent, scheme, 'streets', collection([street()]));
    const bad = [
      street(),
      { type: 'Feature', properties: {}, geometry: null },
      { ...street(), geometry: { type: 'Point', coordinates: [3, 54] } },
      street('Short', [[3, 54]]),
      street('Strange', [[3, 54], [3, 'x']]), // prettier-ignore
      street('Elsewhere', [[500_000, 6_080_000], [500_001, 6_080_000]]), // prettier-ignore
    ];
    const answer = await put(agent, scheme, 'streets', collection(bad));
    expect(answer.status).toBe(422);
    expect(answer.body).toEqual({
      error: {
        code: 'invalid-input',
        message: '5 of 6 rows are not right. Nothing was brought in.',
        fields: [
          { path: 'row 2', message: 'Row 2 has no geometry.' },
          { path: 'row 3', message: 'Row 3 is a Point: the layer takes lines.' },
          { path: 'row 4', message: 'Row 4 has a line of one point.' },
          { path: 'row 5', message: 'Row 5 has a point that is not two numbers.' },
          { path: 'row 6', message: 'Row 6 is not on the map: check which grid the file is in.' },
        ],
      },
    });
    await scheme.reload();
    expect(scheme.backgroundVersion).toBe(2);
    expect(await kept(scheme)).toHaveLength(1);
  });

  test('names the first twenty rows of many', async () => {
    const file = collection(Array.from({ length: 500 }, () => street('x', [])));
    const answer = await put(await asAdministrator(), await aScheme(), 'streets', file);
    const { error } = answer.body as { error: { message: string; fields: unknown[] } };
    expect(error.message).toMatch(/^500 of 500 rows/);
    expect(error.fields).toHaveLength(20);
  });

  test('is refused without a file, with two, and in another field', async () => {
    const scheme = await aScheme();
    const agent = await asAdministrator();
    const address = `/api/schemes/${scheme.id}/background/streets`;
    const none = await agent.put(address).field('layer', 'streets');
    const other = await agent.put(address).attach('upload', Buffer.from('x'), 'x');
    const two = await agent
      .put(address)
      .attach('file', Buffer.from('x'), 'x')
      .attach('file', Buffer.from('x'), 'x');
    const answers = [none, other, two];
    expect(answers.map(({ status }) => status)).toEqual([422, 422, 422]);
    for (const { body } of answers) {
      expect(body).toMatchObject({ error: { fields: [{ path: 'file' }] } });
    }
  });

  test('is refused in words where it is no form with a file', async () => {
    const scheme = await aScheme();
    const address = `/api/schemes/${scheme.id}/background/streets`;
    const answer = await (await asAdministrator()).put(address).send({ file: 'x' });
    expect(answer.status).toBe(415);
    expect(answer.body).toMatchObject({ error: { code: 'wrong-content-type' } });
  });

  test('is refused far from where the system of the scheme is used', async () => {
    const scheme = await aScheme();
    const agent = await asAdministrator();
    const exchanged = LINE.map(([x, y]) => [y, x]);
    const all = await put(agent, scheme, 'streets', collection([street('Quay', exchanged)]));
    expect(all.status).toBe(422);
    expect(all.body).toMatchObject({
      error: {
        message: expect.stringMatching(
          /^These lie 5\d{3} km outside of where EPSG:32631 is used\. Are the axes exchanged\?$/,
        ) as string,
      },
    });
    const some = collection([street(), street('Quay', exchanged)]);
    const one = await put(agent, scheme, 'streets', some);
    expect(one.text).toContain('1 of 2 lie ');
    expect(await kept(scheme)).toEqual([]);
  });

  test('is refused beyond 20 MB', async () => {
    const scheme = await aScheme();
    const file = Buffer.alloc(20 * 1024 * 1024 + 1, ' ');
    const answer = await put(await asAdministrator(), scheme, 'streets', file);
    expect(answer.status).toBe(413);
    expect(answer.body).toMatchObject({ error: { message: 'The file is larger than 20 MB.' } });
  });

  test('is refused where it breaks off', async () => {
    const scheme = await aScheme();
    const answer = await (
      await asAdministrator()
    )
      .put(`/api/schemes/${scheme.id}/background/streets`)
      .set('Content-Type', 'multipart/form-data; boundary=b')
      .send('--b\r\nContent-Disposition: form-data; name="file"; filename="x"\r\n\r\nhalf');
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { code: 'unreadable' } });
  });
});

describe('reading and removing', () => {
  test('tells how much each layer holds', async () => {
    const scheme = await aScheme();
    const agent = await asAdministrator();
    await put(agent, scheme, 'streets', collection([street(), street()]));
    const address = `/api/schemes/${scheme.id}/background`;
    expect(backgroundLayersSchema.parse((await agent.get(address)).body)).toEqual([
      { layer: 'streets', features: 2 },
      { layer: 'water', features: 0 },
      { layer: 'rail', features: 0 },
      { layer: 'parks', features: 0 },
    ]);
    const owner = await signIn(app(), await aMember(scheme, 'owner'));
    expect((await owner.get(address)).status).toBe(403);
    const stranger = await signIn(app(), await aMember(await aScheme(), 'witness'));
    expect((await stranger.get(address)).status).toBe(404);
    expect((await (await visitor(app())).get(address)).status).toBe(401);
  });

  test('removes a layer, moves the version on and tells the trail', async () => {
    const scheme = await aScheme();
    const agent = await asAdministrator();
    await put(agent, scheme, 'streets', collection([street()]));
    const address = `/api/schemes/${scheme.id}/background/streets`;
    const answer = await agent.delete(address);
    expect(answer.body).toEqual({ layer: 'streets', features: 0, backgroundVersion: 3 });
    expect(await kept(scheme)).toEqual([]);
    const entries = await AuditEntry.findAll({ where: { schemeId: scheme.id }, order: ['id'] });
    expect(entries.at(-1)).toMatchObject({ before: { features: 1 }, after: { features: 0 } });
    expect((await agent.delete(`/api/schemes/${scheme.id}/background/sewers`)).status).toBe(404);
  });

  test('removes nothing for others', async () => {
    const scheme = await aScheme();
    await put(await asAdministrator(), scheme, 'streets', collection([street()]));
    const address = `/api/schemes/${scheme.id}/background/streets`;
    const witness = await signIn(app(), await aMember(scheme, 'witness'));
    expect((await witness.delete(address)).status).toBe(403);
    const stranger = await signIn(app(), await aMember(await aScheme(), 'designer'));
    expect((await stranger.delete(address)).status).toBe(404);
    expect((await (await visitor(app())).delete(address)).status).toBe(401);
    expect(await kept(scheme)).toHaveLength(1);
  });
});
