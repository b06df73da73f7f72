import type { Sequelize } from 'sequelize';

/** What is done of an import beside answering requests. */
export type ImportJob = { readonly importId: string; readonly schemeId: string } & (
  | {
      readonly kind: 'read';
      /** On disk; removed when it is read, unless another of its layers may be wanted. */
      readonly file: string;
      /** Which of its layers; where it is left out, the likeliest. */
      readonly layer?: string;
    }
  | { readonly kind: 'check' }
  | {
      readonly kind: 'take over';
      /** Who confirmed. */
      readonly personId: string;
    }
);

/** A print that is to be drawn. */
export type PrintJob = {
  readonly kind: 'print';
  readonly printId: string;
  readonly schemeId: string;
  /** Where it is kept once it is whole. */
  readonly file: string;
};

/** What is done beside answering requests. */
export type Job = ImportJob | PrintJob;

/** Jobs of a trade wait for each other, and not for those of another. */
export type Trade = 'import' | 'print';

export function tradeOf({ kind }: Job): Trade {
  return kind === 'print' ? 'print' : 'import';
}

/** The import or the print that a job is of. */
export function subjectOf(job: Job): string {
  return job.kind === 'print' ? job.printId : job.importId;
}

/** What a job works with, in a thread of its own or beside others. */
export type JobTools = {
  readonly database: Sequelize;
  /** Aborted when the job is to stop. */
  readonly signal: AbortSignal;
  /** Told when reading is over and checking begins. */
  readonly onChecking: () => void;
};
