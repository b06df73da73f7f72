import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** Somebody who can sign in, once their password is set. */
export class Person extends Model<InferAttributes<Person>, InferCreationAttributes<Person>> {
  declare id: CreationOptional<string>;
  declare email: string;
  declare name: string;
  declare passwordHash: CreationOptional<string | null>;
  declare isAdministrator: CreationOptional<boolean>;
  /** Sessions begun before it are ended. */
  declare sessionsValidFrom: CreationOptional<Date>;
  /** Since when they may not sign in; what they are in schemes stays. */
  declare shutOutAt: CreationOptional<Date | null>;
  declare createdAt: CreationOptional<Date>;
}

export function initPerson(sequelize: Sequelize): void {
  Person.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      email: { type: DataTypes.TEXT, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      passwordHash: { type: DataTypes.TEXT },
      isAdministrator: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
      sessionsValidFrom: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      shutOutAt: { type: DataTypes.DATE },
      createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'people' },
  );
}
