import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { LinkPurpose } from '../../shared/schemas/links.ts';

/** A link sent by mail that sets a password once. Only the hash of its token is kept. */
export class SingleUseLink extends Model<
  InferAttributes<SingleUseLink>,
  InferCreationAttributes<SingleUseLink>
> {
  declare id: CreationOptional<string>;
  declare personId: string;
  declare purpose: LinkPurpose;
  declare tokenHash: string;
  declare expiresAt: Date;
  declare usedAt: CreationOptional<Date | null>;
}

export function initSingleUseLink(sequelize: Sequelize): void {
  SingleUseLink.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      personId: { type: DataTypes.UUID, allowNull: false },
      purpose: { type: DataTypes.TEXT, allowNull: false },
      tokenHash: { type: DataTypes.TEXT, allowNull: false },
      expiresAt: { type: DataTypes.DATE, allowNull: false },
      usedAt: { type: DataTypes.DATE },
    },
    { sequelize, tableName: 'single_use_links' },
  );
}
