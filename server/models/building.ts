import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** Outer ring and holes of each part, easting and northing in the scheme's grid. */
export type FootprintRings = readonly (readonly (readonly [number, number])[])[][];

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
  declare footprint: FootprintRings;
  /** The same in longitude and latitude, derived for the map. */
  declare lonLat: FootprintRings;
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
      footprint: { type: DataTypes.JSONB, allowNull: false },
      lonLat: { type: DataTypes.JSONB, allowNull: false },
      west: { type: DataTypes.DOUBLE, allowNull: false },
      south: { type: DataTypes.DOUBLE, allowNull: false },
      east: { type: DataTypes.DOUBLE, allowNull: false },
      north: { type: DataTypes.DOUBLE, allowNull: false },
    },
    { sequelize, tableName: 'buildings' },
  );
}
