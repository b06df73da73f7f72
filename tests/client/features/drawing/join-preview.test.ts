// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { footprintArea } from '../../../../shared/building/footprint-area.ts';
import { joinFootprints } from '../../../../server/register/join-footprints.ts';
import type { FootprintRings } from '../../../../server/models/building-footprint.ts';
import { partsOf, type Parts } from '../../../../src/features/drawing/drafts/draft.ts';
import { joinPreview } from '../../../../src/features/drawing/drafts/join-preview.ts';
import { box } from '../../../support/register.ts';

const ASKEW: FootprintRings = [
  [[[500_010.04, 6_080_000], [500_020, 6_080_000], [500_020, 6_080_010], [500_010.01, 6_080_010]]],
]; // prettier-ignore

/** What the server makes of them; null where it refuses. */
function joinedForGood(buildings: readonly FootprintRings[]): Parts | null {
  try {
    return partsOf(joinFootprints(buildings));
  } catch {
    return null;
  }
}

describe('joinPreview', () => {
  const cases: readonly [string, readonly FootprintRings[], number | null][] = [
    ['two that share a wall', [box(0, 0), box(10, 0, 5, 8)], 140],
    ['three in a row', [box(0, 0), box(10, 0), box(20, 0)], 300],
    ['the middle one picked last', [box(0, 0), box(20, 0), box(10, 0)], 300],
    ['two 5 cm apart', [box(0, 0), box(10.0499, 0)], 200.5],
    ['three with a gap and a lap', [box(0, 0), box(10.02, 1), box(19.99, 0)], 300],
    ['two whose walls are askew', [box(0, 0), ASKEW], 200],
    ['one fitted in between two', [box(0, 0), box(20.06, 0), box(10.03, 0)], 300.6],
    [
      'four round a courtyard, not quite wall to wall',
      [box(0, 0, 30, 10), box(0, 20.02, 30, 10), box(0, 10.01, 10, 10), box(20, 10.01, 10, 10)],
      800,
    ],
    [
      'parts of which only some touch',
      [[...box(0, 0), ...box(40, 0, 5)], [...box(10, 0, 5, 10), ...box(60, 0, 5)]],
      200,
    ],
    ['two 6 cm apart', [box(0, 0), box(10.06, 0)], null],
    ['two that meet at a corner', [box(0, 0), box(10, 10)], null],
    ['one of three apart', [box(0, 0), box(10, 0), box(30, 0)], null],
  ]; // prettier-ignore

  it.each(cases)('shows %s as the server joins them', (_name, buildings, area) => {
    const joined = joinPreview(buildings.map(partsOf));
    expect(joined).toEqual(joinedForGood(buildings));
    if (area === null) expect(joined).toBeNull();
    else expect(Math.abs(footprintArea(joined ?? []) - area)).toBeLessThan(0.7);
  });

  it('shows one alone as nothing joined', () => {
    expect(joinPreview([partsOf(box(0, 0))])).toBeNull();
  });
});
