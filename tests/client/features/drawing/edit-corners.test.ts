// @vitest-environment node
import { describe, expect, it } from 'vitest';
import {
  footprintOf,
  newOutline,
  outlineOf,
  partsOf,
  type ShapeDraft,
} from '../../../../src/features/drawing/drafts/draft.ts';
import {
  addCorner,
  insertCorner,
  middleAfter,
  moveCorner,
  reasonToKeepCorner,
  removeCorner,
  takeLastBack,
} from '../../../../src/features/drawing/drafts/edit-corners.ts';
import {
  addingOf,
  beginRing,
  closeRing,
  leaveRing,
  reasonToStayOpen,
  removeRing,
} from '../../../../src/features/drawing/drafts/edit-rings.ts';
import { handlesOf } from '../../../../src/features/drawing/drafts/handles.ts';
import type { GridPlace } from '../../../../src/features/map/place/grid-projection.ts';
import { aBuildingAnswer } from '../../../support/answers.ts';

const OUTER: [number, number][] = [
  [412500.123456789, 6068300.1],
  [412510, 6068300],
  [412510, 6068310],
  [412500, 6068310],
];
const HOLE: [number, number][] = [
  [412503, 6068303],
  [412506, 6068303],
  [412505, 6068306],
];
const FIRST = { part: 0, ring: 0, corner: 0 };

function closed(ring: [number, number][]): [number, number][] {
  return [...ring, ...ring.slice(0, 1)];
}

function withCourtyard(): ShapeDraft {
  return outlineOf(aBuildingAnswer({ footprint: [[closed(OUTER), closed(HOLE)]] }));
}

function drawn(...corners: GridPlace[]): ShapeDraft {
  return corners.reduce(addCorner, newOutline());
}

function ring(draft: ShapeDraft, index = 0): readonly GridPlace[] {
  return draft.parts[0]?.[index] ?? [];
}

describe('a footprint', () => {
  it('comes back as it was, to the last digit', () => {
    const footprint = [[closed(OUTER), closed(HOLE)]];
    expect(footprintOf(partsOf(footprint))).toEqual(footprint);
  });

  it('keeps every corner that is not moved', () => {
    const moved = moveCorner(withCourtyard(), { part: 0, ring: 1, corner: 2 }, [412505.5, 6068306]);
    expect(ring(moved)).toEqual(OUTER);
    expect(ring(moved, 1)).toEqual([HOLE[0], HOLE[1], [412505.5, 6068306]]);
  });
});

describe('drawing', () => {
  it.each([
    ['a corner', drawn([0, 0]), 1],
    ['the same corner twice', drawn([0, 0], [0, 0]), 1],
    ['three corners', drawn([0, 0], [4, 0], [4, 3]), 3],
    ['one taken back', takeLastBack(drawn([0, 0], [4, 0])), 1],
    ['none to take back', takeLastBack(drawn()), 0],
    ['an outline with too few corners to close', closeRing(drawn([0, 0], [4, 0])), 2],
  ])('%s', (_name, draft, count) => {
    expect(ring(draft)).toHaveLength(count);
    expect(draft.open).toEqual({ part: 0, ring: 0 });
  });

  it('closes from three corners on, and then takes no more', () => {
    const done = closeRing(drawn([0, 0], [4, 0], [4, 3]));
    expect(done.open).toBeNull();
    expect(addCorner(done, [9, 9])).toBe(done);
    expect(takeLastBack(done)).toBe(done);
  });
});

