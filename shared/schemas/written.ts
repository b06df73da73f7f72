import { z } from 'zod';

/**
 * Words of one line that somebody writes; what stands around them is left off.
 *
 * Units: letters. Valid: no line breaks nor other control characters. Source: [own].
 */
export function writtenLine(longest: number) {
  return z
    .string()
    .trim()
    .max(longest, `At most ${longest} letters.`)
    .regex(/^\P{Cc}*$/u, 'Leave out line breaks and other control characters.');
}

/**
 * Words of several lines that somebody writes; what stands around them is left off.
 *
 * Units: letters. Valid: any letters but the one that databases refuse. Source: [own].
 */
export function writtenText(longest: number) {
  return z
    .string()
    .trim()
    .max(longest, `At most ${longest} letters.`)
    .regex(/^[^\0]*$/, 'Write letters only.');
}
