import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import {
  defaultLetterSettings,
  letterSettingsSchema,
  type LetterSettings,
} from '../../shared/schemas/letter-settings.ts';
import type { Scheme } from './scheme.ts';
import { dayOf } from '../days.ts';

/** The settings of letters that hold for a scheme; version 0 are those that it starts with. */
export type HeldSettings = {
  readonly version: number;
  readonly settings: LetterSettings;
  readonly by: string | null;
  readonly at: Date | null;
};

type Row = Omit<HeldSettings, 'settings'> & { readonly settings: unknown };

/** The newest settings of letters of a scheme. */
export async function heldSettings(
  database: Sequelize,
  { id, createdAt }: Pick<Scheme, 'id' | 'createdAt'>,
  transaction: Transaction | null = null,
): Promise<HeldSettings> {
  const [row] = await database.query<Row>(
    `select s.version, s.settings, p.name as by, s.created_at as at
     from letter_settings s left join people p on p.id = s.created_by
     where s.scheme_id = $1 order by s.version desc limit 1`,
    { type: QueryTypes.SELECT, bind: [id], transaction },
  );
  if (row === undefined) {
    const settings = defaultLetterSettings(dayOf(createdAt));
    return { version: 0, settings, by: null, at: null };
  }
  return { ...row, settings: letterSettingsSchema.parse(row.settings) };
}

/** Keeps the next version. */
export async function insertSettings(
  database: Sequelize,
  row: { readonly schemeId: string; readonly version: number; readonly by: string },
  settings: LetterSettings,
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into letter_settings (scheme_id, version, settings, created_by)
     values ($1, $2, $3::jsonb, $4)`,
    { bind: [row.schemeId, row.version, JSON.stringify(settings), row.by], transaction },
  );
}
