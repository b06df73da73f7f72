import type { Mark, Rectangle, Spot } from '../../shared/evidence/marks.ts';

type Words = Extract<Mark, { kind: 'words' }>;

/** All marks of a list, those inside windows in place of their window. */
export function flatMarks(marks: readonly Mark[]): Exclude<Mark, { kind: 'within' }>[] {
  return marks.flatMap((mark) => (mark.kind === 'within' ? flatMarks(mark.marks) : [mark]));
}

/** The words among marks. */
export function wordMarks(marks: readonly Mark[]): Words[] {
  return flatMarks(marks).filter((mark) => mark.kind === 'words');
}

/** The lines and outlines among marks that are drawn with a pen so wide, or with any. */
export function ringMarks(marks: readonly Mark[], width?: number): (readonly Spot[])[] {
  return flatMarks(marks).flatMap((mark) =>
    mark.kind === 'shape' && (width === undefined || mark.stroke?.width === width)
      ? mark.rings
      : [],
  );
}

/** How far a place lies beyond the sides of a rectangle. */
export function beyond({ left, top, right, bottom }: Rectangle, [x, y]: Spot): number {
  return Math.max(0, left - x, x - right, top - y, y - bottom);
}

/** Where words begin and end. */
export function endsOfWords(
  { words, at: [x, y], size, isStrong = false, anchor = 'start', along: [c, s] = [1, 0] }: Words,
  measure: (words: string, size: number, isStrong: boolean) => number,
): readonly [Spot, Spot] {
  const long = measure(words, size, isStrong);
  const before = { start: 0, middle: long / 2, end: long }[anchor];
  const after = long - before;
  return [
    [x - before * c, y - before * s],
    [x + after * c, y + after * s],
  ];
}
