import { describe, expect, it, vi } from 'vitest';
import { chainageWords } from '../../../../src/features/alignments/chainage-words.ts';
import { cursorWords } from '../../../../src/features/alignments/cursor-words.ts';
import {
  shapesOfContours,
  shapesOfDesign,
} from '../../../../src/features/alignments/line-shapes.ts';
import { placeOnLine } from '../../../../src/features/alignments/place-on-line.ts';
import { createLatestAsked } from '../../../../src/features/alignments/preview/latest-asked.ts';
import {
  centralSurface,
  previewWork,
  type Worked,
} from '../../../../src/features/alignments/preview/preview-work.ts';
import { aDesign } from '../../../support/designs.ts';

const RULES = { depth: { kind: 'clay' }, focus: 'axis' } as const;

describe('a place beside a line', () => {
  const line: [number, number][] = [[0, 0], [100, 0], [100, 100]]; // prettier-ignore

  it('has the chainage of the nearest point, and is left or right of it', () => {
    expect(placeOnLine(line, [40, 5])).toEqual({ chainage: 40, offset: 5 });
    expect(placeOnLine(line, [40, -5])).toEqual({ chainage: 40, offset: -5 });
    expect(placeOnLine(line, [107, 60])).toEqual({ chainage: 160, offset: -7 });
    expect(placeOnLine([[0, 0]], [1, 1])).toBeNull();
  });

  it('is said with its settlement, and not at all from far off', () => {
    const surface = centralSurface({ design: aDesign(), rules: RULES });
    expect(cursorWords({ chainage: 500, offset: -3 }, [0, 0], surface)).toEqual([
      'Chainage 0+500',
      'Offset −3.0 m',
      'S 16.9 mm',
    ]);
    expect(cursorWords({ chainage: 500, offset: 400 }, [0, 400], surface)).toEqual([]);
  });

  it.each([
    [0, '0+000'],
    [2645.4, '2+645'],
    [999.6, '1+000'],
  ])('at %d m is read %s', (metres, words) => {
    expect(chainageWords(metres)).toBe(words);
  });
});

describe('a designed line on the map', () => {
  it('has its drives with edges, and a tick each 100 m', () => {
    const shapes = shapesOfDesign(
      aDesign({ bores: { kind: 'twin', spacing: 15, later: 'left', laterFactor: 1 } }),
    );
    const count = (kind: string) => shapes.filter((shape) => shape.kind === kind).length;
    expect([count('axis'), count('edge'), count('tick'), count('chainage')]).toEqual([
      2, 4, 11, 11,
    ]);
    expect(shapes).toContainEqual({
      kind: 'chainage',
      place: [-400, -27.5],
      text: '0+100',
    });
  });

  it('has nothing where its drives cannot follow it', () => {
    expect(shapesOfDesign(aDesign({ line: [[0, 0], [0, 0]] }))).toEqual([]); // prettier-ignore
  });

  it('has contours in mm, or says why there are none', () => {
    const worked = previewWork({ design: aDesign(), rules: RULES });
    if (worked.kind === 'fault') throw new Error(worked.message);
    const levels = shapesOfContours(worked.contours).map((shape) =>
      shape.kind === 'contour' ? shape.level : 0,
    );
    expect([...new Set(levels)]).toEqual([1, 2, 5, 10]);
    const fault = previewWork({ design: aDesign({ line: [[0, 0], [0, 0]] }), rules: RULES }); // prettier-ignore
    expect(fault).toMatchObject({ kind: 'fault' });
  });
});

describe('asking a worker', () => {
  it('sends one question at a time, and of those that wait only the newest', () => {
    const sent: unknown[] = [];
    const answers: ((event: MessageEvent<Worked>) => void)[] = [];
    const onWorked = vi.fn();
    const latest = createLatestAsked(
      {
        postMessage: (asked: unknown) => sent.push(asked),
        terminate: () => undefined,
        addEventListener: (_, answer) => answers.push(answer),
      },
      onWorked,
    );
    const [first, second, third] = [6, 7, 8].map((diameter) => ({
      design: aDesign({ diameter }),
      rules: RULES,
    }));
    for (const asked of [first, second, third]) if (asked !== undefined) latest.ask(asked);
    expect(sent).toEqual([first]);
    answers[0]?.(new MessageEvent('message', { data: { kind: 'contours', contours: [] } }));
    expect(sent).toEqual([first, third]);
    expect(onWorked).toHaveBeenCalledTimes(1);
  });
});
