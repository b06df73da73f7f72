import { AppError } from '../errors.ts';
import { Person } from './person.ts';
import { RegisterImport } from './register-import.ts';

/** An import with the name of who sent it. */
export type SentImport = { readonly row: RegisterImport; readonly by: string | null };

const MOST = 50;

async function withNames(rows: readonly RegisterImport[]): Promise<SentImport[]> {
  const ids = new Set(rows.flatMap(({ personId }) => personId ?? []));
  const people = await Person.findAll({ where: { id: [...ids] } });
  const names = new Map(people.map(({ id, name }) => [id, name]));
  return rows.map((row) => ({ row, by: names.get(row.personId ?? '') ?? null }));
}

/** An import of a scheme; another scheme's is not there. */
export async function findImport(schemeId: string, id: string): Promise<SentImport> {
  const row = await RegisterImport.findOne({ where: { id, schemeId } });
  const [sent] = row === null ? [] : await withNames([row]);
  if (sent === undefined) throw new AppError('not-found');
  return sent;
}

/** The imports of a scheme, the newest first. */
export async function findImports(schemeId: string): Promise<SentImport[]> {
  const order: [string, string][] = [['at', 'desc'], ['id', 'asc']]; // prettier-ignore
  return withNames(await RegisterImport.findAll({ where: { schemeId }, order, limit: MOST }));
}
