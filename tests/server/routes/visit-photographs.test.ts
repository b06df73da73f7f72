import { createHash, randomUUID } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { beforeEach, describe, expect, test } from 'vitest';
import type TestAgent from 'supertest/lib/agent.js';
import { VisitPhotographFile } from '../../../server/models/visit-photograph-file.ts';
import { Visit } from '../../../server/models/visit.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aBuilding, aMember, aScheme } from '../../support/factories.ts';
import { aJpeg, aPng, aWebp, SECRET_PLACE } from '../../support/photographs.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { aNewVisit, anAnnounced } from '../../support/visits.ts';

const { app, services } = testApp();
let scheme: Scheme;
let assessor: TestAgent;
let address: string;
let photographId: string;

/** A visit that tells of one photograph, by the one who is at the phone; gives where it is sent to. */
async function announce(overrides: Parameters<typeof anAnnounced>[0] = {}): Promise<string> {
  const photograph = anAnnounced(overrides);
  const visit = aNewVisit({ photographs: [photograph] });
  const { id } = await aBuilding(scheme);
  await assessor.post(`/api/schemes/${scheme.id}/buildings/${id}/visits`).send(visit);
  photographId = photograph.id;
  return `/api/schemes/${scheme.id}/visits/${visit.id}/photographs/${photograph.id}`;
}

beforeEach(async () => {
  scheme = await aScheme();
  assessor = await signIn(app(), await aMember(scheme, 'assessor'));
  address = await announce();
});

/** What is in the folder, by the paths of its files. */
function inFolder(): string[] {
  const entries = readdirSync(services().env.PHOTOGRAPHS_FOLDER, { recursive: true, withFileTypes: true }); // prettier-ignore
  return entries.filter((entry) => entry.isFile()).map(({ parentPath, name }) => path.join(parentPath, name)); // prettier-ignore
}

function send(bytes: Buffer, name = 'photo.jpg', agent = assessor) {
  return agent.put(address).attach('file', bytes, name);
}

function bytesOf(answer: { readonly body: unknown }): Buffer {
  if (!Buffer.isBuffer(answer.body)) throw new Error('These are no bytes.');
  return answer.body;
}

