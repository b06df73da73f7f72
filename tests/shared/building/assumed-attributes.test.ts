import { describe, expect, test } from 'vitest';
import { completeAttributes } from '../../../shared/building/assumed-attributes.ts';

describe('attributes of a building', () => {
  test('what is missing is assumed and named', () => {
    expect(completeAttributes({})).toEqual({
      storeys: 2,
      eavesHeight: 6,
      foundingDepth: 1,
      eOverG: 2.6,
      poisson: 0.3,
      height: 7,
      assumed: ['storeys', 'eavesHeight', 'foundingDepth', 'eOverG', 'poisson'],
    });
  });

  test('eaves follow from known storeys, height from eaves and founding depth', () => {
    const found = completeAttributes({ storeys: 4, foundingDepth: 2.5 });
    expect(found).toMatchObject({ eavesHeight: 12, height: 14.5 });
    expect(found.assumed).not.toContain('storeys');
    expect(found.assumed).toContain('eavesHeight');
  });

  test('what is known is taken and not named', () => {
    const known = { storeys: 3, eavesHeight: 8, foundingDepth: 1.2, eOverG: 12.5, poisson: 0.2 };
    expect(completeAttributes(known)).toEqual({ ...known, height: 9.2, assumed: [] });
  });
});
