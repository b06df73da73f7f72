import { describe, expect, test } from 'vitest';
import { assessWall } from '../../../shared/assessment/assess-wall.ts';
import { groundLevelBeside } from '../../../shared/ground/ground-level-beside.ts';
import { aDrive, aModel, aWall, someRules } from '../../support/builders.ts';

/** The default drive starts at easting −500, so chainage is easting + 500. */
const ROWS = [
  { chainage: 100, level: 2 },
  { chainage: 300, level: 6 },
];

describe('the ground level beside a drive', () => {
  const model = aModel([aDrive({ groundLevels: ROWS })]);

  test.each([
    ['between two rows', -300, 4],
    ['on a row', -200, 6],
    ['before the first', -450, 2],
    ['beyond the last', 400, 6],
    ['before the drive', -900, 2],
  ])('%s', (_, easting, level) => {
    expect(groundLevelBeside(model, [easting, 12])).toBeCloseTo(level, 12);
  });

  test('is that of the nearest drive with a table', () => {
    const other = aDrive({ axis: [[-500, 50, -20], [500, 50, -20]], groundLevels: [{ chainage: 0, level: 9 }] }); // prettier-ignore
    const two = aModel([aDrive({ groundLevels: ROWS }), other, aDrive()]);
    expect(groundLevelBeside(two, [0, 40])).toBe(9);
    expect(groundLevelBeside(two, [0, 10])).toBe(6);
  });

  test('is not known without a table', () => {
    expect(groundLevelBeside(aModel(), [0, 0])).toBeUndefined();
    expect(groundLevelBeside(aModel([aDrive({ groundLevels: [] })]), [0, 0])).toBeUndefined();
  });

  test('a wall that takes it says so', () => {
    const assumed = assessWall(model, aWall({ groundLevelAssumed: true }), someRules(), []);
    expect(assumed.warnings).toContain('ground level assumed');
    expect(assessWall(model, aWall(), someRules(), []).warnings).toEqual([]);
  });
});
