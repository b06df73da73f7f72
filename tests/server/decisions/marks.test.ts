import { describe, expect, test } from 'vitest';
import { rulesSchema, type RuleSet } from '../../../shared/schemas/rules.ts';
import { defaultRules } from '../../../server/commands/default-rules.ts';
import { addRules } from '../../../server/commands/add-rules.ts';
import { anAdministrator, anAlignment } from '../../support/factories.ts';
import { decide, decisionsOn, rowsOf, twoAssessors } from '../../support/decisions.ts';
import { change } from '../../support/register.ts';
import { aRun, UNDER_TOWN } from '../../support/runs.ts';
import { testApp } from '../../support/test-app.ts';

const tested = testApp();
const { services } = tested;

const RULES = defaultRules('2026-12-01');
const DATED = { source: 'common-practice', date: '2026-12-01' } as const;

/** An office with a decision on each of three buildings: let go at 1, let go at 2, and held. */
async function decided() {
  const office = await twoAssessors(tested);
  const rows = await rowsOf(office.firstAgent, office.address);
  const slight = [...rows.values()].find(({ stage, category }) => stage === 2 && category !== 0);
  const atTwo = slight?.reference ?? '';
  const ids = [
    await decide(office, 'far', { kind: 'let go at stage 1' }),
    await decide(office, atTwo, { kind: 'let go at stage 2' }),
    await decide(office, 'piled', { kind: 'go to stage 3' }),
  ];
  for (const id of ids) {
    await office.secondAgent
      .post(`${office.address}/decisions/${id}/check`)
      .send({ verdict: 'checked' });
  }
  const building = (reference: string) => rows.get(reference)?.id ?? 0;
  return { ...office, atTwo, building };
}

type Decided = Awaited<ReturnType<typeof decided>>;

/** What is marked on each of the three, in words. */
async function marksOf({ firstAgent, address, run, atTwo, building }: Decided) {
  const found: Record<string, string[]> = {};
  for (const reference of ['far', atTwo, 'piled']) {
    const place = { runId: run.id, buildingId: building(reference) };
    const [decision] = (await decisionsOn(firstAgent, address, place)).decisions;
    const changes = decision?.changes ?? [];
    const name = reference === atTwo ? 'at two' : reference;
    if (changes.length > 0) found[name] = changes.map(({ what }) => what);
  }
  return found;
}

async function changeRules({ scheme }: Decided, rules: RuleSet, basedOn = 1) {
  await addRules(services(), await anAdministrator(), scheme, { basedOn, rules });
}

const WITHOUT_PILED = RULES.holds.filter(({ name }) => name !== 'piled');

const RULE_CHANGES: readonly {
  readonly what: string;
  readonly rules: RuleSet;
  readonly marks: Readonly<Record<string, readonly string[]>>;
}[] = [
  { what: 'the same again', rules: RULES, marks: {} },
  {
    what: 'a lower category that leads on',
    rules: { ...RULES, leadingCategory: { ...RULES.leadingCategory, value: 1 } },
    marks: { 'at two': ['stage'] },
  },
  {
    what: 'a hold that is taken out',
    rules: { ...RULES, holds: WITHOUT_PILED },
    marks: { piled: ['stage', 'held'] },
  },
  {
    what: 'a hold that acts on nothing here',
    rules: {
      ...RULES,
      holds: [
        ...RULES.holds,
        {
          name: 'very deep',
          condition: { kind: 'founded deeper than', depth: 40 },
          stages: [1, 2],
          ...DATED,
        },
      ],
    },
    marks: {},
  },
  {
    what: 'a wider limit of screening that all decided on stay on the same side of',
    rules: {
      ...RULES,
      screening: { ...RULES.screening, value: { settlement: 0.0101, slope: 1 / 500 } },
    },
    marks: {},
  },
  {
    what: 'what only a new run can tell',
    rules: { ...RULES, cutOff: { ...RULES.cutOff, value: { kind: 'settlement', settlement: 0 } } },
    marks: {},
  },
];

