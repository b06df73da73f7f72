// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { aimAt } from '../../../../src/features/drawing/drafts/aim.ts';
import { newOutline, type Parts } from '../../../../src/features/drawing/drafts/draft.ts';
import { addCorner } from '../../../../src/features/drawing/drafts/edit-corners.ts';
import { closeRing } from '../../../../src/features/drawing/drafts/edit-rings.ts';
import { rightAngle } from '../../../../src/features/drawing/drafts/right-angle.ts';
import { snap } from '../../../../src/features/drawing/drafts/snap.ts';
import type { GridPlace } from '../../../../src/features/map/place/grid-projection.ts';

const NEIGHBOUR: Parts = [
  [
    [
      [10.123456789, 0.5],
      [20, 0.5],
      [20, 8],
      [10, 8],
    ],
  ],
];

describe('snap', () => {
  it.each<[string, GridPlace, ReturnType<typeof snap>]>([
    ['a corner, to the last digit', [10.4, 0.7], { place: [10.123456789, 0.5], to: 'corner' }],
    ['a wall', [15, 0.9], { place: [15, 0.5], to: 'edge' }],
    ['nothing out of reach', [15, -2], null],
  ])('takes %s', (_name, place, expected) => {
    expect(snap(place, [NEIGHBOUR], 0.6)).toEqual(expected);
  });
});

describe('rightAngle', () => {
  it.each<[string, GridPlace, GridPlace | undefined, GridPlace | undefined, GridPlace]>([
    ['to the side', [4.3, 6], [4, 0], [0, 0], [4, 6]],
    ['straight on', [9, 1], [4, 0], [0, 0], [9, 0]],
    ['along the grid at first', [1, 7], [0, 0], undefined, [0, 7]],
    ['of nothing', [1, 7], undefined, undefined, [1, 7]],
  ])('%s', (_name, wanted, last, before, expected) => {
    expect(rightAngle(wanted, last, before)).toEqual(expected);
  });
});

describe('aimAt', () => {
  const draft = [[0, 0] as const, [4, 0] as const, [4, 3] as const].reduce(addCorner, newOutline());
  const request = {
    place: [10.3, 0.6],
    near: [7],
    reach: 0.6,
    isSquare: false,
    held: null,
  } as const;

  it('snaps, or takes the place to the centimetre', () => {
    expect(aimAt(draft, request, [NEIGHBOUR])).toMatchObject({ to: 'corner' });
    expect(aimAt(draft, { ...request, place: [3.14159, 5.999] }, [])).toEqual({
      place: [3.14, 6],
      to: 'ground',
      held: null,
    });
  });

  it('keeps right angles instead when asked to', () => {
    const aim = aimAt(draft, { ...request, isSquare: true }, [NEIGHBOUR]);
    expect(aim.place).toEqual([10.3, 3]);
  });

  it('measures the angle of a dragged corner from the side before it', () => {
    const held = {
      kind: 'corner',
      at: { part: 0, ring: 0, corner: 2 },
      place: [4, 3],
    } as const;
    const aim = aimAt(closeRing(draft), { ...request, place: [4.2, 5], isSquare: true, held }, []);
    expect(aim).toEqual({ place: [4, 5], to: 'ground', held });
  });
});
