import { describe, expect, test } from 'vitest';
import { preparedBuilding, wallLetter } from '../../../shared/assessment/prepared-building.ts';
import { certain } from '../../../shared/numerics/range.ts';
import { aDrive, aModel } from '../../support/builders.ts';
import { aRing, noFacts, someFacts } from '../../support/register-facts.ts';

const SLOPING = aModel([
  aDrive({
    groundLevels: [
      { chainage: 0, level: 2 },
      { chainage: 1000, level: 6 },
    ],
  }),
]);

function prepared(facts = someFacts(), model = aModel()) {
  return preparedBuilding(facts, model, 7);
}

describe('a building of which all is known', () => {
  test('keeps its levels, and its walls its height and stiffness', () => {
    const building = prepared();
    expect(building).toMatchObject({
      ...{ id: '1', groundLevel: 0, foundingLevel: -1.5, assumed: [] },
      attributes: { storeys: 3, eavesHeight: 9, foundingDepth: 1.5, height: 10.5 },
    });
    expect(building.walls).toHaveLength(4);
    for (const wall of building.walls) {
      expect(wall).toMatchObject({
        ...{ groundLevel: 0, groundLevelAssumed: false, foundingLevel: -1.5, height: 10.5 },
        ...{ eOverG: certain(2.6), poisson: 0.3 },
      });
    }
  });

  test('has the stiffness that is given rather than that of its construction', () => {
    const { walls, assumed } = prepared(
      someFacts({ construction: 'framed', eOverG: 0.5, poisson: 0.2 }),
    );
    expect(walls[0]).toMatchObject({ eOverG: certain(0.5), poisson: 0.2 });
    expect(prepared(someFacts({ construction: 'Steel-framed' })).walls[0]).toMatchObject({
      eOverG: certain(12.5),
    });
    expect(assumed).toEqual([]);
  });

  test('has its walls lettered part by part', () => {
    const parts = [[aRing(0, 0, 20, 20), aRing(5, 5, 4, 4)], [aRing(40, 0, 10, 10)]];
    const { walls, rings } = prepared(someFacts({ parts }));
    expect(walls.map(({ name }) => name).join('')).toBe('abcdefghijkl');
    expect(walls[8]?.segment.start[0]).toBeGreaterThanOrEqual(40);
    expect(rings).toHaveLength(3);
  });
});

test('letters go on after z', () => {
  expect([0, 25, 26, 51, 52, 701, 702].map(wallLetter)).toEqual([
    ...['a', 'z', 'aa', 'az', 'ba', 'zz', 'aaa'],
  ]);
});

describe('what is not known', () => {
  test('is assumed and named', () => {
    const building = prepared(noFacts());
    expect(building).toMatchObject({
      ...{ groundLevel: 7, foundingLevel: 6, holds: {} },
      attributes: { storeys: 2, eavesHeight: 6, height: 7, eOverG: 2.6, poisson: 0.3 },
      assumed: [...['storeys', 'eavesHeight', 'foundingDepth', 'eOverG', 'poisson', 'groundLevel']],
    });
    expect(building.walls[0]?.groundLevelAssumed).toBe(true);
  });

  test('ground is taken from beside the drive, abreast of the middle of the building', () => {
    const parts = [[aRing(245, 2, 10, 8)]];
    const building = prepared(noFacts({ parts }), SLOPING);
    expect(building.groundLevel).toBeCloseTo(5, 12);
    expect(building.foundingLevel).toBeCloseTo(4, 12);
    expect(building.assumed).toContain('groundLevel');
  });

  test('a founding level is kept where only the ground is assumed', () => {
    const building = prepared(someFacts({ groundLevel: null, foundingLevel: 5.5 }));
    expect(building).toMatchObject({
      groundLevel: 7,
      foundingLevel: 5.5,
      assumed: ['groundLevel'],
    });
    expect(building.attributes.foundingDepth).toBe(1.5);
  });

  test('a founding level at the ground says nothing; one above it stays to be refused', () => {
    expect(prepared(someFacts({ foundingLevel: 0 }))).toMatchObject({
      ...{ foundingLevel: -1, assumed: ['foundingDepth'] },
    });
    expect(prepared(someFacts({ foundingLevel: 2 })).foundingLevel).toBe(2);
  });
});

describe('what holds a building', () => {
  test('is read from the words of the register', () => {
    const held = someFacts({
      ...{ foundation: 'Timber piles', listedGrade: 'Grade II', condition: 'very poor' },
    });
    expect(prepared(held).holds).toEqual({
      ...{ foundingDepth: 1.5, piled: true, listed: true, poorCondition: true },
    });
    expect(prepared().holds).toEqual({
      ...{ foundingDepth: 1.5, piled: false, listed: false, poorCondition: false },
    });
  });

  test.each([
    ['unknown', {}],
    ['n/a', {}],
    ['-', {}],
    [' ', {}],
    ['Not listed', { listed: false }],
    ['none', { listed: false }],
    ['II*', { listed: true }],
  ])('listed as %j', (listedGrade, wanted) => {
    const { holds } = prepared(noFacts({ listedGrade, foundingLevel: null }));
    expect(holds).toEqual(wanted);
  });

  test.each([
    ['piled', true],
    ['bored piles', true],
    ['not piled', false],
    ['no piles', false],
    ['raft', false],
  ])('founded on %s', (foundation, piled) => {
    expect(prepared(noFacts({ foundation })).holds).toEqual({ piled });
  });

  test('is not an assumed depth', () => {
    expect(prepared(noFacts()).holds.foundingDepth).toBeUndefined();
  });
});
