import { z } from 'zod';

/** What is done of a run at once; each can be repeated and leaves the same. */
export const runStepSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('plan'), runId: z.uuid() }),
  z.object({ kind: z.literal('contours'), runId: z.uuid() }),
  z.object({ kind: z.literal('chunk'), runId: z.uuid(), chunk: z.number() }),
  z.object({ kind: z.literal('marks'), runId: z.uuid() }),
]);

export type RunStep = z.infer<typeof runStepSchema>;
