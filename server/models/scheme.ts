import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A project with its own grid, people, rules and register. */
export class Scheme extends Model<InferAttributes<Scheme>, InferCreationAttributes<Scheme>> {
  declare id: CreationOptional<string>;
  declare name: string;
  declare description: CreationOptional<string>;
  /** EPSG number of the projected system, in metres. */
  declare crs: number;
  declare archivedAt: CreationOptional<Date | null>;
  /** Grows with every change: who saves an older one is told. */
  declare version: CreationOptional<number>;
  /** Grows with every change of the register; part of the address of its tiles. */
  declare registerVersion: CreationOptional<number>;
  /** Grows with every decision, check, mark and assignment. */
  declare decisionsVersion: CreationOptional<number>;
  /** Grows with every upload of streets, water, rail or parks. */
  declare backgroundVersion: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
}

export function initScheme(sequelize: Sequelize): void {
  Scheme.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      name: { type: DataTypes.TEXT, allowNull: false },
      description: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
      crs: { type: DataTypes.INTEGER, allowNull: false },
      archivedAt: { type: DataTypes.DATE },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      registerVersion: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      decisionsVersion: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      backgroundVersion: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'schemes' },
  );
}
