import { CATEGORIES } from '../damage/categories.ts';
import { capital } from '../presentation/capital.ts';
import { formatCount } from '../presentation/format-number.ts';
import { SETTLEMENT_TINTS } from '../presentation/ground-tints.ts';
import { bandWords } from '../presentation/settlement-bands.ts';
import type { PlanContent } from '../schemas/evidence.ts';
import {
  lineHeight,
  printSize,
  stacked,
  wordsPart,
  type ColumnPart,
  type ColumnPen,
} from './column-part.ts';
import { boxMark, lineMark, type Mark, type Spot, type Stroke, type Tone } from './marks.ts';
import { DRIVE_AXIS, DRIVE_EDGE } from './line-marks.ts';
import { contourStroke } from './plan-marks.ts';

const [SWATCH, TALL, ROW] = [14, 5.6, 7];

/**
 * What a tone means: its number and its words.
 *
 * Units: none. Valid: no number where its words say it. Source: [own].
 */
export type ToneRow = { readonly tone: Tone; readonly label: string; readonly words: string };

const STAGE_ROWS: readonly ToneRow[] = [
  { tone: { by: 'stage', number: 2 }, label: '2', words: 'Let go at stage 2, by its strains' },
  { tone: { by: 'stage', number: 3 }, label: '3', words: 'At stage 3, looked at one by one' },
];

/** The tones that plans of a kind have, with what each means. */
function rowsOf(shows: PlanContent['shows']): readonly ToneRow[] {
  if (shows === 'stage') return STAGE_ROWS;
  if (shows === 'settlement') {
    return SETTLEMENT_TINTS.map(([number]) => ({
      ...{ tone: { by: 'settlement', number }, label: '', words: bandWords(number) },
    }));
  }
  return CATEGORIES.map(({ category, label, name }) => ({
    ...{ tone: { by: 'category', number: category }, label, words: capital(name) },
  }));
}

function ringOf([x, y]: Spot, wide: number, tall: number): Spot[] {
  return [[x, y], [x + wide, y], [x + wide, y + tall], [x, y + tall]]; // prettier-ignore
}

/**
 * A tone with its swatch, its number, what it means, and a count at the right.
 *
 * Units: mm. Valid: any tone. Source: [own].
 */
export function toneParts(
  { width, scale }: ColumnPen,
  { tone, label, words }: ToneRow,
  count: string,
): ColumnPart {
  const [wide, tall] = [SWATCH * scale, TALL * scale];
  const size = printSize(8, scale);
  const text = (value: string, x: number, y: number, more: object): Mark => ({
    ...{ kind: 'words', words: value, at: [x, y], size },
    ...more,
  });
  const indent = label === '' ? wide + 3 : wide + 14 * scale;
  return {
    height: ROW * scale,
    marks: ([x, y]) => {
      const base = y + 0.4 + tall / 2 + 1.1;
      return [
        { kind: 'toned', tone, rings: [ringOf([x, y + 0.4], wide, tall)] },
        text(label, x + wide + 3, base, { size: printSize(9.5, scale), isStrong: true }),
        text(words, x + indent, base, {}),
        text(count, x + width, base, { anchor: 'end', isStrong: true }),
      ];
    },
  };
}

type Sign = { readonly words: string; readonly marks: (at: Spot) => Mark[] };

function lineSign(words: string, stroke: Stroke, wide: number): Sign {
  return { words, marks: ([x, y]) => [lineMark([[x, y], [x + wide, y]], stroke)] }; // prettier-ignore
}

function contourSigns(wide: number): Sign[] {
  return [
    lineSign('Settlement at the central values, mm', contourStroke(0.02), wide),
    lineSign('10 mm of it', contourStroke(0.01), wide),
    lineSign('1 mm of it', contourStroke(0.001), wide),
  ];
}

function driveSign(wide: number): Sign {
  return {
    words: 'Drive: axis and edges',
    marks: ([x, y]) => [
      lineMark([[x, y], [x + wide, y]], DRIVE_AXIS), // prettier-ignore
      lineMark([[x, y - 1.1], [x + wide, y - 1.1]], DRIVE_EDGE), // prettier-ignore
      lineMark([[x, y + 1.1], [x + wide, y + 1.1]], DRIVE_EDGE), // prettier-ignore
    ],
  };
}

/** What a building without a colour is. */
const PLAIN: Readonly<Record<PlanContent['shows'], string>> = {
  low: 'Let go at stage 1, or not worked out',
  central: 'Let go at stage 1, or not worked out',
  high: 'Let go at stage 1, or not worked out',
  settlement: 'Less than 1 mm',
  stage: 'Let go at stage 1',
};

function plainSign(shows: PlanContent['shows'], wide: number): Sign {
  const stroke = { ink: 'buildingEdge', width: 0.2 } as const;
  return {
    words: PLAIN[shows],
    marks: ([x, y]) => [
      boxMark({ left: x, right: x + wide, top: y - 1.3, bottom: y + 1.3 }, { stroke }),
    ],
  };
}

function signRow(
  { scale, width, measure }: ColumnPen,
  { words, marks }: Sign,
  wide: number,
): ColumnPart {
  const written = wordsPart({ scale, width, measure }, words, { size: 8, indent: wide + 3 });
  const height = written.height + 0.8;
  return {
    height,
    marks: ([x, y]) => [
      ...marks([x, y + lineHeight(printSize(8, scale)) / 2]),
      ...written.marks([x, y]),
    ],
  };
}

const TITLES: Readonly<Record<PlanContent['shows'], string>> = {
  low: 'Damage category, low end of the range',
  central: 'Damage category, central values',
  high: 'Damage category, high end of the range',
  settlement: 'Settlement under the building',
  stage: 'Stage of assessment',
};

/**
 * The legend of a plan: every tone with how many buildings of the sheet have it, then the signs.
 *
 * Units: mm; counts of buildings by the number of the tone. Valid: any counts. Source: [own].
 */
export function legendPart(
  pen: ColumnPen,
  content: PlanContent,
  counts: ReadonlyMap<number, number>,
): ColumnPart {
  const wide = SWATCH * pen.scale;
  const signs = [
    ...(content.contours ? contourSigns(wide) : []),
    ...(content.line ? [driveSign(wide)] : []),
    plainSign(content.shows, wide),
  ];
  return stacked([
    wordsPart(pen, TITLES[content.shows], { size: 9.5, isStrong: true }),
    wordsPart(pen, 'At the right, how many buildings have their middle on this sheet.', {
      size: 7,
      ink: 'second',
    }),
    { height: 0.8, marks: () => [] },
    ...rowsOf(content.shows).map((row) =>
      toneParts(pen, row, formatCount(counts.get(row.tone.number) ?? 0)),
    ),
    { height: 1.2, marks: () => [] },
    ...signs.map((sign) => signRow(pen, sign, wide)),
  ]);
}
