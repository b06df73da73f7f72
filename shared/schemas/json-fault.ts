import { pathText } from './path-text.ts';

type Frame = { kind: 'object' | 'array'; index: number; key: string; expects: 'key' | 'value' };

const WHITE = /[\s]/;
const TOKEN = /(?:"(?:[^"\\]|\\.)*"|-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?|true|false|null)/y;

function lineAndColumn(text: string, position: number): string {
  const before = text.slice(0, position).split('\n');
  return `line ${before.length}, column ${(before.at(-1)?.length ?? 0) + 1}`;
}

function pathOf(frames: readonly Frame[]): string {
  return pathText(frames.map((frame) => (frame.kind === 'array' ? frame.index : frame.key)));
}

function step(frames: Frame[], text: string, position: number): number {
  const frame = frames.at(-1);
  const character = text.charAt(position);
  if (character === '{' || character === '[') {
    const kind = character === '{' ? 'object' : 'array';
    frames.push({ kind, index: 0, key: '', expects: kind === 'object' ? 'key' : 'value' });
    return position + 1;
  }
  if (character === '}' || character === ']') {
    frames.pop();
    return position + 1;
  }
  if (character === ',' && frame !== undefined) {
    frame.index += 1;
    frame.expects = frame.kind === 'object' ? 'key' : 'value';
    return position + 1;
  }
  if (character === ':' && frame !== undefined) {
    frame.expects = 'value';
    return position + 1;
  }
  TOKEN.lastIndex = position;
  const token = TOKEN.exec(text)?.[0];
  if (token === undefined) return -1;
  const next = text.charAt(position + token.length);
  if (next !== '' && !WHITE.test(next) && !',:]}'.includes(next)) return -1;
  if (frame?.kind === 'object' && frame.expects === 'key') frame.key = token.slice(1, -1);
  return position + token.length;
}

/**
 * Where a text stops being JSON, by path, line and column, with the word found there. JSON has no NaN
 * and no Infinity, and an engine's own message names no path.
 *
 * Units: none. Valid: a text that JSON.parse refuses; nesting costs no stack. Source: [own].
 */
export function jsonFault(text: string): string {
  const frames: Frame[] = [];
  let position = 0;
  while (position < text.length) {
    if (WHITE.test(text.charAt(position))) {
      position += 1;
      continue;
    }
    const next = step(frames, text, position);
    if (next < 0) break;
    position = next;
  }
  const word = /^[^\s,\]}]{1,30}/.exec(text.slice(position, position + 30))?.[0];
  const found =
    word === undefined ? 'the text ends too early' : `"${word}" is not a value that JSON can hold`;
  return `${pathOf(frames)}: ${found} (${lineAndColumn(text, position)})`;
}
