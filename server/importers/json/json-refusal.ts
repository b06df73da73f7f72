import { jsonFault } from '../../../shared/schemas/json-fault.ts';
import { AppError } from '../../errors.ts';
import type { Span } from './span.ts';

const NEWLINE = 0x0a;
/** Finding the path of a fault walks all of the text before it. */
const MOST_WALKED = 16 * 1024 * 1024;

function placeOf(bytes: Buffer, at: number): string {
  let [line, begin] = [1, 0];
  for (let next = bytes.indexOf(NEWLINE); next >= 0 && next < at;) {
    [line, begin] = [line + 1, next + 1];
    next = bytes.indexOf(NEWLINE, begin);
  }
  return `line ${line}, column ${bytes.toString('utf8', begin, Math.min(at, begin + 1e7)).length + 1}`;
}

/** A refusal of what is no JSON, by its place. */
export function jsonRefusal(bytes: Buffer, at: number, what: string): AppError {
  return new AppError('unreadable', `The file is not JSON: ${what} (${placeOf(bytes, at)}).`);
}

/** A refusal of a value that could not be parsed, by its path where the walk there is not too long. */
export function spanRefusal(bytes: Buffer, { start, end }: Span, error: unknown): AppError {
  const words = jsonFault(bytes.toString('utf8', end > MOST_WALKED ? start : 0, end));
  if (!words.includes('ends too early') && end <= MOST_WALKED) {
    return new AppError('unreadable', `The file is not JSON. ${words}`);
  }
  const position = Number(/at position (\d+)/.exec(String(error))?.[1] ?? 0);
  const found = /: (".*" is not a value that JSON can hold)/.exec(words)?.[1];
  return jsonRefusal(bytes, start + position, found ?? 'something is missing or too much');
}
