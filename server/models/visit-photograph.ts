import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A photograph that a visit told of. Never changed: the database refuses. */
export class VisitPhotograph extends Model<
  InferAttributes<VisitPhotograph>,
  InferCreationAttributes<VisitPhotograph>
> {
  /** Given by the phone. */
  declare id: string;
  declare visitId: string;
  /** Its place among the photographs of the visit, from 0. */
  declare number: number;
  declare caption: string;
  declare takenAt: Date | null;
  declare width: number | null;
  declare height: number | null;
  /** Whether whoever took it said that where it was taken may be kept. */
  declare keepsPlace: boolean;
  declare longitude: number | null;
  declare latitude: number | null;
}

export function initVisitPhotograph(sequelize: Sequelize): void {
  VisitPhotograph.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      visitId: { type: DataTypes.UUID, allowNull: false },
      number: { type: DataTypes.SMALLINT, allowNull: false },
      caption: { type: DataTypes.TEXT, allowNull: false },
      takenAt: { type: DataTypes.DATE },
      width: { type: DataTypes.INTEGER },
      height: { type: DataTypes.INTEGER },
      keepsPlace: { type: DataTypes.BOOLEAN, allowNull: false },
      longitude: { type: DataTypes.DOUBLE },
      latitude: { type: DataTypes.DOUBLE },
    },
    { sequelize, tableName: 'visit_photographs' },
  );
}
