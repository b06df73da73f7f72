import type { Role } from '../../../shared/schemas/roles.ts';

/** An invitation as it is being filled in. */
export type Invitation = {
  name: string;
  email: string;
  isAdministrator: boolean;
  memberships: { schemeId: string; role: Role }[];
};
