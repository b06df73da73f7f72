import type { Response } from 'express';
import type { Sequelize } from 'sequelize';
import type { Scheme } from '../models/scheme.ts';
import { findCompleteRun } from '../runs/find-complete-run.ts';
import type { Services } from '../services.ts';

type RunCall = {
  readonly services: Services;
  readonly scheme: Scheme;
  readonly params: { readonly runId: string };
  readonly res: Response;
};

/** Answers with a large part of a complete run, made once: it never changes, so it may be kept for ever. */
export async function answerRunPart(
  { services, scheme, params, res }: RunCall,
  name: string,
  find: (database: Sequelize, runId: string) => Promise<string>,
): Promise<void> {
  const run = await findCompleteRun(services.database, scheme.id, params.runId);
  const make = async () => Buffer.from(await find(services.database, run.id));
  const part = await services.tiles.get(`run/${run.id}/${name}`, make);
  res.set('Cache-Control', 'private, max-age=31536000, immutable');
  res.type('application/json').send(part);
}
