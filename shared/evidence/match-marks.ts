import { chainageWords } from '../presentation/chainage-words.ts';
import type { GroundFrame } from './ground-frame.ts';
import { wordsIn } from './label-marks.ts';
import type { LineOnGround } from './line-on-ground.ts';
import { lineMark, type Mark, type Rectangle, type Spot } from './marks.ts';
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
 * Where a sheet of a series hands over to the next: a line across the drawn line, with the sheet to turn to.
 *
 * Units: mm. Valid: the match lines of that frame. Source: [own].
 */
export function matchMarks(
  frame: GroundFrame,
  line: LineOnGround,
  matches: readonly MatchLine[],
): Mark[] {
  return matches.flatMap(({ chainage, sheet, isAhead }): Mark[] => {
    const [e, n] = line.pointAt(chainage);
    const [dx, dy] = line.directionAt(chainage);
    const [at, ahead] = [frame.place([e, n]), frame.place([e + dx, n + dy])];
    const scale = 1000 / frame.denominator;
    const along: Spot = [(ahead[0] - at[0]) / scale, (ahead[1] - at[1]) / scale];
    const cut = across(frame, at, along);
    const [start, end] = [cut[0], cut.at(-1)];
    if (start === undefined || end === undefined) return [];
    // up the sheet, beside the cut, on the side that goes on
    const top = start[1] < end[1] ? start : end;
    const side = isAhead ? 1 : -1;
    const up: Spot = along[0] >= 0 ? [along[1], -along[0]] : [-along[1], along[0]];
    const middle: Spot = [
      top[0] - up[0] * 42 + side * along[0] * 2.6,
      top[1] - up[1] * 42 + side * along[1] * 2.6,
    ];
    const words = `Match line ${chainageWords(chainage)}, see sheet ${sheet}`;
    const box = { middle, halfWide: 0, halfTall: 0, along: up };
    return [
      lineMark(cut, { ink: 'ink', width: 0.5, dash: [6, 1.5, 1.5, 1.5] }),
      wordsIn(box, words, { size: SIZE, isStrong: true }),
    ];
  });
}
