import { figure, percent } from '../presentation/design-words.ts';
import { formatCount } from '../presentation/format-number.ts';
import { percentFromRatio } from '../units/percent-from-ratio.ts';
import { stacked, type ColumnPart, type ColumnPen } from './column-part.ts';
import type { ListedLine } from './label-list.ts';
import type { PlanBuilding } from './plan-material.ts';
import { tableParts } from './rows-part.ts';

/** How many of the most strained buildings a sheet names. */
const MOST = 8;

/**
 * The buildings that come to a category or more at the central values, the most strained first.
 *
 * Units: none. Valid: none where no building does. Source: [own].
 */
export function mostStrained(
  pen: ColumnPen,
  buildings: readonly PlanBuilding[],
  line: number,
): ColumnPart[] {
  const strained = buildings.filter(({ result }) => (result.category ?? -1) >= line);
  if (strained.length === 0) return [];
  strained.sort((a, b) => (b.result.strain ?? 0) - (a.result.strain ?? 0));
  const rows = strained
    .slice(0, MOST)
    .map(({ reference, address, result }) => [
      reference,
      address ?? '',
      result.strain === null ? '' : figure(percentFromRatio(result.strain), 3),
      result.breakpointVolumeLoss === null ? '' : percent(result.breakpointVolumeLoss),
    ]);
  const more = strained.length > MOST ? `, the first ${MOST} of ${strained.length}` : '';
  const columns = [
    { heading: 'Reference', share: 0.2 },
    { heading: 'Address', share: 0.38 },
    { heading: 'Strain, %', share: 0.18, isFigure: true },
    { heading: 'Breaks at V_L, %', share: 0.24, isFigure: true },
  ];
  return [
    stacked(
      tableParts(pen, `Category ${line} or more at the central values${more}`, columns, rows),
    ),
  ];
}

/**
 * The list of labels without room, with their grid references.
 *
 * Units: m. Valid: no parts where nothing is listed. Source: [own].
 */
export function listParts(pen: ColumnPen, lines: readonly ListedLine[]): ColumnPart[] {
  const columns = [
    { heading: 'No.', share: 0.09 },
    { heading: 'Label', share: 0.51 },
    { heading: 'Easting', share: 0.19, isFigure: true },
    { heading: 'Northing', share: 0.21, isFigure: true },
  ];
  const rows = lines.map(({ number, words, place: [e, n] }) => [
    ...[String(number), words],
    ...[e, n].map((value) => formatCount(Math.round(value))),
  ]);
  return lines.length === 0
    ? []
    : tableParts(pen, `Labels without room on the plan: ${lines.length}`, columns, rows);
}
