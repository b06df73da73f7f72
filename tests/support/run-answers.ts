import type { Funnel } from '../../shared/schemas/decision-answers.ts';
import type { RunAnswer, RunDetail } from '../../shared/schemas/runs.ts';
import type { RunMap } from '../../shared/schemas/run-map.ts';
import { defaultRules } from '../../server/commands/default-rules.ts';
import { anId } from './answers.ts';
import { aDesign } from './designs.ts';

/** The first run of an option, complete and shown. */
export function aRunAnswer(overrides: Partial<RunAnswer> = {}): RunAnswer {
  return {
    id: anId(60),
    number: 1,
    option: { id: anId(50), name: 'A', version: 1 },
    state: 'complete',
    done: 200,
    buildings: 200,
    fault: null,
    startedAt: '2026-12-01T14:02:00.000Z',
    startedBy: 'Ada',
    endedAt: '2026-12-01T14:03:00.000Z',
    methodVersion: '1.1.0',
    rulesVersion: 1,
    registerVersion: 1,
    since: { register: false, option: false, rules: false },
    isShown: true,
    ...overrides,
  };
}

/** The same with what was put in and what was found. */
export function aRunDetail(overrides: Partial<RunDetail> = {}): RunDetail {
  return {
    ...aRunAnswer(),
    design: aDesign(),
    rules: defaultRules('2026-12-01'),
    counts: {
      stages: [195, 3, 2],
      low: [4, 1, 0, 0, 0],
      central: [2, 2, 1, 0, 0],
      high: [1, 1, 2, 1, 0],
      sensitive: 3,
      held: 1,
      assumed: 10,
      faults: 0,
    },
    ...overrides,
  };
}

/** Figures of four buildings: let go at once, let go later, and two that were held. */
export function aRunMap(): RunMap {
  return {
    ids: [1, 2, 3, 4],
    stage: [1, 2, 3, 3],
    low: [-1, 0, 1, 2],
    central: [-1, 0, 2, 3],
    high: [-1, 1, 2, 4],
    settlement: [0.0004, 0.004, 0.01, 0.06],
  };
}

const NONE_IN_STATES = {
  ...{ 'waiting for check': 0, returned: 0, 'to look at again': 0, decided: 0 },
} as const;

/** How many buildings of a run stand where on the assessors' list. */
export function aFunnel(runId: string): Funnel {
  return {
    runId,
    buildings: 200,
    stages: [
      {
        buildings: 195,
        standings: { ...NONE_IN_STATES, 'to decide': 190, 'waiting for check': 5 },
      },
      { buildings: 3, standings: { ...NONE_IN_STATES, 'to decide': 3 } },
      { buildings: 2, standings: { ...NONE_IN_STATES, 'to decide': 2 } },
    ],
    heldBy: [{ name: 'listed', count: 2, texts: ['listed'] }],
    kinds: [],
    mine: 4,
  };
}
