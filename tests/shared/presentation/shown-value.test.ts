import { describe, expect, it } from 'vitest';
import { formatFigure } from '../../../shared/presentation/field-words.ts';
import { shownValue } from '../../../shared/presentation/shown-value.ts';
import { aRegisterRow } from '../../support/answers.ts';

describe('a value as it is shown', () => {
  it('is known, with the places that are usual', () => {
    expect(shownValue('eavesHeight', aRegisterRow({ eavesHeight: 6 }))).toEqual({
      kind: 'known',
      text: '6.0',
    });
    expect(formatFigure('foundingLevel', -0.5)).toBe('\u22120.50');
    expect(formatFigure('eOverG', 12.3456)).toBe('12.346');
    expect(formatFigure('foundingLevel', -0.0001)).toBe('0.00');
  });

  it('is what the method assumes', () => {
    const row = aRegisterRow({ storeys: 3, eavesHeight: null, assumed: ['eavesHeight'] });
    expect(shownValue('eavesHeight', row)).toEqual({
      kind: 'assumed',
      text: '9.0',
      why: 'assumed: 9.0 m',
    });
  });

  it('follows from the construction', () => {
    const row = aRegisterRow({ eOverG: null, construction: 'framed' });
    expect(shownValue('eOverG', row)).toMatchObject({ kind: 'follows', text: '12.5' });
  });

  it('is a level one metre down where founding is not known', () => {
    const row = aRegisterRow({ foundingLevel: null, assumed: ['foundingDepth'] });
    expect(shownValue('foundingLevel', row)).toMatchObject({ kind: 'assumed', text: '2.00' });
    const nowhere = { ...row, groundLevel: null };
    expect(shownValue('foundingLevel', nowhere)).toMatchObject({ kind: 'unknown' });
    const above = aRegisterRow({ foundingLevel: 4, assumed: ['foundingDepth'] });
    expect(shownValue('foundingLevel', above)).toMatchObject({ kind: 'assumed', text: '4.00' });
  });

  it('is not known, also where a register says so in words', () => {
    expect(shownValue('condition', aRegisterRow({ condition: 'unknown' }))).toEqual({
      kind: 'unknown',
      why: 'condition is not known',
    });
  });
});
