/** Every way in which the server refuses, with its status and what people read. */
const ERRORS = {
  'not-signed-in': [401, 'Please sign in.'],
  'wrong-credentials': [401, 'E-mail or password is not right.'],
  'not-allowed': [403, 'You may not do this.'],
  'csrf-failed': [403, 'This page is out of date. Load it again and repeat the step.'],
  'not-found': [404, 'There is nothing here, or it is not yours to see.'],
  conflict: [409, 'Somebody else changed this meanwhile. Load it again to see their change.'],
  'already-exists': [409, 'This is there already.'],
  archived: [409, 'This scheme is archived and only read. Bring it back before you change it.'],
  'link-spent': [410, 'This link has been used or is too old. Ask for a new one.'],
  'too-large': [413, 'This is too large.'],
  'wrong-content-type': [415, 'This was sent in a form that is not taken here.'],
  unreadable: [422, 'This could not be read.'],
  'invalid-input': [422, 'Something in the form is not right.'],
  'too-many-requests': [429, 'Too many tries. Wait a few minutes.'],
  internal: [500, 'Something failed on our side. Nothing was changed. Try again.'],
} as const;

export type ErrorCode = keyof typeof ERRORS;

export function isErrorCode(value: unknown): value is ErrorCode {
  return typeof value === 'string' && Object.hasOwn(ERRORS, value);
}

/** A fault of one field: where, as `rules.cutoff` or `email`, and what to do. */
export type FieldFault = { readonly path: string; readonly message: string };

/** A refusal: `code` for programs, `message` for people, `fields` where a form is at fault. */
export class AppError extends Error {
  readonly code: ErrorCode;
  readonly status: number;
  readonly fields: readonly FieldFault[];

  constructor(code: ErrorCode, message?: string, fields: readonly FieldFault[] = []) {
    super(message ?? ERRORS[code][1]);
    this.name = 'AppError';
    this.code = code;
    this.status = ERRORS[code][0];
    this.fields = fields;
  }
}
