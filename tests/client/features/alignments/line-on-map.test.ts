import { describe, expect, it } from 'vitest';
import { centralSurface } from '../../../../shared/assessment/central-surface.ts';
import { chainageWords } from '../../../../shared/presentation/chainage-words.ts';
import { cursorWords } from '../../../../src/features/alignments/cursor-words.ts';
import {
  shapesOfContours,
  shapesOfDesign,
} from '../../../../src/features/alignments/line-shapes.ts';
import { placeOnLine } from '../../../../src/features/alignments/place-on-line.ts';
import { createPreviewWork } from '../../../../src/features/alignments/preview/preview-work.ts';
import { aDesign } from '../../../support/designs.ts';

const RULES = { depth: { kind: 'clay' }, focus: 'axis' } as const;
const CASE = { design: aDesign(), rules: RULES };

describe('a place beside a line', () => {
  const line: [number, number][] = [[0, 0], [100, 0], [100, 100]]; // prettier-ignore

  it('has the chainage of the nearest point, and is left or right of it', () => {
    expect(placeOnLine(line, [40, 5])).toEqual({ chainage: 40, offset: 5 });
    expect(placeOnLine(line, [40, -5])).toEqual({ chainage: 40, offset: -5 });
    expect(placeOnLine(line, [107, 60])).toEqual({ chainage: 160, offset: -7 });
    expect(placeOnLine([[0, 0]], [1, 1])).toBeNull();
  });

  it('is said with its settlement, and not at all from far off', () => {
    const surface = centralSurface(aDesign(), RULES);
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

  it('has contours in mm', () => {
    const worked = createPreviewWork()({ preview: CASE, question: { kind: 'contours' } });
    if (worked.kind !== 'contours') throw new Error(worked.kind);
    const levels = shapesOfContours(worked.contours).flatMap((shape) =>
      shape.kind === 'contour' ? [shape.level] : [],
    );
    expect([...new Set(levels)]).toEqual([1, 2, 5, 10]);
  });
});
