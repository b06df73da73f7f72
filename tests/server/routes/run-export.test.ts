import { beforeAll, describe, expect, test } from 'vitest';
import { z } from 'zod';
import { CATEGORIES } from '../../../shared/damage/categories.ts';
import { runSchema } from '../../../shared/schemas/runs.ts';
import type { Alignment } from '../../../server/models/alignment.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import type { Run } from '../../../server/models/run.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { findLonLat } from '../../../server/models/footprints.ts';
import { findRunBuilding } from '../../../server/models/find-run-building.ts';
import { findResult } from '../../../server/models/run-results.ts';
import { collectionOf, polygonSchema } from '../../support/feature-collection.ts';
import { aMember, aScheme } from '../../support/factories.ts';
import { box, change, drawn, registered } from '../../support/register.ts';
import { aRun, aTownToRun, UNDER_TOWN } from '../../support/runs.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID } from '../../support/unknown-ids.ts';
import { bookOf, bytesOf, tableOf } from '../../support/workbook.ts';

const tested = testApp();
const { app, runQueue, services } = tested;
let scheme: Scheme;
let option: Alignment;
let run: Run;
/** What the run recorded, straight from the database. */
let rows: Awaited<ReturnType<typeof recordOf>>[];
/** Where the buildings stood when the run was started. */
let stood: Awaited<ReturnType<typeof findLonLat>>;

async function recordOf(id: number) {
  const { database } = services();
  const { facts } = await findRunBuilding(database, run.id, id);
  const result = await findResult(database, run.id, id);
  if (result === undefined) throw new Error('A complete run has every building.');
  return { facts, result };
}

beforeAll(async () => {
  ({ scheme, option } = await aTownToRun());
  await scheme.update({ name: 'Dögger crossing' });
  await change(scheme, {
    created: [
      drawn('=1+2', {
        footprint: box(80, 6),
        attributes: { name: '@home', groundLevel: 2, foundingLevel: 5, listedGrade: 'listed' },
      }),
    ],
  });
  const buildings = await registered(scheme);
  const ids = buildings.map(({ id }) => id);
  stood = await findLonLat(services().database, ids);
  run = await aRun(tested, scheme, option);
  rows = await Promise.all(ids.map(recordOf));
  // what comes later is not in the run
  const near = buildings.find(({ reference }) => reference === 'near');
  const edit = { id: near?.id ?? 0, version: 1, footprint: box(300, 4), attributes: { storeys: 9 } }; // prettier-ignore
  await change(scheme, { changed: [edit], created: [drawn('later')] });
});

function addressOf(schemeId: string, runId: string): string {
  return `/api/schemes/${schemeId}/runs/${runId}/export`;
}

async function exported(format: string) {
  const agent = await signIn(app(), await aMember(scheme, 'witness'));
  const asked = agent.get(addressOf(scheme.id, run.id)).query({ format });
  return asked.buffer(true).responseType('blob');
}

function inOrder(): typeof rows {
  const order = new Intl.Collator('en', { numeric: true });
  return [...rows].sort((a, b) => order.compare(a.facts.reference, b.facts.reference));
}

function category(value: number | null): string | null {
  const row = CATEGORIES.find((one) => one.category === value);
  return row === undefined ? null : `${row.label} ${row.name}`;
}

function times(value: number | null, scale: number): number | null {
  return value === null ? null : value * scale;
}

