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
  /** Who is named in it by id: what it is about, or in its values. */
  readonly named: readonly Person[];
};

/** Ids of people are random, so any id that stands somewhere may be asked for. */
const ID = /"([0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12})"/g;

function idsIn({ subjectKind, subjectId, before, after }: AuditEntry): string[] {
  const inValues = JSON.stringify([before, after]).matchAll(ID);
  const ids = [...inValues].flatMap(([, id]) => id ?? []);
  return subjectKind === 'person' ? [subjectId, ...ids] : ids;
}

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
      entries.flatMap((entry) => [entry.personId, ...idsIn(entry)]),
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
    named: [...new Set(idsIn(entry))].flatMap((id) => people.get(id) ?? []),
  }));
  return { records, next: found.length > PAGE ? (entries.at(-1)?.id ?? null) : null };
}
