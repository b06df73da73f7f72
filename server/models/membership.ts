import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { Role } from '../../shared/schemas/roles.ts';

/** A role of a person in a scheme; one row a role. */
export class Membership extends Model<
  InferAttributes<Membership>,
  InferCreationAttributes<Membership>
> {
  declare schemeId: string;
  declare personId: string;
  declare role: Role;
}

export function initMembership(sequelize: Sequelize): void {
  Membership.init(
    {
      schemeId: { type: DataTypes.UUID, primaryKey: true },
      personId: { type: DataTypes.UUID, primaryKey: true },
      role: { type: DataTypes.TEXT, primaryKey: true },
    },
    { sequelize, tableName: 'memberships' },
  );
}
