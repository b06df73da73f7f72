import type { Transaction } from 'sequelize';
import { AuditEntry } from '../models/audit-entry.ts';
import type { Actor } from '../policies/actor.ts';

export type Change = {
  /** Nobody, where the person is not known yet. */
  readonly by: Pick<Actor, 'id'> | null;
  readonly schemeId?: string;
  readonly action: string;
  readonly subject: { readonly kind: string; readonly id: string };
  readonly before?: object;
  readonly after?: object;
};

/** Writes a change to the audit trail, in the transaction that makes it. Never passwords, never tokens. */
export async function recordChange(change: Change, transaction: Transaction): Promise<void> {
  const { by, schemeId, action, subject, before, after } = change;
  await AuditEntry.create(
    {
      personId: by?.id ?? null,
      schemeId: schemeId ?? null,
      action,
      subjectKind: subject.kind,
      subjectId: subject.id,
      before: before ?? null,
      after: after ?? null,
    },
    { transaction },
  );
}
