import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { BATCH_STATES } from '../../shared/schemas/letter-batches.ts';
import type { LetterWords } from '../../shared/presentation/letter-text.ts';
import type { LetterKind } from '../../shared/schemas/letter-settings.ts';

/** A batch of letters with who did what, and how far its letters are. */
export type FoundBatch = {
  readonly id: string;
  readonly number: number;
  readonly kind: LetterKind;
  readonly state: (typeof BATCH_STATES)[number];
  readonly templateVersion: number;
  readonly settingsVersion: number;
  readonly runNumber: number | null;
  readonly letters: number;
  readonly byPost: number;
  readonly preparedBy: string;
  readonly preparedById: string;
  readonly preparedAt: Date;
  readonly checkedBy: string | null;
  readonly checkedAt: Date | null;
  readonly comment: string | null;
  readonly sentBy: string | null;
  readonly sentAt: Date | null;
  readonly printedAt: Date | null;
  readonly deliveries: {
    readonly waiting: number;
    readonly sent: number;
    readonly sentAgain: number;
    readonly failed: number;
    readonly post: number;
    readonly acknowledged: number;
  };
};

const DELIVERIES = `(
  select json_build_object(
    'waiting', count(*) filter (where o.state = 'waiting'),
    'sent', count(*) filter (where o.state = 'sent'),
    'sentAgain', count(*) filter (where o.state = 'sent' and o.was_sent_again),
    'failed', count(*) filter (where o.state = 'failed'),
    'post', count(*) filter (where l.channel = 'post'),
    'acknowledged', count(*) filter (where a.letter_id is not null)
  )
  from letters l
  left join outbox o on o.letter_id = l.id and not o.is_reminder
  left join letter_acknowledgements a on a.letter_id = l.id
  where l.batch_id = b.id
)`;

/** The batches of a scheme, the newest first, or one of them. */
export function findBatches(
  database: Sequelize,
  schemeId: string,
  batchId: string | null = null,
  transaction: Transaction | null = null,
): Promise<FoundBatch[]> {
  return database.query<FoundBatch>(
    `select b.id, b.number, b.kind, b.state, b.template_version as "templateVersion",
       b.settings_version as "settingsVersion", r.number as "runNumber", b.letters,
       b.prepared_by as "preparedById", p.name as "preparedBy", b.prepared_at as "preparedAt",
       c.name as "checkedBy", b.checked_at as "checkedAt", b.comment,
       s.name as "sentBy", b.sent_at as "sentAt", x.printed_at as "printedAt",
       (select count(*)::integer from letters l where l.batch_id = b.id and l.channel = 'post')
         as "byPost",
       ${DELIVERIES} as deliveries
     from letter_batches b
     join people p on p.id = b.prepared_by
     left join people c on c.id = b.checked_by
     left join people s on s.id = b.sent_by
     left join runs r on r.id = b.run_id
     left join letter_printings x on x.batch_id = b.id
     where b.scheme_id = $1 and ($2::uuid is null or b.id = $2)
     order by b.number desc`,
    { type: QueryTypes.SELECT, bind: [schemeId, batchId], transaction },
  );
}

/** What was written for a batch, with its marks; null where it went by its template. */
export async function findBatchText(database: Sequelize, id: string): Promise<LetterWords | null> {
  const [row] = await database.query<LetterWords>(
    `select own_subject as subject, own_body as body from letter_batches
     where id = $1 and own_body is not null`,
    { type: QueryTypes.SELECT, bind: [id] },
  );
  return row ?? null;
}

/** Keeps a batch with the next number. */
export async function insertBatch(
  database: Sequelize,
  batch: {
    readonly id: string;
    readonly schemeId: string;
    readonly kind: LetterKind;
    readonly templateVersion: number;
    readonly settingsVersion: number;
    readonly runId: string | null;
    readonly letters: number;
    readonly text: LetterWords | null;
    readonly by: string;
  },
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into letter_batches (id, scheme_id, number, kind, template_version, settings_version,
       run_id, letters, prepared_by, own_subject, own_body)
     select $1, $2, coalesce(max(number), 0) + 1, $3, $4, $5, $6::uuid, $7, $8, $9, $10
     from letter_batches where scheme_id = $2`,
    {
      bind: [
        ...[batch.id, batch.schemeId, batch.kind, batch.templateVersion],
        ...[batch.settingsVersion, batch.runId, batch.letters, batch.by],
        ...[batch.text?.subject ?? null, batch.text?.body ?? null],
      ],
      transaction,
    },
  );
}

/** A batch that was checked or returned by somebody. */
export async function writeCheck(
  database: Sequelize,
  id: string,
  check: { readonly state: 'checked' | 'returned'; readonly by: string; readonly comment: string },
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `update letter_batches set state = $2, checked_by = $3, checked_at = now(),
       comment = nullif($4, '') where id = $1`,
    { bind: [id, check.state, check.by, check.comment], transaction },
  );
}

/** A batch that is not to be sent. */
export async function writeWithdrawal(
  database: Sequelize,
  id: string,
  transaction: Transaction,
): Promise<void> {
  await database.query(`update letter_batches set state = 'withdrawn' where id = $1`, {
    bind: [id],
    transaction,
  });
}

/** A batch that goes out. */
export async function writeSending(
  database: Sequelize,
  id: string,
  by: string,
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `update letter_batches set state = 'sent', sent_by = $2, sent_at = now() where id = $1`,
    { bind: [id, by], transaction },
  );
}

/** That the letters of a batch that go by post have been handed to it; once. */
export async function insertPrinting(
  database: Sequelize,
  id: string,
  by: string,
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into letter_printings (batch_id, printed_by) values ($1, $2) on conflict do nothing`,
    { bind: [id, by], transaction },
  );
}
