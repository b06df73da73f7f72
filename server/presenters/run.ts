import {
  runDetailSchema,
  runSchema,
  type RunAnswer,
  type RunCounts,
  type RunDetail,
} from '../../shared/schemas/runs.ts';
import type { FoundRun } from '../models/find-runs.ts';
import type { Run } from '../models/run.ts';

/** What leaves the server of a run. */
export function presentRun(run: FoundRun): RunAnswer {
  return runSchema.parse({
    id: run.id,
    number: run.number,
    option: { id: run.alignmentId, name: run.optionName, version: run.alignmentVersion },
    state: run.state,
    done: run.done,
    buildings: run.buildings,
    fault: run.fault,
    startedAt: run.startedAt.toISOString(),
    startedBy: run.startedBy,
    endedAt: run.endedAt?.toISOString() ?? null,
    methodVersion: run.methodVersion,
    rulesVersion: run.rulesVersion,
    registerVersion: run.registerVersion,
    since: {
      register: run.registerChanged,
      option: run.optionChanged,
      rules: run.rulesChanged,
    },
    isShown: run.isShown,
  });
}

/** The same with what was put in and how many buildings stand where. */
export function presentRunDetail(
  run: FoundRun,
  { design, rules }: Pick<Run, 'design' | 'rules'>,
  counts: RunCounts | null,
): RunDetail {
  return runDetailSchema.parse({ ...presentRun(run), design, rules, counts });
}
