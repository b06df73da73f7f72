import type { Role } from '../../shared/schemas/roles.ts';

export type DemoPerson = {
  readonly email: string;
  readonly name: string;
  readonly isAdministrator: boolean;
  /** What they are in the demo scheme. */
  readonly roles: readonly Role[];
};

/** Everybody's in the demo, and nobody's anywhere else: it is printed at start. */
export const DEMO_PASSWORD = 'groundsill-demo';

export const DEMO_ADMINISTRATOR: DemoPerson = {
  email: 'administrator@example.org',
  name: 'Administrator',
  isAdministrator: true,
  roles: [],
};

function member(email: string, name: string, role: Role): DemoPerson {
  return { email, name, isAdministrator: false, roles: [role] };
}

/** One person a role, called by it, and a second assessor to check the first one's work. */
export const DEMO_MEMBERS: readonly DemoPerson[] = [
  member('designer@example.org', 'Designer', 'designer'),
  member('assessor@example.org', 'Assessor', 'assessor'),
  member('second-assessor@example.org', 'Second assessor', 'assessor'),
  member('owner@example.org', 'Owner', 'owner'),
  member('witness@example.org', 'Witness', 'witness'),
];

export const DEMO_PEOPLE = [DEMO_ADMINISTRATOR, ...DEMO_MEMBERS];
