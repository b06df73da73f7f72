import { z } from 'zod';

const refusal = z.object({
  error: z.object({
    code: z.string(),
    message: z.string(),
    fields: z.array(z.object({ path: z.string(), message: z.string() })).default([]),
  }),
});

export type FieldFault = { readonly path: string; readonly message: string };

/** Why a request was not answered: `code` for programs, `message` for people, `fields` for forms. */
export class ApiError extends Error {
  readonly code: string;
  readonly status: number;
  readonly fields: readonly FieldFault[];

  constructor(code: string, message: string, status = 0, fields: readonly FieldFault[] = []) {
    super(message);
    this.name = 'ApiError';
    this.code = code;
    this.status = status;
    this.fields = fields;
  }
}

/** The error that the server's refusal stands for. */
export function refusedError(status: number, answer: unknown): ApiError {
  const parsed = refusal.safeParse(answer);
  if (!parsed.success) {
    return new ApiError(
      'unexpected-answer',
      'The server gave an answer that makes no sense.',
      status,
    );
  }
  const { code, message, fields } = parsed.data.error;
  return new ApiError(code, message, status, fields);
}

/** The error of a request that came to no server. */
export function unreachableError(): ApiError {
  return new ApiError('unreachable', 'The server cannot be reached.');
}

/** Whether something thrown is a refusal of this kind. */
export function isRefusal(error: unknown, ...codes: readonly string[]): error is ApiError {
  return error instanceof ApiError && codes.includes(error.code);
}
