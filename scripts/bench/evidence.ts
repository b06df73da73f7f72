import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';
import { askPrint } from '../../server/commands/ask-print.ts';
import { keptPrint } from '../../server/commands/kept-print.ts';
import { PRINTERS } from '../../server/evidence/printers.ts';
import type { Printing } from '../../server/evidence/printing.ts';
import type { FoundPrint } from '../../server/models/prints.ts';
import { Run } from '../../server/models/run.ts';
import type { Scheme } from '../../server/models/scheme.ts';
import type { Services } from '../../server/services.ts';
import { plannedSheets } from '../../shared/evidence/planned-sheets.ts';
import type { DrawnLayout, EvidenceLayout } from '../../shared/schemas/evidence.ts';

const SHEETS = 60;

const STRIP: Extract<DrawnLayout, { kind: 'strip' }> = {
  kind: 'strip',
  paper: 'A3',
  denominator: 200,
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

const SCHEDULE: EvidenceLayout = {
  ...{ kind: 'schedule', paper: 'A3', rows: 'all' },
  fields: { ...STRIP.fields, title: 'Schedule' },
};

async function untilPrinted(
  { database }: Services,
  scheme: Scheme,
  id: string,
): Promise<FoundPrint> {
  for (;;) {
    const print = await keptPrint(database, scheme.id, id);
    if (print.state === 'done') return print;
    if (print.state === 'failed') throw new Error(print.fault ?? print.state);
    await sleep(50);
  }
}

setFlagsFromString('--expose-gc');
const sweep = runInNewContext('gc') as () => void;

/** What is held on the heap while a print is drawn, swept at each tenth of it, in MB. */
async function heldWhileDrawn(printing: Omit<Printing, 'onSheet'>): Promise<number[]> {
  const held: number[] = [];
  await PRINTERS[printing.print.layout.kind]({
    ...printing,
    onSheet: (done, sheets) => {
      if (done >= ((held.length + 1) * sheets) / 10) {
        sweep();
        held.push(process.memoryUsage().heapUsed / 1e6);
      }
      return Promise.resolve();
    },
  });
  return held;
}

async function benchLayout(
  services: Services,
  { scheme, runId, folder }: { scheme: Scheme; runId: string; folder: string },
  layout: EvidenceLayout,
): Promise<void> {
  const start = performance.now();
  const tools = { ...services, env: { ...services.env, PRINTS_FOLDER: folder } };
  const id = await askPrint(tools, null, scheme, { runId, name: 'A', layout });
  const print = await untilPrinted(services, scheme, id);
  const seconds = ((performance.now() - start) / 1000).toFixed(1);
  const megabytes = ((print.bytes ?? 0) / 1e6).toFixed(1);
  const file = path.join(folder, 'held.pdf');
  const held = await heldWhileDrawn({ database: services.database, scheme, print, file });
  rmSync(file);
  const words = held.map((one) => one.toFixed(0)).join(', ');
  console.log(`print: ${layout.kind}, ${print.sheets ?? 0} A3 sheets in ${seconds} s, ${megabytes} MB; holds at each tenth ${words} MB`); // prettier-ignore
}

/** Prints what a series of plans along the line and a schedule of the whole town take. */
export async function benchPrints(
  services: Services,
  scheme: Scheme,
  runId: string,
): Promise<void> {
  const folder = mkdtempSync(path.join(tmpdir(), 'groundsill-bench-prints-'));
  try {
    const run = await Run.findByPk(runId, { rejectOnEmpty: true });
    for (const layout of [stripOf(run), SCHEDULE]) {
      await benchLayout(services, { scheme, runId, folder }, layout);
    }
  } finally {
    rmSync(folder, { recursive: true });
  }
}
