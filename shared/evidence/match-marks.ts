import { chainageWords } from '../presentation/chainage-words.ts';
import type { GroundFrame } from './ground-frame.ts';
import type { LabelBox } from './label-box.ts';
import { wordsIn } from './label-marks.ts';
import type { LineOnGround } from './line-on-ground.ts';
import { lineMark, type Mark, type Measure, type Rectangle, type Spot } from './marks.ts';
import type { MatchLine } from './planned-sheets.ts';
import { stretchesIn } from './stretches-in.ts';

const SIZE = 7.5;

/** From side to side of a window through a place, across a direction. */
function across({ window }: { readonly window: Rectangle }, [x, y]: Spot, [c, s]: Spot): Spot[] {
  const far = window.right - window.left + window.bottom - window.top;
  const [stretch = []] = stretchesIn(window, [[x - s * far, y + c * far], [x + s * far, y - c * far]]); // prettier-ignore
  return stretch;
}

/**
 * Where a sheet of a series hands over to the next, on paper: a line across the drawn line, with words beside it
 * that say which sheet to turn to.
 *
 * Units: mm. Valid: made by `matchesOnPaper`. Source: [own].
 */
export type MatchOnPaper = {
  readonly cut: readonly Spot[];
  readonly words: string;
  readonly box: LabelBox;
};

/** From the top of a window down to the middle of the words, and from the cut to it, in mm. */
const [DOWN, BESIDE] = [42, 2.6];

/**
 * The match lines of a sheet on paper.
 *
 * Units: mm. Valid: the match lines of that frame. Source: [own].
 */
export function matchesOnPaper(
  frame: GroundFrame,
  {
    line,
    matches,
    measure,
  }: {
    readonly line: LineOnGround;
    readonly matches: readonly MatchLine[];
    readonly measure: Measure;
  },
): MatchOnPaper[] {
  return matches.flatMap(({ chainage, sheet, isAhead }): MatchOnPaper[] => {
    const along = frame.turned(line.directionAt(chainage));
    const cut = across(frame, frame.place(line.pointAt(chainage)), along);
    const [start, end] = [cut[0], cut.at(-1)];
    if (start === undefined || end === undefined) return [];
    // up the sheet, beside the cut, on the side that goes on
    const top = start[1] < end[1] ? start : end;
    const side = isAhead ? BESIDE : -BESIDE;
    const up: Spot = along[0] >= 0 ? [along[1], -along[0]] : [-along[1], along[0]];
    const middle: Spot = [
      top[0] - up[0] * DOWN + side * along[0],
      top[1] - up[1] * DOWN + side * along[1],
    ];
    const words = `Match line ${chainageWords(chainage)}, see sheet ${sheet}`;
    const halfWide = measure(words, SIZE, true) / 2 + 0.8;
    return [{ cut, words, box: { middle, halfWide, halfTall: 1.7, along: up } }];
  });
}

/**
 * The match lines of a sheet with their words.
 *
 * Units: mm. Valid: any of matchesOnPaper. Source: [own].
 */
export function matchMarks(matches: readonly MatchOnPaper[]): Mark[] {
  return matches.flatMap(({ cut, words, box }): Mark[] => [
    lineMark(cut, { ink: 'ink', width: 0.5, dash: [6, 1.5, 1.5, 1.5] }),
    wordsIn(box, words, { size: SIZE, isStrong: true }),
  ]);
}
