import { describe, expect, test } from 'vitest';
import { csvCell } from '../../../server/documents/csv-cell.ts';

describe('csvCell', () => {
  test.each([
    [null, ''],
    [-3.5, '-3.5'],
    ['-3,5', '"-3,5"'],
    ['Quay Street', 'Quay Street'],
    ['a "b", c', '"a ""b"", c"'],
    ['=1+1', "'=1+1"],
    [' =1+1', "' =1+1"],
    ['+44 20', "'+44 20"],
    ['@SUM(A1)', "'@SUM(A1)"],
    ['-1+1', "'-1+1"],
    ['\t=1', '"\'\t=1"'],
    ["=cmd|' /C calc'!A0", "'=cmd|' /C calc'!A0"],
  ])('writes %j', (value, cell) => {
    expect(csvCell(value)).toBe(cell);
  });
});
