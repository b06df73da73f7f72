import type { Transaction } from 'sequelize';
import type { z } from 'zod';
import { runInputs } from '../../shared/assessment/run-inputs.ts';
import { METHOD_VERSION } from '../../shared/method-version.ts';
import type { newRunSchema } from '../../shared/schemas/runs.ts';
import { AppError } from '../errors.ts';
import { Building } from '../models/building.ts';
import { newestRules } from '../models/newest-rules.ts';
import { snapshotRegister } from '../models/run-inputs.ts';
import { RunState } from '../models/run-state.ts';
import { Run } from '../models/run.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockAlignment } from './lock-alignment.ts';
import { recordChange } from './record-change.ts';
import { refusingBadDesign } from './refuse-bad-design.ts';

async function countBuildings(schemeId: string, transaction: Transaction): Promise<number> {
  const buildings = await Building.count({ where: { schemeId, removedAt: null }, transaction });
  if (buildings > 0) return buildings;
  const message = 'There are no buildings yet. Bring in footprints first.';
  throw new AppError('invalid-input', message);
}

async function nextNumber(schemeId: string, transaction: Transaction): Promise<number> {
  const last: number | null = await Run.max('number', { where: { schemeId }, transaction });
  return (last ?? 0) + 1;
}

/**
 * Starts a run of an option over the register as it is now. What it goes by is kept with it, so that what
 * is changed meanwhile, or by another run, does not touch it.
 */
export async function startRun(
  { database, runs }: Pick<Services, 'database' | 'runs'>,
  by: Pick<Actor, 'id'> | null,
  scheme: Scheme,
  { alignmentId, alignmentVersion }: z.infer<typeof newRunSchema>,
): Promise<Run> {
  return database.transaction(async (transaction) => {
    const option = await lockAlignment(scheme, alignmentId, transaction);
    if (option.version !== alignmentVersion) throw new AppError('conflict');
    const { version: rulesVersion, rules } = await newestRules(scheme.id, transaction);
    refusingBadDesign(() => runInputs(option.design, rules));
    const run = await Run.create(
      {
        schemeId: scheme.id,
        number: await nextNumber(scheme.id, transaction),
        alignmentId,
        alignmentVersion,
        optionName: option.name,
        design: option.design,
        rulesVersion,
        rules,
        methodVersion: METHOD_VERSION,
        registerVersion: scheme.registerVersion,
        buildings: await countBuildings(scheme.id, transaction),
        startedBy: by?.id ?? null,
      },
      { transaction },
    );
    const runId = run.id;
    await RunState.create({ runId, state: 'planning' }, { transaction });
    await snapshotRegister(database, { runId, schemeId: scheme.id }, transaction);
    const subject = { kind: 'run', id: runId };
    const after = { number: run.number, option: option.name, version: alignmentVersion };
    const change = { by, schemeId: scheme.id, action: 'start run', subject, after };
    await recordChange(change, transaction);
    const steps = [{ kind: 'plan', runId } as const, { kind: 'contours', runId } as const];
    await runs.send(steps, transaction);
    return run;
  });
}