describe('a run as a workbook', () => {
  test('has the record of every building, in units of people', async () => {
    const answer = await exported('xlsx');
    expect(answer.status).toBe(200);
    expect(answer.headers['cache-control']).toBe('no-store');
    expect(answer.headers['content-disposition']).toMatch(
      /^attachment; filename="?dogger-crossing-run-1-\d{4}-\d\d-\d\d\.xlsx"?$/,
    );
    const book = await bookOf(answer.body);
    expect(book.worksheets.map(({ name }) => name)).toEqual(['Buildings', 'Run', 'Line', 'Levels', 'Intervals']); // prettier-ignore
    const table = tableOf(book, 'Buildings');
    expect(table).toHaveLength(24);
    expect(new Set(table.map((one) => one.Reference))).toEqual(new Set(rows.map(({ facts }) => facts.reference))); // prettier-ignore
    for (const { facts, result } of rows) {
      const cells = table.find((one) => one.Reference === facts.reference);
      const isFaulty = result.fault !== null;
      expect(cells).toMatchObject({
        Name: facts.name,
        Storeys: facts.storeys,
        'Ground level (m)': facts.groundLevel,
        Foundation: facts.foundation,
        Listing: facts.listedGrade,
        Stage: result.stage,
        'Category low': category(result.categoryLow),
        'Category central': category(result.category),
        'Category high': category(result.categoryHigh),
        'Strain low (%)': times(result.strainLow, 100),
        'Strain central (%)': times(result.strain, 100),
        'Strain high (%)': times(result.strainHigh, 100),
        'Settlement (mm)': isFaulty ? null : result.settlement * 1000,
        'Slope (mm/m)': isFaulty ? null : result.slope * 1000,
        Decision: 'To decide',
        Breakpoint: result.breakpoint,
        'Volume loss at breakpoint (%)': times(result.breakpointVolumeLoss, 100),
        Reserve: result.reserve,
        'Reserve over high': result.reserveOverHigh,
        Settled: result.isSettled === null ? null : result.isSettled ? 'settled' : 'sensitive',
        'Governing wall': result.governingWall,
        Bending: result.mode,
        'Deflection ratio Δ/L (%)': times(result.deflectionRatio, 100),
        'Horizontal strain (%)': times(result.horizontalStrain, 100),
        'Settlement of walls, central (mm)': times(result.wallSettlement, 1000),
        'Slope along walls, central (mm/m)': times(result.wallSlope, 1000),
        'Held by': result.heldBy.length === 0 ? null : result.heldBy.join('; '),
        Warnings: result.warnings.length === 0 ? null : result.warnings.join('; '),
        'Not worked out': result.fault,
      });
    }
    expect(table.map((one) => one.Reference)).toEqual(inOrder().map(({ facts }) => facts.reference)); // prettier-ignore
  });

  test('says what is assumed, sensitive and faulty in words, and runs no formula', async () => {
    const table = tableOf(await bookOf((await exported('xlsx')).body), 'Buildings');
    const near = table.find((one) => one.Reference === 'near');
    expect(near?.Assumed).toBe('Storeys; Eaves above ground; Founding depth; Ground level'); // prettier-ignore
    expect(near?.Storeys).toBeNull();
    const faulty = table.find((one) => one.Reference === '=1+2');
    expect(faulty).toMatchObject({ Name: '@home', Listing: 'listed', Stage: 3 });
    expect(faulty?.['Not worked out']).toEqual(expect.stringContaining('founding level'));
    expect(faulty?.['Settlement (mm)']).toBeNull();
    const sensitive = new Set(table.map((one) => one['Sensitive to']));
    expect(sensitive.has('volume loss')).toBe(true);
    expect(sensitive.has('volumeLoss')).toBe(false);
    expect(table.find((one) => one.Reference === 'piled')?.['Held by']).toBe('piled');
  });

  test('says of itself what it went by and how far it holds', async () => {
    const book = await bookOf((await exported('xlsx')).body);
    const about = new Map<unknown, unknown>();
    book.getWorksheet('Run')?.eachRow((row) => {
      about.set(row.getCell(1).value, row.getCell(2).value);
    });
    expect(Object.fromEntries(about)).toMatchObject({
      Scheme: 'Dögger crossing',
      Run: 1,
      Option: `${option.name}, version 1`,
      'Method version': '1.1.0',
      'Rules version': 1,
      'Register version': run.registerVersion,
      Buildings: 24,
      'Started by': 'the system',
      'Excavated diameter (m)': UNDER_TOWN.diameter,
      'Volume loss, central (%)': 2,
      'Trough width K, high': 0.6,
      'Rule: let go under a settlement of (mm)': 10,
    });
    expect(about.get('Grid')).toContain('EPSG:32631');
    expect(about.get('How far it holds')).toContain('greenfield');
    expect(about.get('Cautions')).toContain('estimates ground movement empirically');
    const line = tableOf(book, 'Line').map((one) => [one['Easting (m)'], one['Northing (m)']]);
    expect(line).toEqual(UNDER_TOWN.line);
  });
});

