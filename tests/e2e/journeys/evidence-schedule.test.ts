import { expect } from 'vitest';
import { z } from 'zod';
import { CATEGORIES } from '../../../shared/damage/categories.ts';
import type { RegisterRow } from '../../../shared/schemas/register.ts';
import type { RunResult } from '../../../shared/schemas/runs.ts';
import { aSchedule } from '../../support/evidence.ts';
import { scheduleLines, type ScheduleLine } from '../../support/schedule-lines.ts';
import { bookOf, tableOf, type Cells } from '../../support/workbook.ts';
import { journey } from '../drivers/journey.ts';
import { runOf } from '../drivers/runs.ts';
import { exportOf, printOf, registerOf } from '../drivers/schedules.ts';
import { addressOf } from '../drivers/schemes.ts';
import { buildingOfRun, mapOfRun, unlikeBuildings } from '../drivers/sheets.ts';
import { signInAs } from '../drivers/sign-in.ts';

const OPTION = 'A, Market Place';
const figure = z.number().nullable();

/** What the record has of a building, as programs are given it. */
const recordSchema = z.looseObject({
  ...{ reference: z.string(), stage: z.number(), offset: figure, settlement: figure },
  ...{ slope: figure, strain: figure, breakpointVolumeLoss: figure, decision: z.string() },
  ...{ categoryLow: figure, category: figure, categoryHigh: figure },
});
type Record = z.infer<typeof recordSchema>;
const fileSchema = z.looseObject({
  features: z.array(z.looseObject({ properties: recordSchema })),
});

function rounded(value: number | null, digits: number): string | null {
  return value === null ? null : value.toFixed(digits);
}

/** What falls less than a millimetre in a kilometre counts as level. */
function fallOf(slope: number): string {
  return slope < 1e-6 ? 'none' : `1 in ${Math.round(1 / slope)}`;
}

function times(value: number | null, scale: number): number | null {
  return value === null ? null : value * scale;
}

function rowWords(category: number | null): string | null {
  const row = CATEGORIES.find((one) => one.category === category);
  return row === undefined ? null : `${row.label} ${row.name}`;
}

/** What a printed row has to say, out of the record. */
function printedOf(record: Record): ScheduleLine {
  const { reference, slope, decision, stage } = record;
  return {
    ...{ reference, decision, stage: String(stage) },
    offset: rounded(record.offset, 1),
    settlement: rounded(times(record.settlement, 1000), 1),
    slope: slope === null ? null : fallOf(Math.abs(slope)),
    strain: rounded(times(record.strain, 100), 4),
    categories: [record.categoryLow, record.category, record.categoryHigh].map(
      (one) => CATEGORIES.find(({ category }) => category === one)?.label ?? null,
    ),
    breakpoint: rounded(times(record.breakpointVolumeLoss, 100), 2),
  };
}

/** What the workbook has to say, out of the record. */
function cellsOf(record: Record): Cells {
  return {
    ...{ Reference: record.reference, Stage: record.stage, Decision: record.decision },
    'Offset (m)': record.offset,
    'Settlement (mm)': times(record.settlement, 1000),
    'Slope (mm/m)': times(record.slope, 1000),
    'Strain central (%)': times(record.strain, 100),
    'Volume loss at breakpoint (%)': times(record.breakpointVolumeLoss, 100),
    'Category low': rowWords(record.categoryLow),
    'Category central': rowWords(record.category),
    'Category high': rowWords(record.categoryHigh),
  };
}

/** What the register has to show, out of the record. */
function registeredOf(record: Record): Partial<RegisterRow> {
  const { stage, offset, categoryLow, category, categoryHigh } = record;
  return {
    ...{ stage, offset, categoryLow, category, categoryHigh },
    settlement: times(record.settlement, 1000),
    slope: times(record.slope, 1000),
    strain: times(record.strain, 100),
  };
}

function recordOf(result: RunResult): Partial<Record> {
  const { stage, offset, strain, categoryLow, category, categoryHigh } = result;
  const { breakpointVolumeLoss, fault } = result;
  const figures = fault === null ? result : { settlement: null, slope: null };
  return {
    ...{ stage, offset, strain, categoryLow, category, categoryHigh, breakpointVolumeLoss },
    ...{ settlement: figures.settlement, slope: figures.slope },
  };
}

journey(
  'a schedule of the whole town says what register, sheets and workbook say',
  async ({ visit }) => {
    const visitor = await visit();
    await signInAs(visitor, 'assessor');
    const scheme = await addressOf(visitor);
    const { id } = await runOf(visitor, scheme, OPTION);
    const run = `${scheme}/runs/${id}`;
    const [pdf, drawn, book, register] = await Promise.all([
      printOf(visitor, { scheme, run }, aSchedule()),
      exportOf(visitor, run, 'geojson'),
      exportOf(visitor, run, 'xlsx').then(bookOf),
      registerOf(visitor, scheme),
    ]);
    const { features } = fileSchema.parse(JSON.parse(drawn.toString('utf8')));
    const records = features.map(({ properties }) => properties);
    expect(records.length).toBeGreaterThan(1000);

    const lines = scheduleLines(pdf);
    expect(lines.map(({ reference }) => reference)).toEqual(
      records.map(({ reference }) => reference),
    );
    expect(lines).toEqual(records.map(printedOf));
    expect(tableOf(book, 'Buildings')).toMatchObject(records.map(cellsOf));
    const rows = records.map(({ reference }) => register.get(reference));
    expect(rows).toMatchObject(records.map(registeredOf));

    const byReference = new Map(records.map((record) => [record.reference, record]));
    for (const one of unlikeBuildings(await mapOfRun(visitor, run), 20)) {
      const { facts, result } = await buildingOfRun(visitor, run, one);
      expect(byReference.get(facts.reference)).toMatchObject(recordOf(result));
    }
  },
);
