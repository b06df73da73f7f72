import { literal, QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { Shafts } from '../../shared/schemas/alignments.ts';
import { AppError } from '../errors.ts';
import { Alignment } from './alignment.ts';
import { Person } from './person.ts';

export type AlignmentBy = { readonly alignment: Alignment; readonly by: Person | undefined };

async function withPeople(alignments: readonly Alignment[]): Promise<AlignmentBy[]> {
  const ids = alignments.flatMap(({ changedBy }) => changedBy ?? []);
  const people = await Person.findAll({ where: { id: [...new Set(ids)] } });
  return alignments.map((alignment) => ({
    alignment,
    by: people.find(({ id }) => id === alignment.changedBy),
  }));
}

/** The options of a scheme by name, each with who changed it last. */
export async function findAlignments(schemeId: string): Promise<AlignmentBy[]> {
  const order = [literal('name collate natural_order'), 'id'];
  return withPeople(await Alignment.findAll({ where: { schemeId }, order }));
}

/** One option of a scheme; of another scheme it is not there. */
export async function findAlignment(schemeId: string, id: string): Promise<AlignmentBy> {
  const alignment = await Alignment.findOne({ where: { id, schemeId } });
  const [found] = alignment === null ? [] : await withPeople([alignment]);
  if (found === undefined) throw new AppError('not-found');
  return found;
}

/** The shafts of an option; of every option of a scheme where no run tells which is meant. */
export async function findShafts(
  database: Sequelize,
  { schemeId, optionId }: { readonly schemeId: string; readonly optionId: string | null },
  transaction: Transaction | null,
): Promise<Shafts> {
  const rows = await database.query<{ shafts: Shafts }>(
    'select shafts from alignments where scheme_id = $1 and ($2::uuid is null or id = $2)',
    { type: QueryTypes.SELECT, bind: [schemeId, optionId], transaction },
  );
  return rows.flatMap(({ shafts }) => shafts);
}
