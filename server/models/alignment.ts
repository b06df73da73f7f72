import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { AlignmentDesign, Shafts } from '../../shared/schemas/alignments.ts';

/** An option for the line of a scheme. */
export class Alignment extends Model<
  InferAttributes<Alignment>,
  InferCreationAttributes<Alignment>
> {
  declare id: CreationOptional<string>;
  declare schemeId: string;
  declare name: string;
  declare version: CreationOptional<number>;
  declare design: AlignmentDesign;
  declare shafts: CreationOptional<Shafts>;
  declare changedAt: CreationOptional<Date>;
  declare changedBy: string | null;
}

export function initAlignment(sequelize: Sequelize): void {
  Alignment.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      schemeId: { type: DataTypes.UUID, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      design: { type: DataTypes.JSONB, allowNull: false },
      shafts: { type: DataTypes.JSONB, allowNull: false, defaultValue: [] },
      changedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      changedBy: { type: DataTypes.UUID },
    },
    { sequelize, tableName: 'alignments' },
  );
}
