import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A letter that the demo sent to itself. */
export class MailboxLetter extends Model<
  InferAttributes<MailboxLetter>,
  InferCreationAttributes<MailboxLetter>
> {
  declare id: CreationOptional<number>;
  declare messageId: string;
  declare receivedAt: CreationOptional<Date>;
  declare sender: string;
  declare recipient: string;
  declare subject: string;
  declare text: string;
  declare html: string | null;
  /** What came with it. */
  declare attachments: CreationOptional<
    readonly { readonly name: string; readonly type: string; readonly base64: string }[]
  >;
}

export function initMailboxLetter(sequelize: Sequelize): void {
  MailboxLetter.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      messageId: { type: DataTypes.TEXT, allowNull: false },
      receivedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      sender: { type: DataTypes.TEXT, allowNull: false },
      recipient: { type: DataTypes.TEXT, allowNull: false },
      subject: { type: DataTypes.TEXT, allowNull: false },
      text: { type: DataTypes.TEXT, allowNull: false },
      html: { type: DataTypes.TEXT },
      attachments: { type: DataTypes.JSONB, allowNull: false, defaultValue: [] },
    },
    { sequelize, tableName: 'mailbox_letters' },
  );
}
