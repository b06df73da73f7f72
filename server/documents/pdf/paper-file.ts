import { once } from 'node:events';
import { createWriteStream } from 'node:fs';
import { finished } from 'node:stream/promises';
import { setImmediate } from 'node:timers/promises';
import { openPaper, type Paper, type PaperFacts } from './paper.ts';

/** A document that grows page by page in a file. */
export type PaperFile = {
  readonly paper: Paper;
  /** Lets what was drawn so far go on to the file, and waits while it is behind. */
  readonly settle: () => Promise<void>;
  /** Ends the document once all of it is on the disk. */
  readonly close: () => Promise<void>;
  /** Leaves what there is; resolves when the file is closed and may be removed. */
  readonly giveUp: () => Promise<void>;
};

/** Opens a document in a new file; each page leaves memory when the next one comes. */
export function openPaperFile(file: string, facts: PaperFacts): PaperFile {
  const paper = openPaper({ ...facts, isKept: false });
  const { doc } = paper;
  const stream = createWriteStream(file, { flags: 'wx', mode: 0o600, flush: true });
  const whole = finished(stream);
  // a fault is told to whoever waits for the end; until then nobody may be waiting
  whole.catch(() => undefined);
  doc.pipe(stream);
  return {
    paper,
    settle: async () => {
      if (stream.writableNeedDrain) await Promise.race([once(stream, 'drain'), whole]);
      // what the document holds goes on to the file between the turns
      await setImmediate();
    },
    close: async () => {
      doc.end();
      await whole;
    },
    giveUp: async () => {
      doc.unpipe(stream);
      stream.destroy();
      await whole.catch(() => undefined);
    },
  };
}