describe('sending a photograph', () => {
  test.each([
    ['image/jpeg', aJpeg({ words: 'one' })],
    ['image/png', aPng()],
    ['image/webp', aWebp()],
  ])('keeps %s by what it holds, without its place', async (type, bytes) => {
    const answer = await send(bytes, 'page.html');
    expect([answer.status, answer.body]).toMatchObject([200, { id: photographId, type }]);
    const kept = await VisitPhotographFile.findByPk(photographId, { rejectOnEmpty: true });
    const file = inFolder().find((one) => one.endsWith(kept.sha256)) ?? '';
    const written = readFileSync(file);
    expect(createHash('sha256').update(written).digest('hex')).toBe(kept.sha256);
    expect([kept.type, kept.bytes]).toEqual([type, written.length]);
    expect(written.includes(SECRET_PLACE)).toBe(false);
  });

  test('keeps where it was taken with consent', async () => {
    address = await announce({ keepsPlace: true, place: [1.64, 54.75] });
    expect((await send(aJpeg())).status).toBe(200);
    const { sha256 } = await VisitPhotographFile.findByPk(photographId, { rejectOnEmpty: true });
    const file = inFolder().find((one) => one.endsWith(sha256)) ?? '';
    expect(readFileSync(file).includes(SECRET_PLACE)).toBe(true);
  });

  test('twice keeps it once, and another one is refused', async () => {
    const bytes = aPng({ width: 5 });
    expect((await send(bytes)).status).toBe(200);
    const before = inFolder();
    expect((await send(bytes)).status).toBe(200);
    expect(inFolder()).toEqual(before);
    const first = await VisitPhotographFile.findByPk(photographId, { rejectOnEmpty: true });
    const other = await send(aPng({ width: 6 }));
    expect([other.status, other.body]).toMatchObject([409, { error: { code: 'already-exists' } }]);
    const kept = await VisitPhotographFile.findByPk(photographId, { rejectOnEmpty: true });
    expect(kept.sha256).toBe(first.sha256);
    await expect(kept.destroy()).rejects.toThrow(/permission denied/);
  });

  test.each([
    ['a page', Buffer.from('<!doctype html><script>1</script>'), 422],
    ['a drawing', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"/>'), 422],
    ['a picture that breaks off', aJpeg().subarray(0, 60), 422],
    ['nothing at all', Buffer.alloc(0), 422],
    ['one that is too large', Buffer.concat([aPng(), Buffer.alloc(15 * 1024 * 1024)]), 413],
  ])('refuses %s with a sentence', async (_, bytes, status) => {
    const before = inFolder();
    const answer = await send(bytes);
    expect(answer.status).toBe(status);
    expect(answer.text).toMatch(/"message":"[A-Z][^"]+\."/);
    expect(await VisitPhotographFile.findByPk(photographId)).toBeNull();
    expect(inFolder()).toEqual(before);
  });

  test('of a picture that is a page as well, keeps the picture', async () => {
    expect((await send(aPng({ width: 9, after: '<script>1</script>' }))).status).toBe(200);
    const answer = await assessor.get(address);
    expect(bytesOf(answer).includes('script')).toBe(false);
  });

  test('wants one file, of a photograph that the visit told of, from who made it', async () => {
    expect((await assessor.put(address).send({})).status).toBe(415);
    const elsewhere = address.replace(photographId, randomUUID());
    expect((await assessor.put(elsewhere).attach('file', aPng(), 'a.png')).status).toBe(404);
    const second = await signIn(app(), await aMember(scheme, 'assessor'));
    expect((await send(aPng(), 'a.png', second)).status).toBe(403);
    const witness = await signIn(app(), await aMember(scheme, 'witness'));
    expect((await send(aPng(), 'a.png', witness)).status).toBe(403);
    const stranger = await signIn(app(), await aMember(await aScheme(), 'assessor'));
    expect((await send(aPng(), 'a.png', stranger)).status).toBe(404);
    expect((await send(aPng(), 'a.png', await visitor(app()))).status).toBe(401);
    expect(await VisitPhotographFile.findByPk(photographId)).toBeNull();
  });

  test('to a visit through another scheme finds nothing', async () => {
    const own = await aScheme();
    const agent = await signIn(app(), await aMember(own, 'assessor'));
    const through = address.replace(scheme.id, own.id);
    expect((await agent.put(through).attach('file', aPng(), 'a.png')).status).toBe(404);
    expect((await agent.get(through)).status).toBe(404);
  });
});

describe('seeing a photograph', () => {
  test('gives it as what it is, to be kept for the person alone', async () => {
    await send(aJpeg(), '"><script>.html');
    const witness = await signIn(app(), await aMember(scheme, 'witness'));
    const answer = await witness.get(address);
    expect(answer.status).toBe(200);
    expect(answer.headers).toMatchObject({
      'content-type': 'image/jpeg',
      'x-content-type-options': 'nosniff',
      'content-disposition': 'inline; filename="photograph-1.jpg"',
      'cache-control': 'private, no-cache',
      'content-security-policy': "default-src 'none'; sandbox",
    });
    expect(bytesOf(answer).subarray(0, 2).toString('hex')).toBe('ffd8');
    const again = await witness.get(address).set('If-None-Match', answer.headers.etag ?? '');
    expect(again.status).toBe(304);
  });

  test('is not there before it has arrived, nor for who has no part in it', async () => {
    const early = await assessor.get(address);
    expect([early.status, early.body]).toMatchObject([
      404,
      { error: { message: 'This photograph has not arrived yet.' } },
    ]);
    await send(aPng());
    const owner = await signIn(app(), await aMember(scheme, 'owner'));
    expect((await owner.get(address)).status).toBe(403);
    expect((await (await visitor(app())).get(address)).status).toBe(401);
    expect(await Visit.count({ where: { schemeId: scheme.id } })).toBe(1);
  });
});
