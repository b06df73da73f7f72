import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { GROUND_LEVEL_FROM } from '../../shared/schemas/register.ts';

/** A file, somebody's hand, or the scheme's ground. */
export type GroundLevelFrom = (typeof GROUND_LEVEL_FROM)[number];

/** A building of a scheme's register. What is null is unknown. */
export class Building extends Model<InferAttributes<Building>, InferCreationAttributes<Building>> {
  declare id: CreationOptional<number>;
  declare schemeId: string;
  declare reference: string;
  declare name: string | null;
  declare address: string | null;
  declare use: string | null;
  declare storeys: number | null;
  declare eavesHeight: number | null;
  declare groundLevel: number | null;
  declare foundingLevel: number | null;
  declare foundation: string | null;
  declare construction: string | null;
  declare listedGrade: string | null;
  declare condition: string | null;
  declare eOverG: CreationOptional<number | null>;
  declare poisson: CreationOptional<number | null>;
  declare inspected: CreationOptional<string | null>;
  declare structureScore: CreationOptional<number | null>;
  declare structureReason: CreationOptional<string | null>;
  declare featuresScore: CreationOptional<number | null>;
  declare featuresReason: CreationOptional<string | null>;
  /** Of the footprint, in square metres. */
  declare area: number;
  declare groundLevelFrom: CreationOptional<GroundLevelFrom | null>;
  /** Grows with every change: who saves an older one is told. */
  declare version: CreationOptional<number>;
  /** What the last file said, by field; of a footprint its hash. Tells a hand's change from a file's. */
  declare imported: CreationOptional<Readonly<Record<string, string | number | null>>>;
  /** When it was taken out of the register; its history stays. */
  declare removedAt: CreationOptional<Date | null>;
  declare west: number;
  declare south: number;
  declare east: number;
  declare north: number;
}

export function initBuilding(sequelize: Sequelize): void {
  Building.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      schemeId: { type: DataTypes.UUID, allowNull: false },
      reference: { type: DataTypes.TEXT, allowNull: false },
      name: { type: DataTypes.TEXT },
      address: { type: DataTypes.TEXT },
      use: { type: DataTypes.TEXT },
      storeys: { type: DataTypes.INTEGER },
      eavesHeight: { type: DataTypes.DOUBLE },
      groundLevel: { type: DataTypes.DOUBLE },
      foundingLevel: { type: DataTypes.DOUBLE },
      foundation: { type: DataTypes.TEXT },
      construction: { type: DataTypes.TEXT },
      listedGrade: { type: DataTypes.TEXT },
      condition: { type: DataTypes.TEXT },
      eOverG: { type: DataTypes.DOUBLE, field: 'e_over_g' },
      poisson: { type: DataTypes.DOUBLE },
      inspected: { type: DataTypes.TEXT },
      structureScore: { type: DataTypes.INTEGER },
      structureReason: { type: DataTypes.TEXT },
      featuresScore: { type: DataTypes.INTEGER },
      featuresReason: { type: DataTypes.TEXT },
      area: { type: DataTypes.DOUBLE, allowNull: false },
      groundLevelFrom: { type: DataTypes.TEXT },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      imported: { type: DataTypes.JSONB, allowNull: false, defaultValue: {} },
      removedAt: { type: DataTypes.DATE },
      west: { type: DataTypes.DOUBLE, allowNull: false },
      south: { type: DataTypes.DOUBLE, allowNull: false },
      east: { type: DataTypes.DOUBLE, allowNull: false },
      north: { type: DataTypes.DOUBLE, allowNull: false },
    },
    { sequelize, tableName: 'buildings' },
  );
}
