import { CATEGORIES, type Category } from '../damage/categories.ts';
import { capital } from '../presentation/capital.ts';
import { formatCount } from '../presentation/format-number.ts';
import { lineHeight, stacked, wordsPart, type ColumnPart, type ColumnPen } from './column-part.ts';
import { boxMark, lineMark, type Mark, type Spot, type Stroke } from './marks.ts';

const [SWATCH, TALL, ROW] = [14, 6.4, 8.2];

function ringOf([x, y]: Spot, wide: number, tall: number): Spot[] {
  return [[x, y], [x + wide, y], [x + wide, y + tall], [x, y + tall]]; // prettier-ignore
}

/** A category with its swatch, its number, its name and how many buildings of the sheet it has. */
function categoryRow({ width, scale }: ColumnPen, category: Category, count: number): ColumnPart {
  const facts = CATEGORIES[category];
  const [wide, tall] = [SWATCH * scale, TALL * scale];
  const base = (ROW * scale) / 2 + 1;
  const words = (
    text: string,
    x: number,
    y: number,
    more: Partial<Mark & { kind: 'words' }>,
  ): Mark => ({
    ...{ kind: 'words', words: text, at: [x, y], size: 8 * scale },
    ...more,
  });
  return {
    height: ROW * scale,
    marks: ([x, y]) => [
      { kind: 'toned', tone: { by: 'category', number: category }, rings: [ringOf([x, y + 0.8], wide, tall)] },
      words(facts?.label ?? '', x + wide + 3, y + base, { size: 10 * scale, isStrong: true }),
      words(capital(facts?.name ?? ''), x + wide + 15 * scale, y + base, {}),
      words(formatCount(count), x + width, y + base, { anchor: 'end', isStrong: true }),
    ],
  };
}

type Sign = { readonly words: string; readonly marks: (at: Spot) => Mark[] };

function lineSign(words: string, stroke: Stroke, wide: number): Sign {
  return { words, marks: ([x, y]) => [lineMark([[x, y], [x + wide, y]], stroke)] }; // prettier-ignore
}

function signsOf(wide: number): Sign[] {
  return [
    lineSign('Central settlement, mm', { ink: 'contour', width: 0.25 }, wide),
    lineSign('10 mm', { ink: 'contour', width: 0.5 }, wide),
    {
      words: 'Drive: axis and edges',
      marks: ([x, y]) => [
        lineMark([[x, y], [x + wide, y]], { ink: 'ink', width: 0.4, dash: [3, 1, 0.6, 1] }), // prettier-ignore
        lineMark([[x, y - 1], [x + wide, y - 1]], { ink: 'ink', width: 0.2, dash: [0.3, 0.6] }), // prettier-ignore
        lineMark([[x, y + 1], [x + wide, y + 1]], { ink: 'ink', width: 0.2, dash: [0.3, 0.6] }), // prettier-ignore
      ],
    },
    {
      words: 'Let go at stage 1, or not worked out',
      marks: ([x, y]) => [
        boxMark(
          { left: x, right: x + wide, top: y - 1.3, bottom: y + 1.3 },
          { stroke: { ink: 'buildingEdge', width: 0.2 } },
        ),
      ],
    },
  ];
}

function signRow({ scale }: ColumnPen, { words, marks }: Sign, wide: number): ColumnPart {
  const height = lineHeight(8 * scale) * 1.15;
  return {
    height,
    marks: ([x, y]) => [
      ...marks([x, y + height / 2]),
      { kind: 'words', words, at: [x + wide + 3, y + height * 0.68], size: 8 * scale },
    ],
  };
}

/**
 * The legend: every category with how many buildings of the sheet it has, then the signs of the plan.
 *
 * Units: mm. Valid: counts by category, 0 to 4. Source: [own].
 */
export function legendPart(pen: ColumnPen, title: string, counts: readonly number[]): ColumnPart {
  const wide = SWATCH * pen.scale;
  return stacked([
    wordsPart(pen, title, { size: 9.5, isStrong: true }),
    wordsPart(pen, 'Buildings that reach into this sheet are counted at the right.', {
      ...{ size: 7, ink: 'second' },
    }),
    { height: 1, marks: () => [] },
    ...CATEGORIES.map(({ category }) => categoryRow(pen, category, counts[category] ?? 0)),
    { height: 1.5, marks: () => [] },
    ...signsOf(wide).map((sign) => signRow(pen, sign, wide)),
  ]);
}