describe('what decisions rest on', () => {
  test.each(RULE_CHANGES)('is looked at again after $what', async ({ rules, marks }) => {
    const office = await decided();
    await changeRules(office, rulesSchema.parse(rules));
    expect(await marksOf(office)).toEqual(marks);
    const rows = await rowsOf(office.firstAgent, office.address);
    const states = { far: 'far', 'at two': office.atTwo, piled: 'piled' };
    for (const [name, reference] of Object.entries(states)) {
      const state = name in marks ? 'to look at again' : 'decided';
      expect(rows.get(reference)).toMatchObject({ state });
    }
  });

  test('is put right again by rules that bring it back', async () => {
    const office = await decided();
    await changeRules(office, { ...RULES, holds: WITHOUT_PILED });
    expect(Object.keys(await marksOf(office))).toEqual(['piled']);
    await changeRules(office, RULES, 2);
    expect(await marksOf(office)).toEqual({});
  });

  test.each([
    { what: 'is listed', attributes: { listedGrade: 'listed' }, marks: ['stage', 'held'] },
    {
      what: 'is scored as delicate',
      attributes: { structureScore: 2, featuresScore: 2 },
      marks: ['stage', 'held', 'sensitivity'],
    },
    { what: 'is called otherwise', attributes: { name: 'Net loft' }, marks: undefined },
  ])('is looked at again where a building $what', async ({ attributes, marks }) => {
    const office = await decided();
    const { scheme, atTwo, building } = office;
    await change(scheme, { changed: [{ id: building(atTwo), version: 1, attributes }] });
    expect(await marksOf(office)).toEqual(marks === undefined ? {} : { 'at two': marks });
  });

  test('is compared with a newer run of the same option, and exactly what differs is marked', async () => {
    const office = await decided();
    const { scheme, option, firstAgent, address, atTwo } = office;
    const before = await rowsOf(firstAgent, address);
    const volumeLoss = { low: 0.02, central: 0.04, high: 0.06 };
    await option.update({ version: 2, design: { ...UNDER_TOWN, volumeLoss } });
    await aRun(tested, scheme, option);
    const after = await rowsOf(firstAgent, address);
    const concluded = [
      'stage',
      'categoryLow',
      'category',
      'categoryHigh',
      'settled',
      'heldBy',
    ] as const;
    const differs = (reference: string) =>
      concluded.some(
        (column) => before.get(reference)?.[column] !== after.get(reference)?.[column],
      );
    const marked = Object.keys(await marksOf(office));
    expect(marked).toEqual(
      [...(differs('far') ? ['far'] : []), ...(differs(atTwo) ? ['at two'] : []), ...(differs('piled') ? ['piled'] : [])], // prettier-ignore
    );
    expect(marked).toContain('at two');
    await option.update({ version: 3, design: UNDER_TOWN });
    await aRun(tested, scheme, option);
    expect(await marksOf(office)).toEqual({});
  });

  test('is of one option: a run of another marks nothing', async () => {
    const office = await decided();
    const { scheme } = office;
    const volumeLoss = { low: 0.02, central: 0.04, high: 0.06 };
    const other = await anAlignment(scheme, { name: 'B', design: { ...UNDER_TOWN, volumeLoss } });
    await aRun(tested, scheme, other);
    expect(await marksOf(office)).toEqual({});
    const rows = await rowsOf(office.firstAgent, office.address);
    expect(rows.get('far')).toMatchObject({ state: 'to decide' });
  });

  test('keeps a decision that waits from being checked until it is prepared again', async () => {
    const office = await twoAssessors(tested);
    const id = await decide(office, 'piled', { kind: 'go to stage 3' });
    await changeRules(office as Decided, { ...RULES, holds: WITHOUT_PILED });
    const path = `${office.address}/decisions/${id}/check`;
    expect((await office.secondAgent.post(path).send({ verdict: 'checked' })).status).toBe(409);
    const returned = { verdict: 'returned', comment: 'The rule is gone.' };
    expect((await office.secondAgent.post(path).send(returned)).status).toBe(204);
  });
});

test('with the rules of the run, what is concluded is what the run found', async () => {
  const office = await twoAssessors(tested);
  const { firstAgent, address, run } = office;
  for (const row of (await rowsOf(firstAgent, address)).values()) {
    const place = { runId: run.id, buildingId: row.id };
    const { conclusion } = await decisionsOn(firstAgent, address, place);
    expect(conclusion).toMatchObject({ stage: row.stage, category: row.category });
    expect(conclusion.heldBy.join(', ')).toBe(row.heldBy ?? '');
  }
});
