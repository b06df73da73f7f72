import { expect, test } from 'vitest';
import type { Check } from '../../shared/checks/check.ts';

/** One test per figure of a check, named after its source. */
export function verifyCheck(check: Check): void {
  for (const row of check.run()) {
    test(`${check.source}: ${row.what} is ${row.expected} ${row.unit}`, () => {
      expect(Math.abs(row.computed - row.expected)).toBeLessThanOrEqual(row.tolerance);
      expect(row.agrees).toBe(true);
    });
  }
}