describe('an outline', () => {
  it('gets a corner on the side after another', () => {
    const draft = withCourtyard();
    const middle = middleAfter(draft, { ...FIRST, corner: 3 });
    expect(middle).toEqual([412500.062, 6068305.05]);
    expect(ring(insertCorner(draft, FIRST, [412505, 6068299]))[1]).toEqual([412505, 6068299]);
  });

  it('loses corners down to three', () => {
    const three = removeCorner(withCourtyard(), { ...FIRST, corner: 1 });
    expect(ring(three)).toEqual([OUTER[0], OUTER[2], OUTER[3]]);
    expect(reasonToKeepCorner(three, FIRST)).toBe('An outline has three corners at least.');
    expect(removeCorner(three, FIRST)).toBe(three);
  });

  it('loses a courtyard, but not itself', () => {
    expect(removeRing(withCourtyard(), { part: 0, ring: 1 }).parts).toEqual([[OUTER]]);
    expect(removeRing(withCourtyard(), FIRST).parts[0]).toHaveLength(2);
  });

  it('can be taken hold of at corners and middles', () => {
    expect(handlesOf(withCourtyard())).toHaveLength(14);
    expect(handlesOf(drawn([0, 0], [4, 0]))).toEqual([]);
    expect(handlesOf(drawn([0, 0], [4, 0], [4, 3]))).toMatchObject([{ place: [0, 0] }]);
  });
});

/** A square of so many metres with its south-western corner there. */
function square(east: number, north: number, side: number): GridPlace[] {
  return [
    [east, north],
    [east + side, north],
    [east + side, north + side],
    [east, north + side],
  ];
}

describe('a courtyard or a part', () => {
  const house = closeRing(drawn(...square(0, 0, 10)));
  const two = closeRing(square(20, 0, 10).reduce(addCorner, beginRing(house, 'part')));

  function added(draft: ShapeDraft, kind: 'courtyard' | 'part', corners: GridPlace[]): ShapeDraft {
    return corners.reduce(addCorner, beginRing(draft, kind));
  }

  it('is drawn beside what is closed, corner by corner', () => {
    const open = added(house, 'courtyard', [[3, 3], [5, 3]]); // prettier-ignore
    expect([addingOf(house), addingOf(open)]).toEqual([null, 'courtyard']);
    expect(takeLastBack(open).parts).toEqual([[square(0, 0, 10), [[3, 3]]]]);
    expect(closeRing(open)).toBe(open);
    expect(leaveRing(open).parts).toEqual(house.parts);
    expect(beginRing(open, 'part')).toBe(open);
    expect(two.parts).toEqual([[square(0, 0, 10)], [square(20, 0, 10)]]);
  });

  it('goes to the part that it lies in', () => {
    const done = closeRing(added(two, 'courtyard', square(23, 3, 2)));
    expect(done.parts).toEqual([[square(0, 0, 10)], [square(20, 0, 10), square(23, 3, 2)]]);
    expect(done.open).toBeNull();
  });

  it.each([
    ['courtyard', 'inside', square(3, 3, 2), null],
    ['courtyard', 'half outside', square(8, 3, 5), /lies inside the building/],
    ['courtyard', 'across two parts', square(5, 3, 20), /lies inside the building/],
    ['part', 'beside', square(0, 20, 5), null],
    ['part', 'against a wall', square(10, 0, 5), null],
    ['part', 'half inside', square(8, 3, 5), /lies beside the others/],
  ] as const)('a %s that lies %s', (kind, _where, corners, reason) => {
    const open = added(two, kind, [...corners]);
    if (reason === null) {
      expect(reasonToStayOpen(open)).toBeNull();
      expect(closeRing(open).open).toBeNull();
    } else {
      expect(reasonToStayOpen(open)).toMatch(reason);
      expect(closeRing(open)).toBe(open);
    }
  });

  it('is taken away with what lies in it', () => {
    const done = closeRing(added(two, 'courtyard', square(23, 3, 2)));
    expect(removeRing(done, { part: 1, ring: 0 }).parts).toEqual(house.parts);
    expect(removeRing(done, { part: 1, ring: 1 }).parts).toEqual(two.parts);
  });

  it('closes at its own first corner', () => {
    expect(handlesOf(added(house, 'courtyard', [[3, 3], [5, 3], [5, 5]]))).toMatchObject([
      { at: { part: 0, ring: 1, corner: 0 }, place: [3, 3] },
    ]); // prettier-ignore
  });
});
