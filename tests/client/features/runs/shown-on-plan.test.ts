// @vitest-environment node
import { describe, expect, it } from 'vitest';
import type { AlignmentAnswer } from '../../../../shared/schemas/alignments.ts';
import { NO_OPTION, shownOnPlan } from '../../../../src/features/runs/shown-on-plan.ts';
import { anId } from '../../../support/answers.ts';
import { aDesign } from '../../../support/designs.ts';
import { aRunAnswer } from '../../../support/run-answers.ts';

function option(n: number, name: string): AlignmentAnswer {
  const changed = { changedAt: '2026-12-01T10:00:00.000Z', changedBy: null };
  return { id: anId(n), name, version: 1, design: aDesign(), shafts: [], length: 1000, ...changed };
}

const [A, B] = [option(50, 'A'), option(51, 'B')];
const OF_B = { id: B.id, name: 'B', version: 1 };
const RUNS = [
  aRunAnswer({ id: anId(63), number: 3, state: 'running', isShown: false }),
  aRunAnswer({ id: anId(62), number: 2, option: OF_B }),
  aRunAnswer({ isShown: false }),
];
const NOTHING = { option: null, run: null };

function shown(named: { option?: string; run?: string }, runs = RUNS, options = [A, B]) {
  const { option: one, run, isNamed } = shownOnPlan({ ...NOTHING, ...named }, options, runs);
  return [one?.name, run?.number, isNamed];
}

describe('what the plan shows', () => {
  it('is the newest complete run with its option', () => {
    expect(shown({})).toEqual(['B', 2, false]);
  });

  it('is the first option while there is no run', () => {
    expect(shown({}, [])).toEqual(['A', undefined, false]);
  });

  it('is an option that is named with the newest run of it', () => {
    expect(shown({ option: A.id })).toEqual(['A', 1, false]);
    expect(shown({ option: NO_OPTION })).toEqual([undefined, undefined, false]);
  });

  it('is a run that is named, also where its option is gone', () => {
    expect(shown({ run: anId(60), option: B.id })).toEqual(['A', 1, true]);
    expect(shown({ run: anId(62) }, RUNS, [A])).toEqual([undefined, 2, true]);
  });

  it('is not a run that is not complete, nor one that is not there', () => {
    expect(shown({ run: anId(63) })).toEqual(['B', 2, false]);
    expect(shown({ run: 'nonsense' })).toEqual(['B', 2, false]);
  });
});
