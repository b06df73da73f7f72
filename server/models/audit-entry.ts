import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** Who changed what, when, from which values to which. Never changed or deleted: the database refuses. */
export class AuditEntry extends Model<
  InferAttributes<AuditEntry>,
  InferCreationAttributes<AuditEntry>
> {
  declare id: CreationOptional<string>;
  declare at: CreationOptional<Date>;
  declare personId: string | null;
  declare schemeId: string | null;
  declare action: string;
  declare subjectKind: string;
  declare subjectId: string;
  declare before: CreationOptional<object | null>;
  declare after: CreationOptional<object | null>;
}

export function initAuditEntry(sequelize: Sequelize): void {
  AuditEntry.init(
    {
      id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
      at: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      personId: { type: DataTypes.UUID },
      schemeId: { type: DataTypes.UUID },
      action: { type: DataTypes.TEXT, allowNull: false },
      subjectKind: { type: DataTypes.TEXT, allowNull: false },
      subjectId: { type: DataTypes.TEXT, allowNull: false },
      before: { type: DataTypes.JSONB },
      after: { type: DataTypes.JSONB },
    },
    { sequelize, tableName: 'audit_entries' },
  );
}
