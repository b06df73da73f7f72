import { describe, expect, it } from 'vitest';
import { facadesOf, type Facade } from '../../../shared/building/facade.ts';
import { facadeLinks } from '../../../shared/building/facade-links.ts';
import { ROW_TOLERANCE } from '../../../shared/building/row-tolerance.ts';
import type { Segment } from '../../../shared/geometry/point.ts';

function facade(id: string, wall: Segment): Facade {
  const [first] = facadesOf({ id, walls: [wall] });
  if (first === undefined) throw new Error('the wall has length');
  return first;
}

const base = facade('a', { start: [0, 0], end: [5, 0] });

function links(wall: Segment): string[] {
  return facadeLinks(base, facade('b', wall), ROW_TOLERANCE).map(
    ({ ends: [one, other], gap }) => `${one.side} to ${other.side}, ${gap} mm`,
  );
}

describe('facadeLinks', () => {
  it.each([
    ['going on at its end', { start: [5, 0], end: [9, 0] }, ['end to start, 0 mm']],
    ['going on, drawn the other way', { start: [9, 0], end: [5, 0] }, ['end to end, 0 mm']],
    ['going on before its start', { start: [-4, 0], end: [0, 0] }, ['start to end, 0 mm']],
    ['across a gap of 0.3 m', { start: [5.3, 0], end: [9, 0] }, ['end to start, 300 mm']],
    ['overlapping by 0.4 m', { start: [4.6, 0], end: [9, 0] }, ['end to start, 400 mm']],
    ['across a gap of 0.6 m', { start: [5.6, 0], end: [9, 0] }, []],
    ['turning by 9 degrees', { start: [5, 0], end: [9, 0.63] }, ['end to start, 0 mm']],
    ['turning by 11 degrees', { start: [5, 0], end: [9, 0.78] }, []],
    ['folding back along it', { start: [5, 0], end: [1, 0] }, []],
    ['lying on it', { start: [0, 0], end: [5, 0] }, []],
    ['round a corner', { start: [5, 0], end: [5, 4] }, []],
  ] as [string, Segment, string[]][])('%s', (_, wall, expected) => {
    expect(links(wall)).toEqual(expected);
  });

  it('measures the turn by its sine', () => {
    const [link] = facadeLinks(
      base,
      facade('b', { start: [5, 0], end: [9.95, 0.5] }),
      ROW_TOLERANCE,
    );
    // 0.5 over √(4.95² + 0.5²) = 4.975189
    expect(link?.turn).toBe(100499);
  });
});
