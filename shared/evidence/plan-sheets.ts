import { outlineOf } from './building-outlines.ts';
import { buildingsOn } from './buildings-on.ts';
import { stacked } from './column-part.ts';
import { keyPart } from './key-plan.ts';
import { labelList, numberMarks, type ListedLine } from './label-list.ts';
import { legendPart } from './legend-part.ts';
import { listInColumn } from './list-in-column.ts';
import { lineOnGround } from './line-on-ground.ts';
import type { Mark, Measure } from './marks.ts';
import { matchesOnPaper, matchMarks } from './match-marks.ts';
import { planLabels } from './plan-labels.ts';
import { groundMarks, signMarks } from './plan-marks.ts';
import type { PlanBuilding, PlanMaterial } from './plan-material.ts';
import { frameMarks } from './plan-signs.ts';
import { listParts, mostStrained } from './plan-tables.ts';
import type { PlannedPlan, PlannedSheet } from './planned-sheets.ts';
import { noteParts } from './rows-part.ts';
import { columnMarks, columnPen, revisionPart } from './sheet-column.ts';
import { sheetsBehind } from './sheets-behind.ts';
import type { AboutSheets, Sheet } from './sheet.ts';
import { planNotes } from './sheet-notes.ts';
import { streetNameMarks } from './street-names.ts';
import { titleOfSheet } from './title-of-sheet.ts';
import { toneOfBuilding } from './tone-of-building.ts';

/** What a figure in a building of a plan means. */
function figureWords({ shows }: PlannedPlan['content']): (figure: string) => string {
  if (shows === 'settlement') return (words) => `${words} mm`;
  return (words) => `${shows === 'stage' ? 'stage' : 'category'} ${words}`;
}

function countsOf(
  { content }: PlannedPlan,
  buildings: readonly PlanBuilding[],
): Map<number, number> {
  const counts = new Map<number, number>();
  for (const building of buildings) {
    const tone = toneOfBuilding(building, content.shows);
    if (tone !== null) counts.set(tone.number, (counts.get(tone.number) ?? 0) + 1);
  }
  return counts;
}

type Drawn = {
  readonly planned: PlannedSheet;
  readonly plan: PlannedPlan;
  readonly all: readonly PlannedSheet[];
  readonly material: PlanMaterial;
  readonly about: AboutSheets;
  readonly measure: Measure;
};

function mapMarks({ planned, plan, material, about, measure }: Drawn): {
  marks: Mark[];
  lines: ListedLine[];
} {
  const { design } = about.run;
  const { frame, content } = plan;
  const line = lineOnGround(design.line);
  const matches = matchesOnPaper(frame, { line, matches: plan.matches, measure });
  const kept = matches.map(({ box }) => box);
  const labels = planLabels(frame, material, { content, design, measure, kept });
  const lines = labelList(frame, labels.listed, figureWords(content));
  const numbers = numberMarks(frame, labels, lines, measure);
  const streets = content.background
    ? streetNameMarks(frame, material.background, {
        taken: numbers.taken,
        outlines: material.buildings.map((building) => outlineOf(frame, building)),
        measure,
      })
    : [];
  const marks = [
    ...groundMarks(plan, material, { design, labels, streets }),
    ...numbers.marks,
    ...matchMarks(matches),
  ];
  return {
    lines,
    marks: [
      { kind: 'within', window: frame.window, marks },
      ...signMarks(plan, planned.layout.paper),
    ],
  };
}

const BEHIND = 'Labels without room on the plan are listed on the sheet behind this one.';

/**
 * A plan with the sheets behind it that hold the list of labels without room, and notes that found none in
 * the column.
 *
 * Units: mm. Valid: as `drawnSheets`. Source: [own].
 */
export function planSheets(drawn: Drawn): Sheet[] {
  const { planned, plan, all, material, about, measure } = drawn;
  const { layout, number } = planned;
  const pen = columnPen(layout, measure);
  const on = buildingsOn(plan.frame, material.buildings);
  const { marks, lines } = mapMarks(drawn);
  const { design, rules } = about.run;
  const list = listInColumn(pen, layout, listParts(pen, lines), BEHIND);
  const key = { line: design.line, all, number, ground: about.keyGround };
  const column = columnMarks(layout, pen, {
    always: [legendPart(pen, plan.content, countsOf(plan, on)), keyPart(pen, key)],
    asRoom: [
      stacked(noteParts(pen, planNotes(plan.content, { buildings: on, material }, about))),
      ...revisionPart(pen, about.fields),
      ...list.inColumn,
      ...mostStrained(pen, on, rules.leadingCategory.value),
    ],
    title: titleOfSheet(planned, about, ''),
  });
  const sheet = {
    name: `${about.fields.title || 'Plan'}, sheet ${number}`,
    ...{ width: layout.width, height: layout.height },
    marks: [...marks, ...frameMarks(layout.frame, layout.window, layout.column), ...column.marks],
  };
  return [sheet, ...sheetsBehind(sheet, { planned, about, pen }, list.behind(column.left))];
}
