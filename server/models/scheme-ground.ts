import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { GroundKind } from '../ground/ground.ts';

/** Where the ground levels of a scheme come from, as they were given. */
export class SchemeGround extends Model<
  InferAttributes<SchemeGround>,
  InferCreationAttributes<SchemeGround>
> {
  declare schemeId: string;
  declare kind: GroundKind;
  declare source: string;
  declare personId: string | null;
  declare at: CreationOptional<Date>;
  declare points: number;
  declare lowest: number;
  declare highest: number;
  /** Packed. */
  declare content: Buffer;
}

export function initSchemeGround(sequelize: Sequelize): void {
  SchemeGround.init(
    {
      schemeId: { type: DataTypes.UUID, primaryKey: true },
      kind: { type: DataTypes.TEXT, allowNull: false },
      source: { type: DataTypes.TEXT, allowNull: false },
      personId: { type: DataTypes.UUID },
      at: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      points: { type: DataTypes.INTEGER, allowNull: false },
      lowest: { type: DataTypes.DOUBLE, allowNull: false },
      highest: { type: DataTypes.DOUBLE, allowNull: false },
      content: { type: DataTypes.BLOB, allowNull: false },
    },
    { sequelize, tableName: 'scheme_grounds' },
  );
}
