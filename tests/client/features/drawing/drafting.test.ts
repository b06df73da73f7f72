// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { newOutline, outlineOf } from '../../../../src/features/drawing/drafts/draft.ts';
import { addCorner } from '../../../../src/features/drawing/drafts/edit-corners.ts';
import { togglePicked } from '../../../../src/features/drawing/drafts/edit-join.ts';
import { begun, redone, stepped, undone } from '../../../../src/features/drawing/drafts/history.ts';
import { lostBy } from '../../../../src/features/drawing/drafts/lost-by.ts';
import { nextReference } from '../../../../src/features/drawing/drafts/next-reference.ts';
import { rebased } from '../../../../src/features/drawing/drafts/rebase.ts';
import { reasonAgainst, type Situation } from '../../../../src/features/drawing/tools.ts';
import { aBuildingAnswer } from '../../../support/answers.ts';

describe('the history of a draft', () => {
  it('goes back and forth, and forgets what was taken back after another step', () => {
    const two = stepped(stepped(begun('a'), 'b'), 'c');
    expect(undone(two)).toEqual({ past: ['a'], present: 'b', future: ['c'] });
    expect(redone(undone(two))).toEqual(two);
    expect(stepped(undone(two), 'd').future).toEqual([]);
  });

  it('stays at its ends, and takes no change for no step', () => {
    const one = begun('a');
    expect([undone(one), redone(one)]).toEqual([one, one]);
    expect(stepped(one, 'a')).toEqual(one);
  });

  it('asks only before more than three corners are lost', () => {
    const corners = [[0, 0] as const, [1, 0] as const, [1, 1] as const, [0, 1] as const];
    const three = corners.slice(0, 3).reduce(addCorner, newOutline());
    expect(lostBy(begun(three))).toBe(0);
    expect(lostBy(begun(corners.reduce(addCorner, newOutline())))).toBe(4);
    expect(lostBy(begun(outlineOf(aBuildingAnswer())))).toBe(0);
    expect(lostBy(null)).toBe(0);
  });
});

describe('picking buildings to join', () => {
  const [a, b] = [aBuildingAnswer({ id: 1 }), aBuildingAnswer({ id: 2 })];

  it('takes another, and lets go of one that is picked again', () => {
    const both = togglePicked({ tool: 'join', buildings: [a] }, b);
    expect(both.buildings).toEqual([a, b]);
    expect(togglePicked(both, a).buildings).toEqual([b]);
  });

  it('is put on top of what somebody else did', () => {
    const fresh = { ...b, version: 2 };
    expect(rebased({ tool: 'join', buildings: [a, b] }, [fresh])).toEqual({
      tool: 'join',
      buildings: [a, fresh],
    });
  });
});

describe('nextReference', () => {
  it.each([
    ['B0197', 'B0198'],
    ['B0197-2', 'B0198'],
    ['B0999', 'B1000'],
    ['Old mill', 'Old mill-2'],
    [undefined, 'B0001'],
  ])('after %s comes %s', (last, next) => {
    expect(nextReference(last)).toBe(next);
  });
});

describe('reasonAgainst', () => {
  const idle: Situation = {
    ...{ tool: 'select', hasBuilding: false, steps: null, saved: 0, undone: 0 },
    isWriting: false,
  };

  it.each<[Parameters<typeof reasonAgainst>[0], Partial<Situation>, string | null]>([
    ['draw', {}, null],
    ['join', {}, null],
    ['edit', {}, 'Select a building first.'],
    ['split', {}, 'Select a building first.'],
    ['remove', {}, 'Select a building first.'],
    ['edit', { hasBuilding: true }, null],
    ['undo', {}, 'Nothing was changed here yet.'],
    ['undo', { saved: 1 }, null],
    ['undo', { saved: 1, steps: { past: 0, future: 0 } }, 'Nothing to take back here.'],
    ['redo', {}, 'Nothing was taken back.'],
    ['redo', { undone: 1 }, null],
    ['redo', { undone: 1, steps: { past: 1, future: 0 } }, 'Nothing was taken back.'],
    ['draw', { isWriting: true }, 'Save the values, or leave them, first.'],
    ['select', { isWriting: true }, null],
    ['redo', { steps: { past: 0, future: 1 } }, null],
  ])('of %s with %o', (tool, change, reason) => {
    expect(reasonAgainst(tool, { ...idle, ...change })).toBe(reason);
  });
});
