import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { BackgroundLayer } from '../../shared/schemas/background.ts';

/** A street, stretch of water, railway or park drawn under a scheme's buildings. */
export class BackgroundFeature extends Model<
  InferAttributes<BackgroundFeature>,
  InferCreationAttributes<BackgroundFeature>
> {
  declare id: CreationOptional<number>;
  declare schemeId: string;
  declare layer: BackgroundLayer;
  declare name: string | null;
  /** GeoJSON geometry in longitude and latitude. */
  declare geometry: unknown;
  declare west: number;
  declare south: number;
  declare east: number;
  declare north: number;
}

export function initBackgroundFeature(sequelize: Sequelize): void {
  BackgroundFeature.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      schemeId: { type: DataTypes.UUID, allowNull: false },
      layer: { type: DataTypes.TEXT, allowNull: false },
      name: { type: DataTypes.TEXT },
      geometry: { type: DataTypes.JSONB, allowNull: false },
      west: { type: DataTypes.DOUBLE, allowNull: false },
      south: { type: DataTypes.DOUBLE, allowNull: false },
      east: { type: DataTypes.DOUBLE, allowNull: false },
      north: { type: DataTypes.DOUBLE, allowNull: false },
    },
    { sequelize, tableName: 'background_features' },
  );
}
