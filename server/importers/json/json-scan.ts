import { AppError } from '../../errors.ts';
import { jsonRefusal, spanRefusal } from './json-refusal.ts';
import type { Span } from './span.ts';

export type Member = Span & { readonly key: string };

const DEEPEST = 100;
const [QUOTE, BACKSLASH, COMMA, COLON] = [0x22, 0x5c, 0x2c, 0x3a];
const [OPEN_LIST, CLOSE_LIST, OPEN_OBJECT, CLOSE_OBJECT] = [0x5b, 0x5d, 0x7b, 0x7d];
const END_EARLY = 'the text ends too early';

function isWhite(byte: number | undefined): boolean {
  return byte === 0x20 || byte === 0x0a || byte === 0x0d || byte === 0x09;
}

export function skipWhite(bytes: Buffer, start: number): number {
  let at = start;
  while (isWhite(bytes[at])) at += 1;
  return at;
}

/** The end of a text in quotes that begins at `start`. */
function textEnd(bytes: Buffer, start: number): number {
  let at = start + 1;
  while (at < bytes.length && bytes[at] !== QUOTE) at += bytes[at] === BACKSLASH ? 2 : 1;
  if (at >= bytes.length) throw jsonRefusal(bytes, bytes.length, END_EARLY);
  return at + 1;
}

/** The end of a list or object that begins at `start`; nesting costs no stack. */
function nestedEnd(bytes: Buffer, start: number): number {
  let depth = 0;
  for (let at = start; at < bytes.length; at += 1) {
    const byte = bytes[at];
    if (byte === QUOTE) at = textEnd(bytes, at) - 1;
    else if (byte === OPEN_LIST || byte === OPEN_OBJECT) {
      depth += 1;
      if (depth > DEEPEST) {
        throw new AppError('unreadable', `The file is nested more than ${DEEPEST} deep.`);
      }
    } else if (byte === CLOSE_LIST || byte === CLOSE_OBJECT) {
      depth -= 1;
      if (depth === 0) return at + 1;
    }
  }
  throw jsonRefusal(bytes, bytes.length, END_EARLY);
}

function valueEnd(bytes: Buffer, start: number): number {
  const first = bytes[start];
  if (first === undefined) throw jsonRefusal(bytes, start, END_EARLY);
  if (first === QUOTE) return textEnd(bytes, start);
  if (first === OPEN_LIST || first === OPEN_OBJECT) return nestedEnd(bytes, start);
  let at = start;
  const ends = [COMMA, CLOSE_LIST, CLOSE_OBJECT];
  while (at < bytes.length && !isWhite(bytes[at]) && !ends.includes(bytes[at] ?? 0)) at += 1;
  if (at === start) throw jsonRefusal(bytes, at, 'a value is missing');
  return at;
}

/** Where a value stands that begins at `start`, which may be white. */
export function valueAt(bytes: Buffer, start: number): Span {
  const at = skipWhite(bytes, start);
  return { start: at, end: valueEnd(bytes, at) };
}

/** Parses one value. */
export function parseSpan(bytes: Buffer, { start, end }: Span): unknown {
  try {
    return JSON.parse(bytes.toString('utf8', start, end));
  } catch (error) {
    throw spanRefusal(bytes, { start, end }, error);
  }
}

export function isList(bytes: Buffer, start: number): boolean {
  return bytes[start] === OPEN_LIST;
}

export function isObject(bytes: Buffer, start: number): boolean {
  return bytes[start] === OPEN_OBJECT;
}

/** Goes from one entry of a list or object to the next, until it is closed. */
function* entries<T extends Span>(
  bytes: Buffer,
  start: number,
  close: number,
  entryAt: (at: number) => T,
): Generator<T, void> {
  let at = skipWhite(bytes, start + 1);
  if (bytes[at] === close) return;
  for (;;) {
    const entry = entryAt(at);
    yield entry;
    at = skipWhite(bytes, entry.end);
    if (bytes[at] === close) return;
    if (at >= bytes.length) throw jsonRefusal(bytes, at, END_EARLY);
    if (bytes[at] !== COMMA) throw jsonRefusal(bytes, at, 'a comma is missing');
    at = skipWhite(bytes, at + 1);
  }
}

/** The elements of the list that begins at `start`, none of them parsed. */
export function elements(bytes: Buffer, { start }: Pick<Span, 'start'>): Generator<Span, void> {
  return entries(bytes, start, CLOSE_LIST, (at) => valueAt(bytes, at));
}

/** The members of the object that begins at `start`, none of them parsed. */
export function members(bytes: Buffer, { start }: Pick<Span, 'start'>): Generator<Member, void> {
  return entries(bytes, start, CLOSE_OBJECT, (at) => {
    if (bytes[at] !== QUOTE) throw jsonRefusal(bytes, at, 'a name in quotes is missing');
    const key = { start: at, end: textEnd(bytes, at) };
    const colon = skipWhite(bytes, key.end);
    if (bytes[colon] !== COLON) throw jsonRefusal(bytes, colon, 'a colon is missing');
    return { key: String(parseSpan(bytes, key)), ...valueAt(bytes, colon + 1) };
  });
}
