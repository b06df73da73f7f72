import { CAUTIONS } from '../cautions.ts';
import { formatCount } from '../presentation/format-number.ts';
import { CATEGORIES } from '../damage/categories.ts';
import { capital } from '../presentation/capital.ts';
import { stacked, wordsPart, type ColumnPart, type ColumnPen } from './column-part.ts';
import { crossSectionMarks } from './cross-section-marks.ts';
import type { DrawnSections } from './drawn-sections.ts';
import { keyPart } from './key-plan.ts';
import { toneParts } from './legend-part.ts';
import { listInColumn } from './list-in-column.ts';
import { lineOnGround } from './line-on-ground.ts';
import { longSectionMarks } from './long-section-marks.ts';
import type { Measure } from './marks.ts';
import type { PlanMaterial } from './plan-material.ts';
import { frameMarks } from './plan-signs.ts';
import { ASIDE, type PlannedSection } from './planned-sections.ts';
import type { PlannedSheet } from './planned-sheets.ts';
import { noteParts, tableParts } from './rows-part.ts';
import { columnMarks, columnPen, revisionPart } from './sheet-column.ts';
import { sheetsBehind } from './sheets-behind.ts';
import { runNotes } from './sheet-notes.ts';
import type { AboutSheets, Sheet } from './sheet.ts';
import { titleOfSheet } from './title-of-sheet.ts';

type Drawn = {
  readonly planned: PlannedSheet;
  readonly section: PlannedSection;
  readonly all: readonly PlannedSheet[];
  readonly material: PlanMaterial;
  readonly about: AboutSheets;
  readonly measure: Measure;
};

function scaleWords({
  denominator,
  exaggeration,
  settlementExaggeration,
}: PlannedSection): string[] {
  const one = (times: number) => `1 : ${formatCount(Number((denominator / times).toPrecision(4)))}`;
  const up =
    exaggeration === 1
      ? 'Levels as lengths'
      : `Levels ${exaggeration} times as large, ${one(exaggeration)}`;
  return [
    `Lengths ${one(1)}. ${up}. Settlement ${formatCount(settlementExaggeration)} times as large as lengths, ${one(settlementExaggeration)}.`,
    'Buildings stand at true width and are drawn at one height; their colour is the category at the central values.',
    'The band is settlement of the surface over the whole range, its dotted edge low and its dashed edge high; the line is at the central values.',
  ];
}

function sectionNotes(section: PlannedSection, about: AboutSheets): string[] {
  return [...scaleWords(section), ...runNotes(about), CAUTIONS.join(' ')];
}

function drawingOf({ planned, section, material, about, measure }: Drawn): DrawnSections {
  const { window } = planned.layout;
  const at = { left: window.left + ASIDE, top: window.top };
  const room = { line: lineOnGround(about.run.design.line), material, about, measure };
  return section.kind === 'cross sections'
    ? crossSectionMarks(at, section, room)
    : longSectionMarks(at, section, room);
}

function listParts(pen: ColumnPen, unnamed: DrawnSections['unnamed']): ColumnPart[] {
  if (unnamed.length === 0) return [];
  const columns = [
    { heading: 'No.', share: 0.09 },
    { heading: 'Reference', share: 0.4 },
    { heading: 'Where', share: 0.51 },
  ];
  const rows = unnamed.map(({ reference, where }, k) => [String(k + 1), reference, where]);
  return tableParts(pen, `Buildings without room for a name: ${unnamed.length}`, columns, rows);
}

const BEHIND = 'Buildings without room for a name are listed on the sheet behind this one.';

function legend(pen: ColumnPen): ColumnPart {
  return stacked([
    wordsPart(pen, 'Damage category, central values', { size: 9.5, isStrong: true }),
    { height: 0.8, marks: () => [] },
    ...CATEGORIES.map(({ category, label, name }) =>
      toneParts(
        pen,
        { tone: { by: 'category', number: category }, label, words: capital(name) },
        '',
      ),
    ),
  ]);
}

/**
 * A sheet of sections, with sheets behind it for notes that found no room in the column.
 *
 * Units: mm. Valid: as `drawnSheets`. Source: [own].
 */
export function sectionSheets(drawn: Drawn): Sheet[] {
  const { planned, section, all, about, measure } = drawn;
  const { layout, number } = planned;
  const pen = columnPen(layout, measure);
  const key = { line: about.run.design.line, all, number, ground: about.keyGround };
  const { marks, unnamed } = drawingOf(drawn);
  const list = listInColumn(pen, layout, listParts(pen, unnamed), BEHIND);
  const column = columnMarks(layout, pen, {
    always: [legend(pen)],
    asRoom: [
      stacked(noteParts(pen, sectionNotes(section, about))),
      ...revisionPart(pen, about.fields),
      ...list.inColumn,
      keyPart(pen, key),
    ],
    title: titleOfSheet(planned, about, ''),
  });
  const sheet = {
    name: `${about.fields.title || 'Sections'}, sheet ${number}`,
    ...{ width: layout.width, height: layout.height },
    marks: [
      { kind: 'within' as const, window: layout.window, marks },
      ...frameMarks(layout.frame, layout.window, layout.column),
      ...column.marks,
    ],
  };
  return [sheet, ...sheetsBehind(sheet, { planned, about, pen }, list.behind(column.left))];
}