describe('a run as GeoJSON', () => {
  const schema = collectionOf(polygonSchema).extend({
    about: z.record(z.string(), z.unknown()),
  });

  test('draws every building as it stood, with the record to the bit', async () => {
    const answer = await exported('geojson');
    expect(answer.headers['content-type']).toBe('application/geo+json; charset=utf-8');
    const file = schema.parse(JSON.parse(bytesOf(answer.body).toString('utf8')));
    expect(file.features.map(({ id }) => id)).toEqual(
      inOrder().map(({ facts }) => facts.reference),
    );
    for (const { facts, result } of rows) {
      const { properties, geometry } = file.features.find(({ id }) => id === facts.reference) ?? {};
      const { heldBy, assumed, warnings, sensitiveTo, ...figures } = result;
      const none = result.fault === null ? {} : { settlement: null, slope: null };
      expect(properties).toMatchObject({ ...figures, ...none, storeys: facts.storeys });
      expect(properties?.heldBy).toBe(heldBy.length === 0 ? null : heldBy.join('; '));
      expect([properties?.assumed, properties?.warnings].filter((one) => one !== null)).toHaveLength(Math.min(1, assumed.length) + Math.min(1, warnings.length)); // prettier-ignore
      expect(properties?.sensitiveTo === null).toBe(sensitiveTo === null);
      const corners = new Set((stood.get(Number(facts.id)) ?? []).flat(2).map(String));
      expect(new Set(geometry?.coordinates.flat().map(String))).toEqual(corners);
    }
    expect(file.about).toMatchObject({ Run: 1, Buildings: 24 });
    expect(file.about.Units).toContain('Metres');
  });
});

describe('an export of a run', () => {
  test('writes nothing into the audit trail, as that of the register', async () => {
    const before = await AuditEntry.count({ where: { schemeId: scheme.id } });
    await exported('xlsx');
    expect(await AuditEntry.count({ where: { schemeId: scheme.id } })).toBe(before);
  });

  test.each(['csv', 'pdf', ''])('is refused as %j', async (format) => {
    expect((await exported(format)).status).toBe(422);
  });

  test('is for who may read runs of the scheme', async () => {
    const asked = { format: 'xlsx' };
    const address = addressOf(scheme.id, run.id);
    const nobody = await visitor(app());
    expect((await nobody.get(address).query(asked)).status).toBe(401);
    const owner = await signIn(app(), await aMember(scheme, 'owner'));
    expect((await owner.get(address).query(asked)).status).toBe(403);
    const elsewhere = await aScheme();
    const stranger = await signIn(app(), await aMember(elsewhere, 'assessor'));
    expect((await stranger.get(address).query(asked)).status).toBe(404);
    for (const id of [run.id, UNKNOWN_ID, 'x'])
      expect((await stranger.get(addressOf(elsewhere.id, id)).query(asked)).status).toBe(404);
  });

  test('waits until the run is complete', async () => {
    const town = await aTownToRun();
    const agent = await signIn(app(), await aMember(town.scheme, 'assessor'));
    runQueue().hold(true);
    const asked = { alignmentId: town.option.id, alignmentVersion: town.option.version };
    const answer = await agent.post(`/api/schemes/${town.scheme.id}/runs`).send(asked);
    const { id } = runSchema.parse(answer.body);
    const early = await agent.get(addressOf(town.scheme.id, id)).query({ format: 'geojson' });
    expect(early.status).toBe(409);
    expect(early.body).toMatchObject({ error: { code: 'conflict' } });
    runQueue().hold(false);
    await runQueue().idle();
    expect((await agent.get(addressOf(town.scheme.id, id)).query({ format: 'geojson' })).status).toBe(200); // prettier-ignore
  });
});
