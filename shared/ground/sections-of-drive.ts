import { MethodError } from '../method-error.ts';
import type { Drive, DriveInputs } from './drive.ts';

/**
 * A length of drive with one set of inputs.
 *
 * Units: from and to in m of chainage. Valid: from < to. Source: [own].
 */
export type Section = DriveInputs & { readonly from: number; readonly to: number };

/**
 * A drive cut where its inputs change: its intervals, and its own inputs between them.
 *
 * Units: length m. Valid: throws `bad-intervals`, with the field at fault, where intervals overlap or
 * run backwards; parts beyond the drive's ends are dropped. Source: [own].
 */
export function sectionsOfDrive(drive: Drive, length: number): Section[] {
  const { diameter, volumeLoss, troughWidth } = drive;
  const own: DriveInputs = { diameter, volumeLoss, troughWidth };
  const inOrder = drive.intervals
    .map((interval, index) => ({ interval, field: `intervals[${index}]` }))
    .sort((a, b) => a.interval.from - b.interval.from);
  const sections: Section[] = [];
  let reached = 0;
  let earlierEnd = -Infinity;
  for (const { interval, field } of inOrder) {
    const { from, to, ...inputs } = interval;
    if (!(from < to)) {
      throw new MethodError('bad-intervals', `It runs from ${from} to ${to} m.`, field);
    }
    if (from < earlierEnd) {
      throw new MethodError(
        'bad-intervals',
        `It overlaps another that ends at ${earlierEnd} m.`,
        field,
      );
    }
    earlierEnd = to;
    const [start, end] = [Math.max(0, from), Math.min(length, to)];
    if (start >= end) continue;
    if (start > reached) sections.push({ ...own, from: reached, to: start });
    sections.push({ ...own, ...inputs, from: start, to: end });
    reached = end;
  }
  if (reached < length) sections.push({ ...own, from: reached, to: length });
  return sections;
}
