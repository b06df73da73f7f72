import { describe, expect, it } from 'vitest';
import { sheetLayout } from '../../../shared/evidence/paper-sizes.ts';

/** ISO 216, series A, with the long side lying; mm. */
const ISO_216 = [
  ['A0', 1189, 841],
  ['A1', 841, 594],
  ['A3', 420, 297],
  ['A4', 297, 210],
] as const;

describe.each(ISO_216)('the sheet of %s', (paper, width, height) => {
  const { frame, window, column, stamp, ...sheet } = sheetLayout(paper);

  it('has the size of the standard', () => {
    expect([sheet.width, sheet.height]).toEqual([width, height]);
  });

  it('has its window inside the frame, clear of the column', () => {
    expect(window.left).toBeGreaterThan(frame.left);
    expect(window.top).toBeGreaterThan(frame.top);
    expect(window.right).toBeLessThan(column.left);
    expect(window.bottom).toBeLessThan(frame.bottom);
    expect(window.right - window.left).toBeGreaterThan(column.right - column.left);
    expect([column.top, column.right, column.bottom]).toEqual([frame.top, frame.right, frame.bottom]); // prettier-ignore
  });

  it('has its frame inside the paper', () => {
    for (const margin of [frame.left, frame.top, width - frame.right, height - frame.bottom])
      expect(margin).toBeGreaterThanOrEqual(10);
  });

  it('keeps room for a stamp outside of the frame', () => {
    expect(stamp.top).toBeGreaterThanOrEqual(frame.bottom);
    expect(stamp.bottom).toBeLessThanOrEqual(height - 5);
    expect(stamp.bottom - stamp.top).toBeGreaterThanOrEqual(7);
    expect([stamp.left, stamp.right]).toEqual([frame.left, frame.right]);
  });
});
