// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { findPage } from '../../../../src/features/imports/find-page.ts';

function reportOf(rows: readonly number[]) {
  const asked: number[] = [];
  return {
    asked,
    fetchPage: (offset: number) => {
      asked.push(offset);
      const page = rows.slice(offset, offset + 10).map((row) => ({ row }));
      return Promise.resolve({ found: rows.length, rows: page });
    },
  };
}

const WITHOUT_GAPS = Array.from({ length: 1000 }, (_, index) => index + 2);

describe('findPage', () => {
  it('guesses right where rows have no gaps', async () => {
    const { asked, fetchPage } = reportOf(WITHOUT_GAPS);
    expect(await findPage(733, 10, fetchPage)).toBe(730);
    expect(asked).toEqual([0, 730]);
  });

  it('goes on where there are gaps', async () => {
    const rows = WITHOUT_GAPS.filter((row) => row % 7 !== 0);
    const { asked, fetchPage } = reportOf(rows);
    const offset = (await findPage(902, 10, fetchPage)) ?? -1;
    expect(rows.slice(offset, offset + 10)).toContain(902);
    expect(asked.length).toBeLessThan(8);
  });

  it('finds the first and the last', async () => {
    expect(await findPage(2, 10, reportOf(WITHOUT_GAPS).fetchPage)).toBe(0);
    expect(await findPage(1001, 10, reportOf(WITHOUT_GAPS).fetchPage)).toBe(990);
  });

  it('gives up on rows that are not there', async () => {
    const rows = WITHOUT_GAPS.filter((row) => row % 7 !== 0);
    expect(await findPage(700, 10, reportOf(rows).fetchPage)).toBeNull();
    expect(await findPage(4000, 10, reportOf(rows).fetchPage)).toBeNull();
    expect(await findPage(1, 10, reportOf([]).fetchPage)).toBeNull();
  });
});
