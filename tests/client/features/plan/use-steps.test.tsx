import { act, renderHook } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import { useSteps } from '../../../../src/features/plan/hooks/use-steps.ts';

/** A map that says what is in view, null while it draws, and that comes to rest when it is told to. */
function aMap(seen: readonly number[] | null) {
  const waiting = new Set<() => void>();
  const map = {
    seen,
    buildingsInView: () => map.seen,
    onceStill: (then: () => void) => {
      waiting.add(then);
      return () => {
        waiting.delete(then);
      };
    },
    rest: (nowSeen: readonly number[]) => {
      map.seen = nowSeen;
      for (const then of [...waiting]) then();
      waiting.clear();
    },
  };
  return map;
}

/** A page that shows what is selected at once, or only once it is told to. */
function walkOn(map: ReturnType<typeof aMap>, start: number | null = null, isQuick = true) {
  const asked: number[] = [];
  const { result } = renderHook(() => {
    const [selected, select] = useState(start);
    const [isThere, setThere] = useState(true);
    function goTo(id: number): void {
      asked.push(id);
      if (isQuick) select(id);
    }
    const steps = useSteps({ handle: map, selected, isThere, goTo });
    return { selected, select, setThere, steps };
  });
  return {
    step: (by: 1 | -1 = 1) => {
      act(() => {
        result.current.steps.step(by);
      });
      return result.current.selected;
    },
    select: (id: number | null) => {
      act(() => {
        result.current.select(id);
      });
    },
    setThere: (isThere: boolean) => {
      act(() => {
        result.current.setThere(isThere);
      });
    },
    selected: () => result.current.selected,
    asked,
  };
}

describe('useSteps', () => {
  it('goes on while the map draws', () => {
    const map = aMap([3, 5, 9]);
    const walk = walkOn(map);
    expect(walk.step()).toBe(3);
    map.seen = null;
    expect(walk.step()).toBe(5);
    // fewer are seen from near
    map.seen = [5];
    expect(walk.step()).toBe(9);
    expect(walk.step(-1)).toBe(5);
  });

  it('goes on while the map is not brought to what is selected', () => {
    const map = aMap([3, 5, 9]);
    const walk = walkOn(map);
    walk.step();
    map.seen = [77];
    walk.setThere(false);
    expect(walk.step()).toBe(5);
  });

  it('begins anew where the map was moved away, or something else selected', () => {
    const map = aMap([3, 5, 9]);
    const walk = walkOn(map);
    walk.step();
    map.seen = [20, 21];
    expect(walk.step()).toBe(20);
    map.seen = [20, 21, 22];
    walk.select(21);
    expect(walk.step()).toBe(22);
    walk.select(null);
    expect(walk.step()).toBe(20);
  });

  it('goes on from where it was going, before the page shows it', () => {
    const map = aMap([3, 5, 9]);
    const walk = walkOn(map, null, false);
    walk.step();
    map.seen = [77];
    walk.step();
    walk.step();
    walk.step(-1);
    expect(walk.asked).toEqual([3, 5, 9, 5]);
    // somebody else's choice ends it
    walk.select(77);
    walk.step(-1);
    expect(walk.asked.at(-1)).toBe(77);
  });

  it('keeps a step while what is selected is not there', () => {
    const map = aMap([3, 5]);
    const walk = walkOn(map, 3);
    walk.setThere(false);
    expect(walk.step()).toBe(3);
    act(() => {
      map.rest([3, 5]);
    });
    expect(walk.selected()).toBe(3);
    walk.setThere(true);
    act(() => {
      map.rest([3, 5]);
    });
    expect(walk.selected()).toBe(5);
  });

  it('keeps one step until the map is there', () => {
    const map = aMap(null);
    const walk = walkOn(map);
    expect(walk.step()).toBeNull();
    expect(walk.step(-1)).toBeNull();
    act(() => {
      map.rest([3, 5]);
    });
    expect(walk.selected()).toBe(5);
    act(() => {
      map.rest([3, 5]);
    });
    expect(walk.selected()).toBe(5);
  });
});
