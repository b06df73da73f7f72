import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { QueryTypes } from 'sequelize';
import { afterAll, beforeEach, describe, expect, it } from 'vitest';
import { isRightPassword } from '../../../server/authentication/password-hash.ts';
import { drivesOfDesign } from '../../../shared/assessment/drives-of-design.ts';
import { DEFAULT_RULES } from '../../../shared/assessment/rules.ts';
import { groundModel } from '../../../shared/ground/ground-model.ts';
import { alignmentDesignSchema } from '../../../shared/schemas/alignments.ts';
import { Alignment } from '../../../server/models/alignment.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { Building } from '../../../server/models/building.ts';
import { Membership } from '../../../server/models/membership.ts';
import { Person } from '../../../server/models/person.ts';
import { SchemeRules } from '../../../server/models/scheme-rules.ts';
import { Scheme } from '../../../server/models/scheme.ts';
import { DEMO_PASSWORD, DEMO_PEOPLE } from '../../../server/seed/demo-people.ts';
import { seedDemo } from '../../../server/seed/seed-demo.ts';
import { createDataFolder } from '../../support/data-folder.ts';
import { aPerson } from '../../support/factories.ts';
import { testApp } from '../../support/test-app.ts';

const { services } = testApp();
const { folder, remove } = createDataFolder('seed');

function square(east: number): [number, number][] {
  const [e, n] = [412_000 + east, 6_068_000];
  return [[e, n], [e + 8, n], [e + 8, n + 8], [e, n + 8], [e, n]]; // prettier-ignore
}

function writeTown(...references: string[]): void {
  const properties = {
    ...{ name: null, address: '1 Rope Wharf', use: 'dwelling', storeys: 2, eavesHeight: 6 },
    ...{ groundLevel: 3, foundingLevel: null, foundation: 'strip', construction: 'masonry' },
    ...{ listed: 'not listed', condition: 'fair' },
  };
  const features = references.map((reference, index) => ({
    properties: { reference, ...properties, ...(index === 1 && { listed: 'listed, special' }) },
    geometry: { type: 'Polygon', coordinates: [square(10 * index)] },
  }));
  mkdirSync(folder, { recursive: true });
  writeFileSync(path.join(folder, 'buildings.geojson'), JSON.stringify({ features }));
}

function seed() {
  return seedDemo(services().database, folder);
}

beforeEach(() => {
  writeTown('B0001', 'B0002');
});
afterAll(remove);

// in this order: the database is empty until the demo is in it
describe('seedDemo', () => {
  it('leaves nothing behind where the town cannot be read in', async () => {
    writeTown('B0001', 'B0001');
    await expect(seed()).rejects.toThrow();
    expect([await Person.count(), await Scheme.count(), await AuditEntry.count()]).toEqual([
      0, 0, 0,
    ]);
  });

  it('does not touch a database of other people', async () => {
    const stranger = await aPerson();
    expect(await seed()).toBe('not ours');
    expect(await Person.count()).toBe(1);
    await stranger.destroy();
  });

  it('makes the demo people, who can sign in, and their scheme', async () => {
    expect(await seed()).toBe('filled');
    const people = await Person.findAll({ order: ['createdAt'] });
    expect(people.map(({ email }) => email).sort()).toEqual(
      DEMO_PEOPLE.map(({ email }) => email).sort(),
    );
    expect(await isRightPassword(people[0]?.passwordHash, DEMO_PASSWORD)).toBe(true);
    const [scheme] = await Scheme.findAll();
    expect(scheme).toMatchObject({ name: 'Port Dogger crossing', crs: 32631 });
    const memberships = await Membership.findAll({ where: { schemeId: scheme?.id ?? '' } });
    expect(memberships.map(({ role }) => role).sort()).toEqual([
      ...['assessor', 'assessor', 'designer', 'owner', 'witness'],
    ]);
    expect(await SchemeRules.count({ where: { schemeId: scheme?.id ?? '', version: 1 } })).toBe(1);
  });

  it('brought in the town, near where it should lie, and wrote it all down', async () => {
    const buildings = await Building.findAll({ order: ['reference'] });
    expect(buildings.map(({ reference }) => reference)).toEqual(['B0001', 'B0002']);
    expect(buildings[0]).toMatchObject({
      address: '1 Rope Wharf',
      storeys: 2,
      listedGrade: 'not listed',
    });
    expect(buildings[0]?.west).toBeCloseTo(1.636, 2);
    expect(buildings[0]?.south).toBeCloseTo(54.749, 2);
    const actions = (await AuditEntry.findAll()).map(({ action }) => action);
    expect(new Set(actions)).toEqual(
      new Set([
        ...['create person', 'create scheme', 'change roles', 'change register'],
        ...['create alignment', 'add party', 'change letter settings'],
      ]),
    );
  });

  it('has an owner who signs in, freeholder of the listed dwelling closest to the line', async () => {
    const parties = await services().database.query(
      `select p.name, p.address, p.channel, s.email, b.reference, i.kind
       from parties p join people s on s.id = p.person_id
       join interests i on i.party_id = p.id join buildings b on b.id = i.building_id`,
      { type: QueryTypes.SELECT },
    );
    expect(parties).toEqual([
      {
        ...{ name: 'Owner', address: '1 Rope Wharf\nPort Dogger', channel: 'e-mail' },
        ...{ email: 'owner@example.org', reference: 'B0002', kind: 'freeholder' },
      },
    ]);
  });

  it('has three options for the line that the method takes, crossing harbour and old town', async () => {
    const options = await Alignment.findAll({ order: ['name'] });
    expect(options.map(({ name }) => name)).toEqual([
      ...['A, Market Place', 'B, harbour head', 'C, deep and south'],
    ]);
    for (const { design } of options) {
      expect(alignmentDesignSchema.parse(design)).toEqual(design);
      const { drives, lengths, pieces } = groundModel(drivesOfDesign(design), DEFAULT_RULES);
      expect(drives).toHaveLength(2);
      for (const length of lengths) {
        expect(length).toBeGreaterThan(2400);
        expect(length).toBeLessThan(2600);
      }
      const depths = pieces.flat().map(({ startLevel }) => design.groundLevel - startLevel);
      expect(Math.min(...depths)).toBeGreaterThanOrEqual(18);
      expect(Math.max(...depths)).toBeLessThanOrEqual(25);
      // the harbour is some 400 m east of the town's corner, the old town 560 m
      const near = (east: number) => design.line.filter(([e]) => Math.abs(e - 412_000 - east) < 80);
      for (const east of [400, 560]) {
        expect(near(east).length).toBeGreaterThan(0);
        for (const [, north] of near(east)) expect(Math.abs(north - 6_068_350)).toBeLessThan(120);
      }
    }
  });

  it('finds it there the next time', async () => {
    expect(await seed()).toBe('there');
    expect([await Scheme.count(), await Building.count()]).toEqual([1, 2]);
  });
});
