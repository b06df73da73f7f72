import { z } from 'zod';
import { isErrorCode, type ErrorCode } from '../errors.ts';

/** What a thread tells the server. */
export const threadMessageSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('checking') }),
  z.object({ kind: z.literal('done') }),
  z.object({
    kind: z.literal('refused'),
    code: z.custom<ErrorCode>(isErrorCode),
    message: z.string(),
  }),
  z.object({ kind: z.literal('failed'), stack: z.string() }),
]);

export type ThreadMessage = z.infer<typeof threadMessageSchema>;
