import type { WorkingLine } from '../working.ts';
import { millimetresFromMetres } from '../units/millimetres-from-metres.ts';
import { percentFromRatio } from '../units/percent-from-ratio.ts';
import { formatSignificant } from './significant.ts';
import { sourceNote } from './source-note.ts';
import { SYMBOL_WORDS } from './symbol-words.ts';

const DIGITS = 5;
/** Under it, in metres, a length is a movement, which people read in millimetres. */
const SMALL_LENGTH = 0.2;
const IN_PER_CENT = /^(ε|DL$|V_L$)/;

/**
 * A figure as people read it, where that is another unit; null where it is the same.
 *
 * Units: as the line. Valid: any line. Source: [own].
 */
export function peoplesFigure({ symbol, value, unit }: WorkingLine): string | null {
  if (value === 0) return null;
  if (unit === 'm' && Math.abs(value) < SMALL_LENGTH) {
    return `${formatSignificant(millimetresFromMetres(value), DIGITS)}\u00a0mm`;
  }
  if (unit !== 'm/m') return null;
  if (IN_PER_CENT.test(symbol))
    return `${formatSignificant(percentFromRatio(value), DIGITS)}\u00a0%`;
  return `1 in ${formatSignificant(1 / Math.abs(value), 3)}`;
}

/**
 * What came out, with its unit.
 *
 * Units: as the line. Valid: any line. Source: [own].
 */
export function resultWords({ value, unit }: WorkingLine): string {
  const figure = formatSignificant(value, DIGITS);
  return unit === '' ? figure : `${figure}\u00a0${unit}`;
}

/**
 * Where a figure that is put into a line comes from: a line before it, or what was given.
 *
 * Units: none. Valid: any name. Source: [own].
 */
export function originOf(name: string, before: readonly WorkingLine[]): string {
  const line = before.findLast(({ symbol }) => symbol === name);
  return line?.meaning ?? SYMBOL_WORDS[name]?.meaning ?? 'given';
}

function lineText(line: WorkingLine): string {
  const { symbol, expression, inputs, meaning, reference } = line;
  const given = Object.entries(inputs).map(([name, value]) => `  ${name} = ${value}`);
  const people = peoplesFigure(line);
  return [
    `${symbol} = ${expression}   ${meaning}`,
    ...given,
    `  ${symbol} = ${line.value} ${line.unit}${people === null ? '' : ` (${people})`}`.trimEnd(),
    `  Source: ${sourceNote(reference)}`,
  ].join('\n');
}

/**
 * A working as plain text, in full figures, to be put into a letter or a calculator.
 *
 * Units: as the lines. Valid: any lines. Source: [own].
 */
export function workingText(title: string, lines: readonly WorkingLine[]): string {
  return [title, ...lines.map(lineText)].join('\n\n');
}
