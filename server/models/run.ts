import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { AlignmentDesign } from '../../shared/schemas/alignments.ts';
import type { RuleSet } from '../../shared/schemas/rules.ts';

/** What was put into a run. Never changed: the database refuses. */
export class Run extends Model<InferAttributes<Run>, InferCreationAttributes<Run>> {
  declare id: CreationOptional<string>;
  declare schemeId: string;
  /** By which people call it, from 1 in every scheme. */
  declare number: number;
  declare alignmentId: string;
  declare alignmentVersion: number;
  declare optionName: string;
  declare design: AlignmentDesign;
  declare rulesVersion: number;
  declare rules: RuleSet;
  declare methodVersion: string;
  declare registerVersion: number;
  declare buildings: number;
  declare startedAt: CreationOptional<Date>;
  declare startedBy: string | null;
}

export function initRun(sequelize: Sequelize): void {
  Run.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      schemeId: { type: DataTypes.UUID, allowNull: false },
      number: { type: DataTypes.INTEGER, allowNull: false },
      alignmentId: { type: DataTypes.UUID, allowNull: false },
      alignmentVersion: { type: DataTypes.INTEGER, allowNull: false },
      optionName: { type: DataTypes.TEXT, allowNull: false },
      design: { type: DataTypes.JSONB, allowNull: false },
      rulesVersion: { type: DataTypes.INTEGER, allowNull: false },
      rules: { type: DataTypes.JSONB, allowNull: false },
      methodVersion: { type: DataTypes.TEXT, allowNull: false },
      registerVersion: { type: DataTypes.INTEGER, allowNull: false },
      buildings: { type: DataTypes.INTEGER, allowNull: false },
      startedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      startedBy: { type: DataTypes.UUID },
    },
    { sequelize, tableName: 'runs' },
  );
}
