import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import { DEFAULT_TEMPLATES } from '../../shared/presentation/letter-templates.ts';
import { LETTER_KINDS, type LetterKind } from '../../shared/schemas/letter-settings.ts';

/** A template that holds; version 0 is the one that a scheme starts with. */
export type HeldTemplate = {
  readonly kind: LetterKind;
  readonly version: number;
  readonly subject: string;
  readonly body: string;
  readonly by: string | null;
  readonly at: Date | null;
};

/** The newest version of each template of a scheme. */
export async function heldTemplates(
  database: Sequelize,
  schemeId: string,
  transaction: Transaction | null = null,
): Promise<HeldTemplate[]> {
  const rows = await database.query<HeldTemplate>(
    `select distinct on (t.kind) t.kind, t.version, t.subject, t.body, p.name as by, t.created_at as at
     from letter_templates t left join people p on p.id = t.created_by
     where t.scheme_id = $1 order by t.kind, t.version desc`,
    { type: QueryTypes.SELECT, bind: [schemeId], transaction },
  );
  const byKind = new Map(rows.map((row) => [row.kind, row]));
  return LETTER_KINDS.map(
    (kind) =>
      byKind.get(kind) ?? { kind, version: 0, ...DEFAULT_TEMPLATES[kind], by: null, at: null },
  );
}

/** The template of one kind that holds. */
export async function heldTemplate(
  database: Sequelize,
  schemeId: string,
  kind: LetterKind,
  transaction: Transaction | null = null,
): Promise<HeldTemplate> {
  const found = (await heldTemplates(database, schemeId, transaction)).find(
    (one) => one.kind === kind,
  );
  if (found === undefined) throw new Error(`There is no template for ${kind}.`);
  return found;
}

/** Keeps the next version of a template. */
export async function insertTemplate(
  database: Sequelize,
  row: Pick<HeldTemplate, 'kind' | 'version' | 'subject' | 'body'> & {
    readonly schemeId: string;
    readonly by: string;
  },
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into letter_templates (scheme_id, kind, version, subject, body, created_by)
     values ($1, $2, $3, $4, $5, $6)`,
    { bind: [row.schemeId, row.kind, row.version, row.subject, row.body, row.by], transaction },
  );
}
