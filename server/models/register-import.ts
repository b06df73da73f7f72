import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { ImportAnswer, ImportOptions } from '../../shared/schemas/imports.ts';

/** What a file said of its system when it was read, and what that was found to mean. */
export type SaidPlace = {
  readonly crs: number | null;
  readonly from: 'the file' | 'the format' | 'nobody';
  /** In the file's own words, or a sentence that there were none. */
  readonly said: string;
  readonly candidates: readonly { readonly code: number; readonly name: string }[];
  /** What was found of the order of its axes. */
  readonly axes: string | null;
};

/** A file of buildings on its way into a register. */
export class RegisterImport extends Model<
  InferAttributes<RegisterImport>,
  InferCreationAttributes<RegisterImport>
> {
  declare id: CreationOptional<string>;
  declare schemeId: string;
  declare personId: string | null;
  declare at: CreationOptional<Date>;
  /** Grows with every change of the options. */
  declare version: CreationOptional<number>;
  declare state: ImportAnswer['state'];
  declare fileName: string;
  declare format: CreationOptional<ImportAnswer['format']>;
  declare kind: CreationOptional<ImportAnswer['kind']>;
  declare layer: CreationOptional<string | null>;
  /** Those that could be read instead, with the one that was; none where there is no choice. */
  declare layers: CreationOptional<ImportAnswer['layers']>;
  /** Where the file lies while another of its layers can be chosen. */
  declare file: CreationOptional<string | null>;
  /** Rows done of rows in all, by the job at hand. */
  declare done: CreationOptional<number>;
  declare of: CreationOptional<number | null>;
  declare columns: CreationOptional<ImportAnswer['columns']>;
  declare options: ImportOptions;
  declare remembered: CreationOptional<ImportAnswer['remembered']>;
  declare said: CreationOptional<SaidPlace | null>;
  declare place: CreationOptional<ImportAnswer['place']>;
  declare counts: CreationOptional<ImportAnswer['counts']>;
  declare bounds: CreationOptional<ImportAnswer['bounds']>;
  declare missing: CreationOptional<ImportAnswer['missing']>;
  declare fault: CreationOptional<string | null>;
  declare changeId: CreationOptional<string | null>;
}

export function initRegisterImport(sequelize: Sequelize): void {
  RegisterImport.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      schemeId: { type: DataTypes.UUID, allowNull: false },
      personId: { type: DataTypes.UUID },
      at: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      state: { type: DataTypes.TEXT, allowNull: false },
      fileName: { type: DataTypes.TEXT, allowNull: false },
      format: { type: DataTypes.TEXT },
      kind: { type: DataTypes.TEXT },
      layer: { type: DataTypes.TEXT },
      layers: { type: DataTypes.JSONB, allowNull: false, defaultValue: [] },
      file: { type: DataTypes.TEXT },
      done: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
      of: { type: DataTypes.INTEGER },
      columns: { type: DataTypes.JSONB, allowNull: false, defaultValue: [] },
      options: { type: DataTypes.JSONB, allowNull: false },
      remembered: { type: DataTypes.JSONB },
      said: { type: DataTypes.JSONB },
      place: { type: DataTypes.JSONB },
      counts: { type: DataTypes.JSONB },
      bounds: { type: DataTypes.JSONB },
      missing: { type: DataTypes.JSONB, allowNull: false, defaultValue: [] },
      fault: { type: DataTypes.TEXT },
      changeId: { type: DataTypes.UUID },
    },
    { sequelize, tableName: 'imports' },
  );
}
