import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { RunStateName } from '../../shared/schemas/runs.ts';

/** Where a run stands. */
export class RunState extends Model<InferAttributes<RunState>, InferCreationAttributes<RunState>> {
  declare runId: string;
  declare state: RunStateName;
  declare endedAt: CreationOptional<Date | null>;
  declare fault: CreationOptional<string | null>;
}

export function initRunState(sequelize: Sequelize): void {
  RunState.init(
    {
      runId: { type: DataTypes.UUID, primaryKey: true },
      state: { type: DataTypes.TEXT, allowNull: false },
      endedAt: { type: DataTypes.DATE },
      fault: { type: DataTypes.TEXT },
    },
    { sequelize, tableName: 'run_states' },
  );
}
