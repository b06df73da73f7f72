import { evaluate } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { assessWall } from '../../../shared/assessment/assess-wall.ts';
import { workingOfWall } from '../../../shared/assessment/working-of-wall.ts';
import { REFERENCES } from '../../../shared/references.ts';
import type { WorkingLine } from '../../../shared/working.ts';
import { bendOf } from '../../support/arcs.ts';
import { aDrive, aWall, someRules } from '../../support/builders.ts';
import { groundModel } from '../../../shared/ground/ground-model.ts';
import { chordsOf } from '../../support/sink-path.ts';
import type { Scheme } from '../../support/wall-against-oracle.ts';
import { certain } from '../../../shared/numerics/range.ts';

const rules = someRules();
const closed = { faceShare: 0.275 };
const bend = aDrive({ axis: chordsOf(bendOf(300, 0.03), 5) });
const twin = aDrive({ name: 'B', axis: [[-500, 16, -22], [500, 16, -22]], laterFactor: 1.3 }); // prettier-ignore
/** Where the bend passes half-way. */
const [E, N] = [300 * Math.cos(1.1), 300 * Math.sin(1.1)];
const inBend = aWall({ from: [E + 2, N], to: [E + 30, N + 9], foundingLevel: -2 });

const cases: [string, Scheme, ReturnType<typeof aWall>][] = [
  ['a straight drive', { drives: [aDrive()], rules }, aWall()],
  ['wholly hogging', { drives: [aDrive()], rules }, aWall({ from: [0, 12], to: [0, 22] })],
  ['wholly sagging', { drives: [aDrive()], rules }, aWall({ from: [0, -6], to: [0, 7] })],
  ['twin drives, the later increased', { drives: [aDrive(), twin], rules }, aWall({ from: [0, -9], to: [9, 40] })],
  ['a bend on a gradient', { drives: [bend], rules }, inBend],
  ['the deep focus', { drives: [bend], rules: someRules({ focus: 'deep' }) }, inBend],
  ['an open face', { drives: [aDrive()], rules, faces: [495] }, aWall({ from: [-20, 3], to: [15, 6] })],
  ['a closed face', { drives: [{ ...bend, ...closed }, twin], rules, faces: [275, 400] }, inBend],
  ['constant K in sand', { drives: [aDrive({ troughWidth: certain(0.3) })], rules: someRules({ depth: { kind: 'constant' } }) }, aWall({ foundingLevel: -3 })],
  ["O'Reilly and New's clay", { drives: [bend], rules: someRules({ depth: { kind: 'oreilly-new-clay' } }) }, inBend],
  ["O'Reilly and New's sand", { drives: [bend], rules: someRules({ depth: { kind: 'oreilly-new-sand' } }) }, inBend],
  ['layers', { drives: [bend], rules: someRules({ depth: { kind: 'layered', layers: [{ baseLevel: -8, troughWidth: certain(0.3) }, { baseLevel: -60, troughWidth: certain(0.5) }] } }) }, inBend],
  ['peak strain without compression', { drives: [aDrive()], rules: someRules({ horizontalStrain: 'peak', compression: 'zero' }) }, aWall()],
  ['a wall not affected', { drives: [aDrive()], rules }, aWall({ from: [0, 60], to: [0, 90] })],
  ['a wall that no drive reaches', { drives: [aDrive()], rules }, aWall({ from: [0, 900], to: [0, 910] })],
  ['a drive that loses nothing', { drives: [aDrive({ volumeLoss: certain(0) })], rules }, aWall()],
]; // prettier-ignore

function workingOf({ drives, faces = [], rules: own }: Scheme, wall: ReturnType<typeof aWall>) {
  return workingOfWall(groundModel(drives, own), wall, own, faces);
}

/** What mathjs makes of a line. */
function recalculated({ expression, inputs }: WorkingLine): number {
  const result: unknown = evaluate(expression, { ...inputs });
  return typeof result === 'number' ? result : NaN;
}

describe('workingOfWall', () => {
  it.each(cases)('%s: every line is its formula by mathjs', (_, scheme, wall) => {
    const { sections } = workingOf(scheme, wall);
    const lines = sections.flatMap((section) => section.lines);
    expect(lines.length).toBeGreaterThan(4);
    for (const line of lines) {
      // the kernel's table is good to 1e-11 of the largest value of a part; where a sum of parts all
      // but cancels the last digits of its terms, at most 0.1, are left
      const off = Math.abs(recalculated(line) - line.value);
      const message = `${line.symbol} = ${line.expression} with ${JSON.stringify(line.inputs)}`;
      expect(off, message).toBeLessThanOrEqual(1e-9 * Math.abs(line.value) + 1e-17);
    }
  });

  it.each(cases)('%s: figures are carried from line to line', (_, scheme, wall) => {
    for (const { lines } of workingOf(scheme, wall).sections) {
      const before = new Map<string, number>();
      for (const { symbol, inputs, value } of lines) {
        for (const [name, number] of Object.entries(inputs)) {
          const carried = before.get(name) ?? number;
          // a width is packed as its inverse, a level found again along its piece
          expect(Math.abs(number - carried)).toBeLessThanOrEqual(1e-12 * Math.abs(carried));
        }
        before.set(symbol, value);
      }
    }
  });

  it.each(cases)('%s: ends in the result of assessWall', (_, scheme, wall) => {
    const { result, sections } = workingOf(scheme, wall);
    const { drives, faces = [], rules: own } = scheme;
    expect(result).toEqual(assessWall(groundModel(drives, own), wall, own, faces));
    const last = sections.at(-1)?.lines ?? [];
    expect(last.find(({ symbol }) => symbol === 'category')?.value).toBe(result.category);
    const strains = sections.flatMap(({ lines }) => lines.filter(({ symbol }) => symbol === 'ε'));
    expect(strains.map(({ value }) => value)).toEqual(result.zones.map(({ strain }) => strain));
  });

  it.each(cases)('%s: names a source that is listed and what each input is', (_, scheme, wall) => {
    for (const { lines } of workingOf(scheme, wall).sections) {
      for (const { reference, inputs, meaning } of lines) {
        expect(REFERENCES).toHaveProperty(reference);
        expect(meaning).not.toBe('');
        expect(Object.values(inputs).every(Number.isFinite)).toBe(true);
      }
    }
  });

  it('opens up each drive at both ends and the farthest point of the governing zone', () => {
    const { sections, result } = workingOf({ drives: [aDrive(), twin], rules }, aWall());
    const titles = sections.map(({ title }) => title);
    expect(titles.filter((title) => title.startsWith('Drive "A"'))).toHaveLength(3);
    expect(titles.filter((title) => title.startsWith('Drive "B"'))).toHaveLength(3);
    expect(titles.filter((title) => title.startsWith('All drives'))).toHaveLength(3);
    expect(titles.filter((title) => title.startsWith('Zone '))).toHaveLength(result.zones.length);
    expect(titles.filter((title) => title.endsWith('which governs'))).toHaveLength(1);
  });
});
