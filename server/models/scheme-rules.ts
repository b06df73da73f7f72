import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** One version of a scheme's rules and limits. A change is a new version: the database refuses others. */
export class SchemeRules extends Model<
  InferAttributes<SchemeRules>,
  InferCreationAttributes<SchemeRules>
> {
  declare schemeId: string;
  declare version: number;
  declare rules: unknown;
  declare createdBy: string;
  declare createdAt: CreationOptional<Date>;
}

export function initSchemeRules(sequelize: Sequelize): void {
  SchemeRules.init(
    {
      schemeId: { type: DataTypes.UUID, primaryKey: true },
      version: { type: DataTypes.INTEGER, primaryKey: true },
      rules: { type: DataTypes.JSONB, allowNull: false },
      createdBy: { type: DataTypes.UUID, allowNull: false },
      createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'scheme_rules' },
  );
}
