import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { REGISTER_CHANGE_KINDS } from '../../shared/schemas/register-changes.ts';

/** How a register is changed. */
export type RegisterChangeKind = (typeof REGISTER_CHANGE_KINDS)[number];

/** One change of a register, of any number of buildings. Never changed: the database refuses. */
export class RegisterChange extends Model<
  InferAttributes<RegisterChange>,
  InferCreationAttributes<RegisterChange>
> {
  declare id: CreationOptional<string>;
  declare schemeId: string;
  declare at: CreationOptional<Date>;
  declare personId: string | null;
  declare kind: RegisterChangeKind;
  declare source: string | null;
  declare importId: string | null;
  declare undoes: string | null;
}

export function initRegisterChange(sequelize: Sequelize): void {
  RegisterChange.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      schemeId: { type: DataTypes.UUID, allowNull: false },
      at: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      personId: { type: DataTypes.UUID },
      kind: { type: DataTypes.TEXT, allowNull: false },
      source: { type: DataTypes.TEXT },
      importId: { type: DataTypes.UUID },
      undoes: { type: DataTypes.UUID },
    },
    { sequelize, tableName: 'register_changes' },
  );
}
