import type { z } from 'zod';
import type { runExportQuerySchema } from '../../shared/schemas/run-export.ts';
import { Run } from '../models/run.ts';
import { findCompleteRun } from '../runs/find-complete-run.ts';
import { sheetsOfDesign } from './about-design.ts';
import { aboutRun } from './about-run.ts';
import { exportedRun } from './exported-run.ts';
import { RUN_COLUMNS } from './run-columns.ts';
import { aboutFile, sendFile, type FileCall } from './send-file.ts';

type RunCall = FileCall & {
  readonly params: { readonly runId: string };
  readonly query: z.infer<typeof runExportQuerySchema>;
};

/** Sends all that a complete run found as a file, with what it went by. */
export async function sendRun(call: RunCall): Promise<void> {
  const { services, scheme, params, query } = call;
  const { format } = query;
  const found = await findCompleteRun(services.database, scheme.id, params.runId);
  const run = await Run.findByPk(found.id, { rejectOnEmpty: true });
  const about = [
    ...(await aboutFile(call)),
    ...(await aboutRun(scheme, found, run, format)),
  ] as const;
  await sendFile(
    call,
    { what: `run-${found.number}`, format },
    {
      title: 'Buildings',
      columns: RUN_COLUMNS,
      rows: exportedRun(services, scheme, found.id, format === 'geojson'),
      aboutTitle: 'Run',
      about,
      beside: sheetsOfDesign(run.design),
    },
  );
}
