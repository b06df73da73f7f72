import { QueryTypes, type Sequelize } from 'sequelize';
import type { Funnel } from '../../shared/schemas/decision-answers.ts';

const HELD = `select array_to_string(r.held_by, ', ') as text, r.held_by as names,
    count(*)::integer as count
  from run_results r join buildings b on b.id = r.building_id and b.removed_at is null
  where r.run_id = $1::uuid and cardinality(r.held_by) > 0
  group by r.held_by`;

type Held = { readonly text: string; readonly names: readonly string[]; readonly count: number };

/** By the rule, with what the register writes of all that it holds together with others. */
function byRule(held: readonly Held[]): Funnel['heldBy'] {
  const names = [...new Set(held.flatMap((row) => row.names))];
  const rules = names.map((name) => {
    const rows = held.filter((row) => row.names.includes(name));
    const count = rows.reduce((all, row) => all + row.count, 0);
    return { name, count, texts: rows.map(({ text }) => text) };
  });
  return rules.sort((a, b) => b.count - a.count);
}

/** How many buildings of a run, of those that are in the register, each rule holds. */
export async function countHeld(
  database: Sequelize,
  runId: string | null,
): Promise<Funnel['heldBy']> {
  const rows = await database.query<Held>(HELD, { type: QueryTypes.SELECT, bind: [runId] });
  return byRule(rows);
}
