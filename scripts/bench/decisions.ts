import { assignBuildings } from '../../server/commands/assign-buildings.ts';
import { checkDecisions } from '../../server/commands/check-decisions.ts';
import { prepareDecisions } from '../../server/commands/prepare-decisions.ts';
import { funnelOf } from '../../server/decisions/funnel.ts';
import { previewDecisions } from '../../server/decisions/preview-decisions.ts';
import { refreshMarks } from '../../server/decisions/refresh-marks.ts';
import { defaultRules } from '../../server/commands/default-rules.ts';
import { Membership } from '../../server/models/membership.ts';
import { Person } from '../../server/models/person.ts';
import { SchemeRules } from '../../server/models/scheme-rules.ts';
import type { Scheme } from '../../server/models/scheme.ts';
import { registerOf } from '../../server/register/register-of.ts';
import { registerPage } from '../../server/register/register-page.ts';
import type { Services } from '../../server/services.ts';
import type { DecisionKind } from '../../shared/schemas/decisions.ts';
import { REGISTER_ORDER, type RegisterFilter } from '../../shared/schemas/register.ts';
import { untilLookedAfter } from './looked-after.ts';
import { percentiles, times } from './percentiles.ts';

/** Each after a decision that has made what was kept worthless. */
const TURNS = 20;

const ASKED: readonly (readonly [name: string, filter: RegisterFilter])[] = [
  ['what is to decide at stage 3', { any: { stage: ['3'], state: ['to decide'] } }],
  ['what waits for a check', { any: { state: ['waiting for check'] } }],
  ['what is decided', { any: { state: ['decided'] } }],
  ['what is somebody’s', { any: { assignedTo: ['First'] } }],
];

function say(name: string, words: string): void {
  console.log(`decisions, ${name}: ${words}`);
}

async function anAssessor(scheme: Scheme, name: string): Promise<Person> {
  const email = `${name.toLowerCase()}@bench.example.org`;
  const person = await Person.create({ email, name });
  await Membership.create({ schemeId: scheme.id, personId: person.id, role: 'assessor' });
  return person;
}

type Office = {
  readonly services: Services;
  readonly scheme: Scheme;
  readonly runId: string;
  readonly first: Person;
  readonly second: Person;
};

function actor({ id }: Person) {
  return { id, isAdministrator: false };
}

async function prepare(
  { services, scheme, runId, first }: Office,
  kind: DecisionKind,
  filter: RegisterFilter,
): Promise<number> {
  const proposed = { runId, kind, reason: '', filter };
  const { allowed } = await previewDecisions(services, scheme, proposed);
  await prepareDecisions(services, actor(first), scheme, { ...proposed, expected: allowed });
  return allowed;
}

/** Both stages let go in bulk and checked: how long, and how many. */
async function benchBulk(office: Office): Promise<void> {
  const { services, scheme, second } = office;
  for (const stage of [1, 2] as const) {
    const start = performance.now();
    const kind = `let go at stage ${stage}` as const;
    const count = await prepare(office, kind, { any: { stage: [String(stage)] } });
    const prepared = performance.now();
    const check = { filter: {}, verdict: 'checked', comment: '', expected: count } as const;
    await checkDecisions(services, actor(second), scheme, check);
    const [one, two] = [prepared - start, performance.now() - prepared];
    say(kind, `${count} looked at and prepared in ${(one / 1000).toFixed(1)} s, checked in ${(two / 1000).toFixed(1)} s`); // prettier-ignore
  }
  const start = performance.now();
  await services.database.transaction((transaction) =>
    refreshMarks(services.database, scheme, null, transaction),
  );
  say('all compared with a run', `${((performance.now() - start) / 1000).toFixed(1)} s`);
}

async function pageOf({ services, scheme }: Office, filter: RegisterFilter) {
  await scheme.reload();
  const register = await registerOf(services, scheme);
  return registerPage(services, register, { filter, sort: REGISTER_ORDER, offset: 0, limit: 100 });
}

/** What an assessor does to one building after the other, with the lists fetched anew in between. */
async function benchActions(office: Office): Promise<void> {
  const { services, scheme, first, second } = office;
  const { rows } = await pageOf(office, ASKED[0]?.[1] ?? {});
  const taken = new Map<string, number[]>();
  async function time(name: string, action: () => Promise<unknown>): Promise<void> {
    const [milliseconds = 0] = await times(1, action);
    taken.set(name, [...(taken.get(name) ?? []), milliseconds]);
  }
  for (const { id } of rows.slice(0, TURNS)) {
    const filter = { ids: [id] };
    await time('given to somebody', () =>
      assignBuildings(services, actor(first), scheme, { filter, expected: 1, personId: first.id }),
    );
    await time('looked at and prepared', () => prepare(office, 'go to stage 3', filter));
    for (const [name, asked] of ASKED) await time(name, () => pageOf(office, asked));
    await time('counts by stage and state', async () => {
      await scheme.reload();
      return funnelOf(services, actor(first), scheme);
    });
    await time('checked', () =>
      checkDecisions(services, actor(second), scheme, {
        ...{ filter, verdict: 'checked', comment: '', expected: 1 },
      }),
    );
  }
  for (const [name, milliseconds] of taken) say(name, percentiles(milliseconds));
  say('all of these', percentiles([...taken.values()].flat()));
}

/** Prints what the assessors' list takes over the run of a scheme that is shown. */
export async function benchDecisions(services: Services, scheme: Scheme): Promise<void> {
  const { runId } = await registerOf(services, scheme);
  if (runId === null) throw new Error('There is no run to decide on.');
  const [first, second] = [await anAssessor(scheme, 'First'), await anAssessor(scheme, 'Second')];
  const hasRules = await SchemeRules.count({ where: { schemeId: scheme.id } });
  if (hasRules === 0) {
    const rules = defaultRules('2026-12-01');
    await SchemeRules.create({ schemeId: scheme.id, version: 1, rules, createdBy: first.id });
  }
  const office = { services, scheme, runId, first, second };
  await benchBulk(office);
  await untilLookedAfter(services.database, 'building_standings');
  await benchActions(office);
}
