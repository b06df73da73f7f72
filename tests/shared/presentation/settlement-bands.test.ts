import { describe, expect, it } from 'vitest';
import { bandOf, bandWords } from '../../../shared/presentation/settlement-bands.ts';

describe('bands of settlement', () => {
  it.each([
    [0.00099, -1],
    [0.001, 0],
    [0.0099, 2],
    [0.05, 6],
  ])('put %d m into band %d', (metres, band) => {
    expect(bandOf(metres)).toBe(band);
  });

  it('have bands in words', () => {
    expect([bandWords(0), bandWords(6)]).toEqual(['1 to 2 mm', '50 mm and more']);
  });
});
