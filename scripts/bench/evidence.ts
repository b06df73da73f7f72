import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { askPrint } from '../../server/commands/ask-print.ts';
import { keptPrint } from '../../server/commands/kept-print.ts';
import type { FoundPrint } from '../../server/models/prints.ts';
import { Run } from '../../server/models/run.ts';
import type { Scheme } from '../../server/models/scheme.ts';
import type { Services } from '../../server/services.ts';
import { plannedSheets } from '../../shared/evidence/planned-sheets.ts';
import type { DrawnLayout } from '../../shared/schemas/evidence.ts';

const SHEETS = 60;

const STRIP: Extract<DrawnLayout, { kind: 'strip' }> = {
  kind: 'strip',
  paper: 'A3',
  denominator: 500,
  fields: {
    ...{ title: 'Strip', subtitle: '', number: '', prepared: '', checked: '', approved: '' },
    ...{ issued: '', revisions: [] },
  },
  ...{ from: 0, to: null, overlap: 10 },
  content: { shows: 'central', names: 'references', contours: true, line: true, background: true },
};

/** A strip of about as many sheets as are wanted, as far along the line as it takes. */
function stripOf({ design }: Run): DrawnLayout {
  const last = plannedSheets(STRIP, design)[SHEETS - 1]?.what;
  const to = last?.kind === 'plan' ? (last.stretch?.[1] ?? null) : null;
  return { ...STRIP, to };
}

async function untilPrinted(
  { database }: Services,
  scheme: Scheme,
  id: string,
): Promise<{ readonly print: FoundPrint; readonly peak: number }> {
  let peak = 0;
  for (;;) {
    const print = await keptPrint(database, scheme.id, id);
    peak = Math.max(peak, process.memoryUsage().rss);
    if (print.state === 'done') return { print, peak };
    if (print.state === 'failed') throw new Error(print.fault ?? print.state);
    await sleep(50);
  }
}

/** Prints what a series of plans along the line takes; the peak of memory is of the whole process. */
export async function benchPrint(services: Services, scheme: Scheme, runId: string): Promise<void> {
  const folder = mkdtempSync(path.join(tmpdir(), 'groundsill-bench-prints-'));
  try {
    const run = await Run.findByPk(runId, { rejectOnEmpty: true });
    const [before, start] = [process.memoryUsage().rss, performance.now()];
    const tools = { ...services, env: { ...services.env, PRINTS_FOLDER: folder } };
    const asked = { runId, name: 'Strip', layout: stripOf(run) };
    const id = await askPrint(tools, null, scheme, asked);
    const { print, peak } = await untilPrinted(services, scheme, id);
    const seconds = (performance.now() - start) / 1000;
    const [size, memory, rest] = [print.bytes ?? 0, peak, before].map((one) => (one / 1e6).toFixed(0)); // prettier-ignore
    console.log(`print: ${print.sheets ?? 0} A3 sheets in ${seconds.toFixed(1)} s, ${size ?? ''} MB; process ${memory ?? ''} MB at most, ${rest ?? ''} MB before`); // prettier-ignore
  } finally {
    rmSync(folder, { recursive: true });
  }
}
