import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { Defect, VISIT_PARTS } from '../../shared/schemas/visits.ts';

/** A visit of a building. Never changed: the database refuses. */
export class Visit extends Model<InferAttributes<Visit>, InferCreationAttributes<Visit>> {
  /** Given by the phone. */
  declare id: string;
  declare schemeId: string;
  declare buildingId: number;
  declare visitedAt: Date;
  declare visitedBy: string;
  declare part: (typeof VISIT_PARTS)[number];
  declare condition: string | null;
  declare construction: string | null;
  declare notes: string;
  declare defects: readonly Defect[];
  /** What it put right in the register. */
  declare changeId: string | null;
  /** Of everything that was sent: tells the same visit sent again from another one. */
  declare fingerprint: string;
  declare recordedAt: CreationOptional<Date>;
}

export function initVisit(sequelize: Sequelize): void {
  Visit.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      schemeId: { type: DataTypes.UUID, allowNull: false },
      buildingId: { type: DataTypes.INTEGER, allowNull: false },
      visitedAt: { type: DataTypes.DATE, allowNull: false },
      visitedBy: { type: DataTypes.UUID, allowNull: false },
      part: { type: DataTypes.TEXT, allowNull: false },
      condition: { type: DataTypes.TEXT },
      construction: { type: DataTypes.TEXT },
      notes: { type: DataTypes.TEXT, allowNull: false },
      defects: { type: DataTypes.JSONB, allowNull: false },
      changeId: { type: DataTypes.UUID },
      fingerprint: { type: DataTypes.TEXT, allowNull: false },
      recordedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'visits' },
  );
}
