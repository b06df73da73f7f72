import { capital } from '../../../shared/presentation/capital.ts';
import { CATEGORIES, type Category } from '../../../shared/damage/categories.ts';
import { stageWords } from '../../../shared/presentation/result-words.ts';
import { staleWords } from '../../../shared/presentation/run-words.ts';
import { overBracketWords } from '../../../shared/presentation/verdict-words.ts';
import { gap, stack, type Block } from '../pdf/block.ts';
import { INKS } from '../pdf/inks.ts';
import { wordsBlock } from '../pdf/words-block.ts';
import { categorySwatch } from './category-swatch.ts';
import type { SheetParts } from './sheet-parts.ts';
import { SHEET_WIDTH } from './sheet-width.ts';

function categoryVerdict({ paper }: SheetParts, category: Category, range: string): Block {
  const row = CATEGORIES[category];
  const swatch = categorySwatch(paper, category, { width: 56, height: 34 });
  const number = wordsBlock(paper, row?.label ?? '', 50, { size: 20, weight: 'strong' });
  const words = stack([
    wordsBlock(paper, capital(row?.name ?? ''), 380, { size: 11, weight: 'strong' }),
    wordsBlock(paper, range, 380, { size: 8, ink: INKS.second }),
  ]);
  const after = 50 + (row?.label.length ?? 1) * 12;
  return {
    height: 28,
    draw: (x, y) => {
      swatch.draw(x, y + 1);
      number.draw(x + 50, y + 1);
      words.draw(x + after + 8, y + 1);
    },
  };
}

function verdict(parts: SheetParts): Block {
  const { paper, material } = parts;
  const { result } = material.building;
  const range = overBracketWords(result);
  if (result.fault === null && result.category !== null && range !== null) {
    return categoryVerdict(parts, result.category, range);
  }
  const isFault = result.fault !== null;
  return stack([
    wordsBlock(paper, isFault ? 'Not worked out' : stageWords(result), SHEET_WIDTH, {
      size: 12,
      weight: 'strong',
    }),
    ...(isFault
      ? []
      : [
          wordsBlock(paper, 'by screening, over the whole bracket', SHEET_WIDTH, {
            size: 8,
            ink: INKS.second,
          }),
        ]),
  ]);
}

function recordWords({ isAsRecorded, material: { run } }: SheetParts): string {
  return isAsRecorded
    ? `Worked out again for this sheet from what run ${run.number} went by: the same figures as recorded, to the last digit.`
    : `Worked out again for this sheet, the figures differ from the record of run ${run.number}. The record stands; tell whoever looks after this workbench.`;
}

/** The answer in one line, whether it is still up to date, and whether it is the one on record. */
export function verdictBlock(parts: SheetParts): Block {
  const { paper, material, isAsRecorded } = parts;
  const { run, building } = material;
  const stale = staleWords(run, { ...run.since, register: building.changedSince });
  const record = { size: 7.5, ink: isAsRecorded ? INKS.second : INKS.clayDeep };
  return stack([
    verdict(parts),
    gap(5),
    ...(stale === null
      ? []
      : [wordsBlock(paper, stale, SHEET_WIDTH, { size: 8, weight: 'strong', ink: INKS.clayDeep })]),
    wordsBlock(paper, recordWords(parts), SHEET_WIDTH, record),
  ]);
}
