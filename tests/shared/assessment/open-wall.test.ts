import { expect, test } from 'vitest';
import { assessCaseWall } from '../../../shared/assessment/assess-case-wall.ts';
import { modelOfCase, wallOfCase } from '../../../shared/assessment/model-of-case.ts';
import { openWall } from '../../../shared/assessment/open-wall.ts';
import { assessCaseSchema } from '../../../shared/schemas/assess-case.ts';

const WALL = {
  name: 'wall',
  from: [0, 2],
  to: [0, 28],
  foundingLevel: -1,
  height: 12,
  eOverG: 2.6,
  poisson: 0.3,
};
const CASE = assessCaseSchema.parse({
  groundLevel: 0,
  drives: [
    {
      name: 'straight',
      axis: [
        [-1000, 0, -20],
        [1000, 0, -20],
      ],
      diameter: 6,
      volumeLoss: [0.01, 0.015, 0.02],
      troughWidth: [0.35, 0.5, 0.6],
    },
  ],
  walls: [WALL],
});

test('a wall opened up says what the same wall of a case says', () => {
  const prepared = modelOfCase(CASE);
  const [wall] = CASE.walls;
  if (wall === undefined) throw new Error('The case has no wall.');
  const said = assessCaseWall(prepared, wall);
  const { model, rules, faces } = prepared;
  const opened = openWall(model, wallOfCase(wall, 0), rules, faces);
  expect(opened.result.strain).toBe(said.strain);
  expect(opened.result.category).toBe(said.category);
  expect(opened.result.warnings).toEqual(said.warnings);
  expect(opened.result.warnings).toContain('depth rule for clay with K below 0.4');
  expect(opened.bracket.strains[0]).toEqual(said.bracket?.strains);
  expect(opened.sensitivity.settled).toBe(said.settled);
  expect(opened.sensitivity.input).toBe(said.governing?.input);
  expect(opened.breakpoint?.factor).toBe(said.breakpoint?.reached && said.breakpoint.factor);
  expect(opened.points).toHaveLength(15);
  const strain = opened.working
    .flatMap(({ lines }) => lines)
    .filter(({ symbol }) => symbol === 'ε');
  expect(strain.map(({ value }) => value)).toContain(said.strain);
});
