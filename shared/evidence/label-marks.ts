import { planDistance } from '../geometry/plan-distance.ts';
import { CATEGORY_SIZE, NAME_SIZE } from './building-labels.ts';
import { CHAINAGE_SIZE } from './chainage-marks.ts';
import { CONTOUR_SIZE } from './contour-labels.ts';
import { labelCorners, type LabelBox } from './label-box.ts';
import { lineMark, type Ink, type Mark, type Spot, type Stroke } from './marks.ts';
import type { PlanLabel } from './plan-labels.ts';

const MM_PER_POINT = 25.4 / 72;
/** From the middle of capitals to where they stand, as a share of their size. */
const RISE = 0.36;
const LEADER: Stroke = { ink: 'ink', width: 0.18 };

/**
 * Words in the middle of a label's ground.
 *
 * Units: size points of print. Valid: any box. Source: [own].
 */
export function wordsIn(
  { middle: [x, y], along: [c, s] }: LabelBox,
  words: string,
  look: { readonly size: number; readonly isStrong?: boolean; readonly ink?: Ink },
): Mark {
  const down = RISE * look.size * MM_PER_POINT;
  const at: Spot = [x - s * down, y + c * down];
  return { kind: 'words', words, at, anchor: 'middle', along: [c, s], ...look };
}

function ground(box: LabelBox, isFramed: boolean): Mark {
  return {
    ...{ kind: 'shape', rings: [labelCorners(box)], isClosed: true, fill: 'paper' },
    ...(isFramed && { stroke: LEADER }),
  };
}

/** A place so near to the words that no line has to lead to it, in mm. */
const NEAR = 2.5;

/** Where a straight line from a place to the middle of an upright box meets its side; null from inside. */
function meets({ middle, halfWide, halfTall }: LabelBox, [x, y]: Spot): Spot | null {
  const [dx, dy] = [x - middle[0], y - middle[1]];
  const share = Math.min(
    dx === 0 ? Infinity : halfWide / Math.abs(dx),
    dy === 0 ? Infinity : halfTall / Math.abs(dy),
  );
  return share >= 1 ? null : [middle[0] + share * dx, middle[1] + share * dy];
}

/**
 * Words in a frame beside a place, with a line that leads to it; without either where they stand on it.
 *
 * Units: mm, size points of print. Valid: an upright box, or one that stands on the place. Source: [own].
 */
export function leadMarks(box: LabelBox, words: string, to: Spot, size: number): Mark[] {
  const from = box.along[0] === 1 ? meets(box, to) : null;
  const isLed = from !== null && planDistance(from, to) > NEAR;
  const lead = isLed ? [lineMark([from, to], LEADER)] : [];
  return [...lead, ground(box, isLed), wordsIn(box, words, { size })];
}

/**
 * The marks of a label that has room on a plan.
 *
 * Units: mm. Valid: a placed label. Source: [own].
 */
export function labelMarks({ kind, words, at, tick }: PlanLabel, box: LabelBox): Mark[] {
  if (kind === 'name') return leadMarks(box, words, at, NAME_SIZE);
  if (kind === 'contour') {
    return [ground(box, false), wordsIn(box, words, { size: CONTOUR_SIZE, ink: 'contour' })];
  }
  if (kind === 'figure') {
    return [ground(box, false), wordsIn(box, words, { size: CATEGORY_SIZE, isStrong: true })];
  }
  const from = meets(box, at);
  const lead = from === null || tick === undefined ? [] : [lineMark([from, at], LEADER)];
  return [
    ...lead,
    ground(box, false),
    wordsIn(box, words, { size: CHAINAGE_SIZE, isStrong: true }),
  ];
}
