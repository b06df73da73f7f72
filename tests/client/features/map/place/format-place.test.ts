// @vitest-environment node
import { expect, it } from 'vitest';
import { formatPlace } from '../../../../../src/features/map/place/format-place.ts';

it.each([
  [
    [412_508.4, 6_068_379.7],
    ['E 412\u2009508.4', 'N 6\u2009068\u2009379.7'],
  ],
  [
    [412_508.04, 6_068_379.96],
    ['E 412\u2009508.0', 'N 6\u2009068\u2009380.0'],
  ],
  [
    [999.96, 0],
    ['E 1\u2009000.0', 'N 0.0'],
  ],
  [
    [-0.31, -12_345.68],
    ['E \u22120.3', 'N \u221212\u2009345.7'],
  ],
  [
    [-0.04, 0.04],
    ['E 0.0', 'N 0.0'],
  ],
] as const)('writes %j as people read it', (place, words) => {
  expect(formatPlace(place)).toEqual(words);
});
