import { CATEGORIES } from '../../../shared/damage/categories.ts';
import { percentWords } from '../../../shared/presentation/bracket-words.ts';
import { standingWords } from '../../../shared/presentation/decision-words.ts';
import { resultText } from '../../../shared/presentation/result-text.ts';
import { slopeWords } from '../../../shared/presentation/slope-words.ts';
import { RESULT_VALUES, type ResultFigure } from '../../../shared/schemas/result-values.ts';
import { headingWith } from '../../exports/export-file.ts';
import { recorded, type FigureName } from '../../exports/run-columns.ts';
import type { RunRow } from '../../models/find-run-rows.ts';
import type { Align } from '../pdf/words-block.ts';

/**
 * A column of a schedule; its width is a share of all. What is not wrapped is cut to one line, which no
 * figure may be.
 */
export type ScheduleColumn = {
  readonly heading: string;
  readonly share: number;
  readonly align: Align;
  readonly isWrapped: boolean;
  readonly words: (row: RunRow) => string;
};

/** What stands where nothing is known or nothing was worked out. */
const NONE = '–';

function text(
  heading: string,
  share: number,
  words: (row: RunRow) => string | null,
  isWrapped = false,
): ScheduleColumn {
  return { heading, share, align: 'left', isWrapped, words: (row) => words(row) ?? NONE };
}

function figure(
  heading: string,
  share: number,
  name: FigureName,
  words: (value: number) => string,
): ScheduleColumn {
  return {
    ...{ heading, share, align: 'right', isWrapped: true },
    words: ({ result }) => {
      const value = recorded(result, name);
      return value === null ? NONE : words(value);
    },
  };
}

/** A figure with the places and in the unit in which the register shows it. */
function asRegistered(name: ResultFigure & FigureName, share: number): ScheduleColumn {
  const facts = RESULT_VALUES[name];
  return figure(headingWith(facts), share, name, (value) => resultText(name, value * facts.scale));
}

function category(name: 'categoryLow' | 'category' | 'categoryHigh'): ScheduleColumn {
  const label = (value: number) =>
    CATEGORIES.find((one) => one.category === value)?.label ?? String(value);
  return figure(RESULT_VALUES[name].label, 5, name, label);
}

/** What a schedule says of each building, in order. */
export const SCHEDULE_COLUMNS: readonly ScheduleColumn[] = [
  text('Reference', 8, ({ facts }) => facts.reference, true),
  text('Address', 20, ({ facts }) => facts.address, true),
  text('Listing', 7, ({ facts }) => facts.listedGrade),
  text('Foundation', 6, ({ facts }) => facts.foundation),
  asRegistered('offset', 5),
  asRegistered('settlement', 6),
  figure('Slope', 7.5, 'slope', slopeWords),
  figure('Strain', 6, 'strain', (value) => percentWords(value, 4)),
  category('categoryLow'),
  category('category'),
  category('categoryHigh'),
  figure('Breakpoint volume loss', 6, 'breakpointVolumeLoss', (value) => percentWords(value, 2)),
  asRegistered('stage', 3.5),
  text('Decision', 14.5, ({ now }) => standingWords(now), true),
];
