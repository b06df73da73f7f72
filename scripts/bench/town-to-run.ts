import type { Sequelize } from 'sequelize';
import type { AlignmentDesign } from '../../shared/schemas/alignments.ts';
import { changeRegister } from '../../server/commands/change-register.ts';
import { defaultRules } from '../../server/commands/default-rules.ts';
import { Alignment } from '../../server/models/alignment.ts';
import { Person } from '../../server/models/person.ts';
import { SchemeRules } from '../../server/models/scheme-rules.ts';
import { Scheme } from '../../server/models/scheme.ts';
import { townOfBoxes } from './town-of-boxes.ts';

const PITCH = 15;
const [EAST, NORTH] = [500_000, 6_080_000];

/** Twin bores that wind through the town of boxes from west to east, with ranges of everything. */
function designThrough(count: number): AlignmentDesign {
  const side = Math.ceil(Math.sqrt(count)) * PITCH;
  const steps = Array.from({ length: 41 }, (_, k) => k / 40);
  const range = (central: number, spread: number) => ({
    low: central - spread,
    central,
    high: central + spread,
  });
  return {
    line: steps.map((t): [number, number] => [
      EAST - 200 + t * (side + 400),
      NORTH + side / 2 + side * 0.2 * Math.sin(2 * Math.PI * t),
    ]),
    levels: [
      { chainage: 0, level: -14 },
      { chainage: side, level: -18 },
    ],
    diameter: 6.6,
    bores: { kind: 'twin', spacing: 15, later: 'right', laterFactor: 1.2 },
    direction: 'forward',
    groundLevel: 5,
    volumeLoss: range(0.015, 0.005),
    troughWidth: range(0.5, 0.1),
    intervals: [],
  };
}

/** Fills a database with a town of so many boxes, the rules of a scheme and a line through it. */
export async function townToRun(
  database: Sequelize,
  count: number,
): Promise<{ scheme: Scheme; option: Alignment }> {
  const person = await Person.create({
    name: 'Bench',
    email: `bench-${count}@example.org`,
    passwordHash: null,
  });
  const scheme = await Scheme.create({ name: `Runs of ${count}`, crs: 32631 });
  const rules = defaultRules('2026-12-01');
  const row = { schemeId: scheme.id, version: 1, rules, createdBy: person.id };
  await SchemeRules.create(row);
  const cause = { kind: 'import', by: null, source: 'The town of boxes' } as const;
  await database.transaction((transaction) =>
    changeRegister(database, scheme, cause, { created: townOfBoxes(count) }, transaction),
  );
  const design = designThrough(count);
  const option = await Alignment.create({
    ...{ schemeId: scheme.id, name: 'Through the middle', design, changedBy: null },
  });
  await database.query('analyze');
  return { scheme, option };
}
