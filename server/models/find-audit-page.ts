import { Op } from 'sequelize';
import { AuditEntry } from './audit-entry.ts';
import { Person } from './person.ts';
import { Scheme } from './scheme.ts';

const PAGE = 50;

/** An entry with who and where, as far as they are known. */
export type AuditRecord = {
  readonly entry: AuditEntry;
  readonly person: Person | undefined;
  readonly scheme: Scheme | undefined;
};

async function byId<Row extends { readonly id: string }>(
  ids: readonly (string | null)[],
  find: (ids: string[]) => Promise<Row[]>,
): Promise<Map<string, Row>> {
  const wanted = [...new Set(ids.filter((id) => id !== null))];
  return new Map((await find(wanted)).map((row) => [row.id, row]));
}

/** The audit trail from the newest entry back, or from an entry on; `next` is where the next page begins. */
export async function findAuditPage(wanted: {
  readonly before?: string | undefined;
  readonly schemeId?: string | undefined;
}): Promise<{ records: AuditRecord[]; next: string | null }> {
  const { before, schemeId } = wanted;
  const found = await AuditEntry.findAll({
    where: {
      ...(before !== undefined && { id: { [Op.lt]: before } }),
      ...(schemeId !== undefined && { schemeId }),
    },
    order: [['id', 'desc']],
    limit: PAGE + 1,
  });
  const entries = found.slice(0, PAGE);
  const [people, schemes] = await Promise.all([
    byId(
      entries.map(({ personId }) => personId),
      (id) => Person.findAll({ where: { id } }),
    ),
    byId(
      entries.map((entry) => entry.schemeId),
      (id) => Scheme.findAll({ where: { id } }),
    ),
  ]);
  const records = entries.map((entry) => ({
    entry,
    person: people.get(entry.personId ?? ''),
    scheme: schemes.get(entry.schemeId ?? ''),
  }));
  return { records, next: found.length > PAGE ? (entries.at(-1)?.id ?? null) : null };
}
