import { hash } from '@node-rs/argon2';
import type { AlignmentDesign, Shafts } from '../../shared/schemas/alignments.ts';
import type { LinkPurpose } from '../../shared/schemas/links.ts';
import type { Role } from '../../shared/schemas/roles.ts';
import { linkTokenHash } from '../../server/authentication/link-token.ts';
import { Alignment } from '../../server/models/alignment.ts';
import { BuildingFootprint, type FootprintRings } from '../../server/models/building-footprint.ts';
import { Building, type GroundLevelFrom } from '../../server/models/building.ts';
import { Membership } from '../../server/models/membership.ts';
import { Person } from '../../server/models/person.ts';
import { Scheme } from '../../server/models/scheme.ts';
import { SingleUseLink } from '../../server/models/single-use-link.ts';
import { aDesign } from './designs.ts';

/** The password of everybody made here. */
export const PASSWORD = 'harbour wall at low tide';

/** As cheap as argon2 gets; the cost stands in the hash, so checking is as cheap. */
const CHEAP = { memoryCost: 8, timeCost: 1, parallelism: 1 };

let made = 0;

/** A person who can sign in with PASSWORD; `password: null` for one who is only invited. */
export async function aPerson(
  overrides: Partial<{
    name: string;
    email: string;
    password: string | null;
    isAdministrator: boolean;
  }> = {},
): Promise<Person> {
  made += 1;
  const { password = PASSWORD, ...others } = overrides;
  return Person.create({
    name: `Person ${made}`,
    email: `person-${made}@example.org`,
    passwordHash: password === null ? null : await hash(password, CHEAP),
    ...others,
  });
}

/** The account-level administrator. */
export function anAdministrator(): Promise<Person> {
  return aPerson({ isAdministrator: true });
}

/** The token of a link that a person was sent, good for an hour. */
export async function aLink(
  person: Person,
  overrides: Partial<{ purpose: LinkPurpose; expiresAt: Date; usedAt: Date }> = {},
): Promise<string> {
  made += 1;
  const token = `token-${made}`;
  await SingleUseLink.create({
    personId: person.id,
    purpose: 'password-reset',
    tokenHash: linkTokenHash(token),
    expiresAt: new Date(Date.now() + 3_600_000),
    ...overrides,
  });
  return token;
}

/** A scheme off any town, in UTM zone 31. */
export function aScheme(
  overrides: Partial<{
    name: string;
    description: string;
    crs: number;
    archivedAt: Date;
  }> = {},
): Promise<Scheme> {
  made += 1;
  return Scheme.create({ name: `Scheme ${made}`, crs: 32631, ...overrides });
}

/** Roles of a person in a scheme. */
export async function aMembership(scheme: Scheme, person: Person, ...roles: Role[]): Promise<void> {
  await Membership.bulkCreate(
    roles.map((role) => ({ schemeId: scheme.id, personId: person.id, role })),
  );
}

/** A new person who has roles in a scheme. */
export async function aMember(scheme: Scheme, ...roles: Role[]): Promise<Person> {
  const person = await aPerson();
  await aMembership(scheme, person, ...roles);
  return person;
}

/** A square of 10 m, some way along a row. */
function square(place: number): FootprintRings {
  const [e, n] = [500_000 + 20 * place, 6_080_000];
  const corners = [[e, n], [e + 10, n], [e + 10, n + 10], [e, n + 10], [e, n]] as const; // prettier-ignore
  return [[corners]];
}

/** A building of a scheme; its place in longitude and latitude is near the footprint's. */
export async function aBuilding(
  scheme: Scheme,
  overrides: Partial<{
    reference: string;
    name: string;
    address: string;
    storeys: number;
    eavesHeight: number;
    groundLevel: number;
    foundingLevel: number;
    construction: string;
    condition: string;
    area: number;
    groundLevelFrom: GroundLevelFrom;
    removedAt: Date;
    footprint: FootprintRings;
    lonLat: FootprintRings;
    west: number;
    south: number;
    east: number;
    north: number;
  }> = {},
): Promise<Building> {
  made += 1;
  const [west, south] = [3 + made * 0.0003, 54.86];
  const [east, north] = [west + 0.00015, south + 0.0001];
  const corners = [[west, south], [east, south], [east, north], [west, north], [west, south]] as const; // prettier-ignore
  const { footprint = square(made), lonLat = [[corners]], ...others } = overrides;
  const building = await Building.create({
    schemeId: scheme.id,
    reference: `B-${String(made).padStart(4, '0')}`,
    name: null,
    address: null,
    use: null,
    storeys: null,
    eavesHeight: null,
    groundLevel: null,
    foundingLevel: null,
    foundation: null,
    construction: null,
    listedGrade: null,
    condition: null,
    area: 100,
    west,
    south,
    east,
    north,
    ...others,
  });
  await BuildingFootprint.create({ buildingId: building.id, footprint, lonLat });
  return building;
}

/** An option for the line of a scheme, changed by nobody yet. */
export function anAlignment(
  scheme: Scheme,
  overrides: Partial<{
    name: string;
    design: AlignmentDesign;
    shafts: Shafts;
    changedBy: string;
  }> = {},
): Promise<Alignment> {
  made += 1;
  return Alignment.create({
    schemeId: scheme.id,
    name: `Option ${made}`,
    design: aDesign(),
    changedBy: null,
    ...overrides,
  });
}
