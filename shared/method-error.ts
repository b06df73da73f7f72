/**
 * Every way in which the method refuses an input, with what it means. A refusal is named, so that
 * callers compare codes and never texts.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const METHOD_ERRORS = {
  'no-sign-change': 'a root was asked for where there is none',
  'zero-length': 'two points that must differ are the same',
  'founding-above-ground': 'a wall is founded above its ground level',
  'below-crown-beside-drive': 'a wall is founded below the crown of a drive beside it',
  'trough-width-not-positive': 'the trough width rule gives no width at this depth',
  'bad-intervals': 'intervals along a drive overlap or run backwards',
  'bad-range': 'a range is not ordered low, central, high',
  'bad-table': 'a table has too few rows or its arguments do not grow',
  'outside-range': 'a number lies outside what the method can take',
} as const;

/**
 * The name of a refusal.
 *
 * Units: none. Valid: a key of METHOD_ERRORS. Source: [own].
 */
export type MethodErrorCode = keyof typeof METHOD_ERRORS;

/**
 * A refusal by the method: `code` for programs, `message` for people, and, where one field of the
 * input is at fault, which.
 *
 * Units: none. Valid: thrown by `shared/` only. Source: [own].
 */
export class MethodError extends Error {
  readonly code: MethodErrorCode;
  readonly field: string | undefined;

  constructor(code: MethodErrorCode, message: string, field?: string) {
    super(message);
    this.name = 'MethodError';
    this.code = code;
    this.field = field;
  }
}
