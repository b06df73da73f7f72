import { QueryTypes, type Sequelize } from 'sequelize';
import { STANDINGS } from '../../shared/schemas/decisions.ts';
import type { Funnel } from '../../shared/schemas/decision-answers.ts';
import type { RegisterOf } from './register-condition.ts';

type Counted = {
  readonly stage: number;
  readonly state: string;
  readonly kind: string | null;
  readonly count: number;
};

const COUNTS = `select r.stage, coalesce(t.state, 'to decide') as state, t.kind,
    count(*)::integer as count
  from run_results r
  join buildings b on b.id = r.building_id and b.removed_at is null
  left join building_standings t on t.alignment_id = $2::uuid and t.building_id = r.building_id
  where r.run_id = $1::uuid
  group by 1, 2, 3`;

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

function ofStage(rows: readonly Counted[], stage: number): Funnel['stages'][number] {
  const here = rows.filter((row) => row.stage === stage);
  const sum = (some: readonly Counted[]) => some.reduce((all, { count }) => all + count, 0);
  const counts = STANDINGS.map((standing) => [
    standing,
    sum(here.filter(({ state }) => state === standing)),
  ]);
  return {
    buildings: sum(here),
    standings: Object.fromEntries(counts) as Funnel['stages'][number]['standings'],
  };
}

/** How many buildings of a run stand where; nobody's own are counted apart. */
export async function countFunnel(
  database: Sequelize,
  { runId, optionId }: Pick<RegisterOf, 'runId' | 'optionId'>,
): Promise<Omit<Funnel, 'mine'>> {
  const [rows, heldBy] = await Promise.all([
    database.query<Counted>(COUNTS, { type: QueryTypes.SELECT, bind: [runId, optionId] }),
    database.query<Held>(HELD, {
      type: QueryTypes.SELECT,
      bind: [runId],
    }),
  ]);
  const decided = rows.filter(({ state }) => state === 'decided');
  const kinds = new Map<string, number>();
  for (const { kind, count } of decided) {
    if (kind !== null) kinds.set(kind, (kinds.get(kind) ?? 0) + count);
  }
  const stages = [1, 2, 3].map((stage) => ofStage(rows, stage));
  return {
    runId,
    buildings: stages.reduce((all, { buildings }) => all + buildings, 0),
    stages: stages as unknown as Funnel['stages'],
    heldBy: byRule(heldBy),
    kinds: [...kinds].map(([kind, count]) => ({ kind, count })) as Funnel['kinds'],
  };
}

/** How many buildings are somebody's. */
export async function countAssigned(
  database: Sequelize,
  schemeId: string,
  personId: string,
): Promise<number> {
  const [row] = await database.query<{ count: number }>(
    `select count(*)::integer as count from building_assignments g
     join buildings b on b.id = g.building_id
     where b.scheme_id = $1 and b.removed_at is null and g.person_id = $2`,
    { type: QueryTypes.SELECT, bind: [schemeId, personId] },
  );
  return row?.count ?? 0;
}
