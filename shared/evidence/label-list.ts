import type { PlanPoint } from '../geometry/point.ts';
import { nameLabels, type LabelledBuilding } from './building-labels.ts';
import type { GroundFrame } from './ground-frame.ts';
import type { LabelBox } from './label-box.ts';
import { leadMarks } from './label-marks.ts';
import type { Mark, Measure } from './marks.ts';
import { placeLabels } from './place-labels.ts';
import type { PlanLabel, PlanLabels } from './plan-labels.ts';

/**
 * A line of the list of labels without room: its number, what would have been written, and where.
 *
 * Units: place m. Valid: made by `labelList`; `labels` are all that it stands for. Source: [own].
 */
export type ListedLine = {
  readonly number: number;
  readonly words: string;
  readonly place: PlanPoint;
  readonly labels: readonly PlanLabel[];
};

type FigureWords = (figure: string) => string;

const BEFORE = { contour: 'Contour', chainage: 'Chainage' } as const;

/** What a line says of its labels, which all belong to one place. */
function wordsOf(labels: readonly PlanLabel[], figure: FigureWords): string {
  const [first] = labels;
  if (first === undefined) return '';
  if (first.kind === 'contour' || first.kind === 'chainage')
    return `${BEFORE[first.kind]} ${first.words}`;
  const name = labels.find(({ kind }) => kind === 'name')?.words ?? first.building?.reference ?? '';
  const number = labels.find(({ kind }) => kind === 'figure')?.words;
  return number === undefined ? name : `${name}, ${figure(number)}`;
}

/**
 * The labels that found no room, numbered from the west, those of one building on one line.
 *
 * Units: m. Valid: `figure` says what figures in buildings are. Source: [own].
 */
export function labelList(
  frame: GroundFrame,
  listed: readonly PlanLabel[],
  figure: FigureWords,
): ListedLine[] {
  const groups = new Map<string, PlanLabel[]>();
  for (const label of listed) {
    const key =
      label.building === undefined ? `${label.kind} ${label.at.join(' ')}` : label.building.id;
    groups.set(key, [...(groups.get(key) ?? []), label]);
  }
  const lines = [...groups.values()].map((labels) => {
    const place = frame.ground(labels[0]?.at ?? [0, 0]);
    return { words: wordsOf(labels, figure), place, labels };
  });
  lines.sort((a, b) => a.place[0] - b.place[0]);
  return lines.map((line, k) => ({ number: k + 1, ...line }));
}

/** The size of the numbers of the list on the plan, in points of print. */
const SIZE = 6.5;

/**
 * The numbers of the list where there is still room for them, and what is taken on the sheet afterwards; a line is
 * found by its grid reference as well.
 *
 * Units: mm. Valid: any list. Source: [own].
 */
export function numberMarks(
  frame: GroundFrame,
  { taken }: Pick<PlanLabels, 'taken'>,
  lines: readonly ListedLine[],
  measure: Measure,
): { readonly marks: Mark[]; readonly taken: readonly LabelBox[] } {
  const wanted = lines.map(({ number, place }): LabelledBuilding => ({
    ...{ id: String(number), words: String(number), rings: [], middle: frame.place(place) },
  }));
  const spots = nameLabels(wanted, (words) => measure(words, SIZE, false));
  const { placed } = placeLabels(frame.window, taken, spots);
  return {
    marks: placed.flatMap(({ what, box }) => leadMarks(box, what.words, what.middle, SIZE)),
    taken: [...taken, ...placed.map(({ box }) => box)],
  };
}
