import { capital } from '../../../shared/presentation/capital.ts';
import type { OpenedWall } from '../../../shared/assessment/open-wall.ts';
import { stageWords } from '../../../shared/presentation/result-words.ts';
import { slopeWords } from '../../../shared/presentation/slope-words.ts';
import { sourceNote } from '../../../shared/presentation/source-note.ts';
import { millimetresFromMetres } from '../../../shared/units/millimetres-from-metres.ts';
import { WARNINGS, type Warning } from '../../../shared/warnings.ts';
import { beside, stack, type Block } from '../pdf/block.ts';
import { INKS } from '../pdf/inks.ts';
import type { Paper } from '../pdf/paper.ts';
import { drawLine } from '../pdf/trace.ts';
import { wordsBlock } from '../pdf/words-block.ts';
import type { Words } from '../pdf/words.ts';
import type { SheetParts } from './sheet-parts.ts';
import { figureWords } from './figures.ts';
import { SHEET_WIDTH } from './sheet-width.ts';
import { titled } from './titled.ts';

const BETWEEN = 18;
const HALF = (SHEET_WIDTH - BETWEEN) / 2;
const SIZE = 8;

function listed(paper: Paper, facts: readonly (readonly [name: string, words: string])[]): Block {
  const rows = facts.map(([name, words]): Block => {
    const row = beside([
      { at: 0, block: wordsBlock(paper, name, 90, { size: SIZE, ink: INKS.second }) },
      { at: 92, block: wordsBlock(paper, words, HALF - 92, { size: SIZE }) },
    ]);
    return {
      height: row.height + 4,
      draw: (x, y) => {
        row.draw(x, y + 1.5);
        const foot = y + row.height + 4;
        drawLine(paper, [[x, foot], [x + HALF, foot]], { ink: INKS.hairline, width: 0.5 }); // prettier-ignore
      },
    };
  });
  return stack(rows);
}

function wholeWall({ paper }: SheetParts, { wall, result }: OpenedWall): Block {
  const { settlementMax, slopeMax, tilt, angularDistortion, rankin } = result;
  const inner = listed(paper, [
    ['Settlement', `${millimetresFromMetres(settlementMax).toFixed(1)} mm at its lowest`],
    ['Slope', `${slopeWords(slopeMax)} where it is steepest`],
    ['Tilt', slopeWords(tilt)],
    ['Angular distortion', slopeWords(angularDistortion)],
    ['Rankin', `Rankin ${rankin}`],
  ]);
  return titled(paper, { title: 'The wall as a whole', note: `wall ${wall.name}` }, HALF, inner);
}

function isWarning(name: string): name is Warning {
  return name in WARNINGS;
}

/** What holds the building, with the stages at which it does and where the rule is from. */
function holdWords({ material: { run, building } }: SheetParts): readonly Words[] {
  const { heldBy } = building.result;
  if (heldBy.length === 0) return ['Nothing holds it whatever the figures.'];
  return heldBy.map((name) => {
    const hold = run.rules.holds.find((one) => one.name === name);
    const from =
      hold === undefined
        ? ''
        : `: not let go at stage ${hold.stages.join(' or ')}; ${sourceNote(hold.source)}`;
    return [{ text: 'Held by ' }, { text: name, weight: 'strong' }, { text: `${from}.` }];
  });
}

/** What screening found against its limits; nothing where nothing could be worked out. */
function screeningWords({ material: { run, building } }: SheetParts): readonly Words[] {
  const { settlement, slope, fault } = building.result;
  if (fault !== null) return [];
  const limits = run.rules.screening.value;
  const sinks = `${millimetresFromMetres(settlement).toFixed(1)} mm at most, limit ${figureWords(millimetresFromMetres(limits.settlement), 1)} mm`;
  const tilts = `${slopeWords(slope)} at most, limit ${slopeWords(limits.slope)}`;
  return [`Screening, over the whole bracket: settlement ${sinks}; slope ${tilts}.`];
}

function warningWords({ material }: SheetParts): readonly Words[] {
  return material.building.result.warnings.map((name) => [
    { text: `${capital(name)}. `, weight: 'strong' },
    { text: isWarning(name) ? WARNINGS[name] : '' },
  ]);
}

function stage(parts: SheetParts, width: number): Block {
  const { paper, material } = parts;
  const words = (one: Words) => wordsBlock(paper, one, width, { size: SIZE });
  const inner = stack(
    [
      wordsBlock(paper, `${stageWords(material.building.result)}.`, width, {
        size: 9,
        weight: 'strong',
      }),
      ...screeningWords(parts).map(words),
      ...holdWords(parts).map(words),
      ...warningWords(parts).map(words),
    ],
    3,
  );
  return titled(
    paper,
    { title: 'Stage and holds', note: 'by the figures; nothing is decided by them' },
    width,
    inner,
  );
}

/** What the governing wall does as a whole, and beside it how far the building came and what holds it. */
export function stageBlocks(parts: SheetParts): Block {
  const { opened } = parts;
  if (opened === null) return stage(parts, SHEET_WIDTH);
  return beside([
    { at: 0, block: wholeWall(parts, opened) },
    { at: HALF + BETWEEN, block: stage(parts, HALF) },
  ]);
}
