import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { PhotographType } from '../../shared/schemas/visits.ts';

/** The file of a photograph that has arrived. Never changed: the database refuses. */
export class VisitPhotographFile extends Model<
  InferAttributes<VisitPhotographFile>,
  InferCreationAttributes<VisitPhotographFile>
> {
  declare photographId: string;
  /** Of what is kept, by which it is called in the folder. */
  declare sha256: string;
  declare type: PhotographType;
  declare bytes: number;
  declare receivedAt: CreationOptional<Date>;
}

export function initVisitPhotographFile(sequelize: Sequelize): void {
  VisitPhotographFile.init(
    {
      photographId: { type: DataTypes.UUID, primaryKey: true },
      sha256: { type: DataTypes.TEXT, allowNull: false },
      type: { type: DataTypes.TEXT, allowNull: false },
      bytes: { type: DataTypes.INTEGER, allowNull: false },
      receivedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'visit_photograph_files' },
  );
}
