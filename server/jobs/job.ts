import type { Sequelize } from 'sequelize';

/** What is done of an import beside answering requests. */
export type Job = { readonly importId: string; readonly schemeId: string } & (
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

/** What a job works with, in a thread of its own or beside others. */
export type JobTools = {
  readonly database: Sequelize;
  /** Aborted when the job is to stop. */
  readonly signal: AbortSignal;
  /** Told when reading is over and checking begins. */
  readonly onChecking: () => void;
};
