import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** Outer ring and holes of each part, easting and northing in the scheme's grid. */
export type FootprintRings = readonly (readonly (readonly (readonly [number, number])[])[])[];

/** The footprint of a building, apart from what lists show of it. */
export class BuildingFootprint extends Model<
  InferAttributes<BuildingFootprint>,
  InferCreationAttributes<BuildingFootprint>
> {
  declare buildingId: number;
  declare footprint: FootprintRings;
  /** The same in longitude and latitude, derived for the map. */
  declare lonLat: FootprintRings;
}

export function initBuildingFootprint(sequelize: Sequelize): void {
  BuildingFootprint.init(
    {
      buildingId: { type: DataTypes.INTEGER, primaryKey: true },
      footprint: { type: DataTypes.JSONB, allowNull: false },
      lonLat: { type: DataTypes.JSONB, allowNull: false },
    },
    { sequelize, tableName: 'building_footprints' },
  );
}
