import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type {
  RegisterColumn,
  RegisterFilter,
  RegisterSort,
} from '../../shared/schemas/register.ts';

/** A view of a register that somebody keeps: theirs alone. */
export class RegisterView extends Model<
  InferAttributes<RegisterView>,
  InferCreationAttributes<RegisterView>
> {
  declare id: CreationOptional<string>;
  declare schemeId: string;
  declare personId: string;
  declare name: string;
  declare filter: RegisterFilter;
  declare sort: RegisterSort;
  declare columns: RegisterColumn[];
}

export function initRegisterView(sequelize: Sequelize): void {
  RegisterView.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      schemeId: { type: DataTypes.UUID, allowNull: false },
      personId: { type: DataTypes.UUID, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      filter: { type: DataTypes.JSONB, allowNull: false },
      sort: { type: DataTypes.JSONB, allowNull: false },
      columns: { type: DataTypes.JSONB, allowNull: false },
    },
    { sequelize, tableName: 'register_views' },
  );
}
