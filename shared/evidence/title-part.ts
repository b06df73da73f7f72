import {
  lineHeight,
  printSize,
  stacked,
  wordsPart,
  type ColumnPart,
  type ColumnPen,
} from './column-part.ts';
import { lineMark, type Mark } from './marks.ts';
import { fitted } from './wrapped.ts';

/**
 * The fields of a title block: whose drawing it is, its number, revision and sheet, titles, who prepared,
 * checked and approved it, when it was issued, its kind and scale, and which of the lists behind a sheet it
 * is. What is not known yet is empty, and stays to be filled in.
 *
 * Units: none. Valid: plain words. Source: iso-title-blocks-2004, from memory.
 */
export type TitleBlock = {
  readonly owner: string;
  readonly title: string;
  readonly subtitle: string;
  readonly number: string;
  readonly revision: string;
  readonly sheet: string;
  readonly scale: string;
  readonly paper: string;
  readonly kind: string;
  readonly prepared: string;
  readonly checked: string;
  readonly approved: string;
  readonly issued: string;
  readonly run: string;
  readonly list: string;
};

const RULE = { ink: 'rule', width: 0.18 } as const;
const HEAVY = { ink: 'ink', width: 0.25 } as const;

/** How much of a lying title block is titles, and round them in mm. */
const [TITLES, STRIP_PAD, STRIP_GAP] = [0.42, 3, 1];

/** One row of cells, each with what it holds over the words. */
function cellRow(
  { width, scale, measure }: ColumnPen,
  cells: readonly (readonly [name: string, words: string])[],
  pad: number,
): ColumnPart {
  const wide = (width + 2 * pad) / cells.length;
  const height = 8.6 * scale;
  const look = { size: printSize(8.5, scale), isStrong: true };
  const small = printSize(6.5, scale);
  return {
    height,
    marks: ([x, y]) => {
      const left = x - pad;
      const words = cells.flatMap(([name, value], k): Mark[] => {
        const at = left + k * wide + 2;
        return [
          { kind: 'words', words: name, at: [at, y + 3 * scale], size: small, ink: 'second' },
          {
            ...{ kind: 'words', ...look, at: [at, y + 6.9 * scale] },
            words: fitted(value, wide - 3, measure, look),
          },
        ];
      });
      const sides = cells.slice(1).map((_, k) => {
        const at = left + (k + 1) * wide;
        return lineMark([[at, y], [at, y + height]], RULE); // prettier-ignore
      });
      return [lineMark([[left, y], [left + width + 2 * pad, y]], HEAVY), ...sides, ...words]; // prettier-ignore
    },
  };
}

/**
 * A title block that lies at the foot of a sheet of a list: titles at the left, fields at the right. It has no
 * scale, and its rules begin at its own sides.
 *
 * Units: mm. Valid: any fields. Source: as TitleBlock.
 */
export function titleStrip(pen: ColumnPen, block: TitleBlock): ColumnPart {
  const left = TITLES * pen.width;
  const right = { ...pen, width: pen.width - left };
  const line = (words: string, size: number, isStrong: boolean) => {
    const narrow = { ...pen, width: left - 2 * STRIP_PAD };
    const look = { size: printSize(size, pen.scale), isStrong };
    return wordsPart(narrow, fitted(words, narrow.width, pen.measure, look), { size, isStrong });
  };
  const names = stacked([
    line(block.owner, 8.5, true),
    line(block.title, 11, true),
    line(block.subtitle, 7.5, false),
  ]);
  const rows = [
    [['Drawing', block.number], ['Revision', block.revision], [`Sheet, ${block.paper}`, block.sheet], ['Kind', block.kind], ['Run', block.run]],
    [['Prepared', block.prepared], ['Checked', block.checked], ['Approved', block.approved], ['Issued', block.issued], ['Language', 'en']],
  ] as const; // prettier-ignore
  const fields = stacked(rows.map((row) => cellRow(right, row, 0)));
  const height = Math.max(names.height + 2 * STRIP_GAP, fields.height);
  return {
    height,
    marks: ([x, y]) => [
      lineMark([[x, y], [x + pen.width, y]], HEAVY), // prettier-ignore
      lineMark([[x + left, y], [x + left, y + height]], RULE), // prettier-ignore
      ...names.marks([x + STRIP_PAD, y + STRIP_GAP]),
      ...fields.marks([x + left, y]),
    ],
  };
}

/**
 * The title block at the foot of a sheet's column. Its rules reach to the sides of the column, `pad` beyond
 * the words.
 *
 * Units: mm. Valid: any fields. Source: as TitleBlock.
 */
export function titlePart(pen: ColumnPen, block: TitleBlock, pad: number): ColumnPart {
  const rows = [
    [['Drawing', block.number], ['Revision', block.revision], [`Scale, ${block.paper}`, block.scale], ['Sheet', block.sheet]],
    [['Prepared', block.prepared], ['Checked', block.checked], ['Approved', block.approved], ['Issued', block.issued]],
    [['Kind', block.kind], ['Run', block.run], ['Language', 'en'], [block.list === '' ? '' : 'List', block.list]],
  ] as const; // prettier-ignore
  const names = stacked(
    [
      wordsPart(pen, block.owner, { size: 10.5, isStrong: true }),
      wordsPart(pen, block.title, { size: 15, isStrong: true }),
      wordsPart(pen, block.subtitle, { size: 9, ink: 'second' }),
    ],
    1.2,
  );
  return stacked([
    names,
    { height: lineHeight(4), marks: () => [] },
    ...rows.map((row) => cellRow(pen, row, pad)),
  ]);
}
