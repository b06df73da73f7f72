import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import type { AlignmentDesign, Shafts } from '../../../shared/schemas/alignments.ts';
import type { ValueChange } from '../../lib/changes-between.ts';
import {
  boresWords,
  figure,
  laterWords,
  percent,
  rangeWords,
} from '../../../shared/presentation/design-words.ts';

type Option = {
  readonly name: string;
  readonly design: AlignmentDesign;
  readonly shafts: Shafts;
};

const PLACES = 3;

function plain(value: number): string {
  return figure(value, PLACES);
}

export function lengthOf(line: AlignmentDesign['line']): number {
  return line.slice(1).reduce((sum, to, k) => sum + planDistance(line[k] ?? to, to), 0);
}

function levelsWords({ levels }: AlignmentDesign): string {
  return levels.map(({ chainage, level }) => `${plain(chainage)} m: ${plain(level)} m`).join(', ');
}

function intervalsWords({ intervals }: AlignmentDesign): string {
  const words = intervals.map(({ from, to, volumeLoss, troughWidth }) => {
    const values = `${rangeWords(volumeLoss, percent)} %, K ${rangeWords(troughWidth, plain)}`;
    return `${plain(from)} to ${plain(to)} m: ${values}`;
  });
  return words.length === 0 ? 'none' : words.join('; ');
}

/** Where a line runs, in short: how long, and where it begins. Two lines may read alike. */
function lineWords({ line }: AlignmentDesign): string {
  const [east = 0, north = 0] = line[0] ?? [];
  return `${line.length} points, ${figure(lengthOf(line), 1)} m, from ${plain(east)}, ${plain(north)}`;
}

function shaftsWords({ shafts }: Option): string {
  const words = shafts.map(({ name, east, north, source }) => {
    return `${name} at ${plain(east)}, ${plain(north)} (${source})`;
  });
  return words.length === 0 ? 'none' : words.join('; ');
}

/** What people know of a design, by the names that the form has for it. */
export function designLines(design: AlignmentDesign): readonly (readonly [string, string])[] {
  return [
    ['Line', lineWords(design)],
    ['Levels of the axis', levelsWords(design)],
    ['Diameter', `${plain(design.diameter)} m`],
    ['Drives', [boresWords(design), laterWords(design)].filter((one) => one !== null).join('; ')],
    ['Direction', design.direction === 'forward' ? 'as drawn' : 'against the line'],
    ['Ground level', `${plain(design.groundLevel)} m`],
    ['Volume loss', `${rangeWords(design.volumeLoss, percent)} %`],
    ['Trough width K', rangeWords(design.troughWidth, plain)],
    ['Intervals', intervalsWords(design)],
  ];
}

/** The same of an option, with what no run takes of it. */
export function optionLines(option: Option): readonly (readonly [string, string])[] {
  return [['Name', option.name], ...designLines(option.design), ['Shafts', shaftsWords(option)]];
}

/** What somebody changed of an option, value by value. */
export function optionChanges(before: Option, after: Option): ValueChange[] {
  const old = new Map(optionLines(before));
  const isMoved = JSON.stringify(before.design.line) !== JSON.stringify(after.design.line);
  return optionLines(after).flatMap(([path, words]) => {
    const was = old.get(path);
    if (path === 'Line' && isMoved && was === words) {
      return [{ path, before: was, after: `${words}, points moved` }];
    }
    return was === words ? [] : [{ path, before: was, after: words }];
  });
}
