import { AppError } from '../errors.ts';

const DEEPEST = 100;
/** Every list and object costs much more memory than its two letters. */
const MOST_OPENED = 3_000_000;

const [QUOTE, BACKSLASH] = [0x22, 0x5c];
const OPENS = new Set([0x5b, 0x7b]);
const CLOSES = new Set([0x5d, 0x7d]);

/** Where a text in quotes ends that begins at `start`. */
function endOfText(bytes: Buffer, start: number): number {
  let at = start + 1;
  while (at < bytes.length && bytes[at] !== QUOTE) at += bytes[at] === BACKSLASH ? 2 : 1;
  return at;
}

/** Refuses JSON that is nested so deep, or holds so many lists, that reading it would use up the memory. */
export function checkJson(bytes: Buffer): void {
  let [depth, opened] = [0, 0];
  for (let at = 0; at < bytes.length; at += 1) {
    const byte = bytes[at] ?? 0;
    if (byte === QUOTE) at = endOfText(bytes, at);
    else if (OPENS.has(byte)) {
      depth += 1;
      opened += 1;
      if (depth > DEEPEST) {
        throw new AppError('unreadable', `The file is nested more than ${DEEPEST} deep.`);
      }
      if (opened > MOST_OPENED) throw new AppError('too-large', 'The file holds too many points.');
    } else if (CLOSES.has(byte)) depth -= 1;
  }
}
