import { zodResolver } from '@hookform/resolvers/zod';
import { FIRST_DRIVE_VALUES } from '../../../../shared/ground/first-drive-values.ts';
import {
  alignmentDesignSchema,
  newAlignmentSchema,
  shaftsSchema,
  type AlignmentDesign,
  type Shafts,
} from '../../../../shared/schemas/alignments.ts';
import { draftSchema } from '../../../lib/draft-schema.ts';
import { numberOf } from '../../../lib/number-of.ts';

export type RangeDraft = { low: string; central: string; high: string };

export type LevelDraft = { chainage: string; level: string };

export type IntervalDraft = {
  from: string;
  to: string;
  volumeLoss: RangeDraft;
  troughWidth: RangeDraft;
};

export type ShaftDraft = { name: string; east: string; north: string; source: string };

/** An option while it is written, with figures as typed and volume losses in %; its line is drawn. */
export type OptionDraft = {
  name: string;
  design: {
    levels: LevelDraft[];
    diameter: string;
    bores: { kind: string; spacing: string; later: string; laterFactor: string };
    direction: string;
    groundLevel: string;
    volumeLoss: RangeDraft;
    troughWidth: RangeDraft;
    intervals: IntervalDraft[];
  };
  shafts: ShaftDraft[];
};

type Line = AlignmentDesign['line'];
type Range = AlignmentDesign['volumeLoss'];

const DIGITS = 12;

/** A fraction as the % that is read as the same fraction again. */
function inPercent(fraction: number): string {
  return String(Number((fraction * 100).toPrecision(DIGITS)));
}

function rangeDraft({ low, central, high }: Range, words: (value: number) => string): RangeDraft {
  return { low: words(low), central: words(central), high: words(high) };
}

/** An option of which nothing is known yet but what is common practice. */
export const BLANK_OPTION: OptionDraft = {
  name: '',
  design: {
    levels: [{ chainage: '0', level: '' }],
    diameter: '',
    bores: { kind: 'single', spacing: '', later: 'right', laterFactor: '1' },
    direction: 'forward',
    groundLevel: '',
    volumeLoss: rangeDraft(FIRST_DRIVE_VALUES.volumeLoss, inPercent),
    troughWidth: rangeDraft(FIRST_DRIVE_VALUES.troughWidth, String),
    intervals: [],
  },
  shafts: [],
};

/** Whether nobody has written yet what the ground asks for. */
export function hasFirstValues({ design: { volumeLoss, troughWidth } }: OptionDraft): boolean {
  const first = BLANK_OPTION.design;
  const isSame = (a: RangeDraft, b: RangeDraft) =>
    a.low === b.low && a.central === b.central && a.high === b.high;
  return isSame(volumeLoss, first.volumeLoss) && isSame(troughWidth, first.troughWidth);
}

/** A stretch with values of its own that begin as those of the whole line. */
export function blankInterval({ volumeLoss, troughWidth }: OptionDraft['design']): IntervalDraft {
  return { from: '', to: '', volumeLoss, troughWidth };
}

function boresDraft(bores: AlignmentDesign['bores']): OptionDraft['design']['bores'] {
  if (bores.kind === 'single') return BLANK_OPTION.design.bores;
  const { kind, spacing, later, laterFactor } = bores;
  return { kind, spacing: String(spacing), later, laterFactor: String(laterFactor) };
}

/** An option, ready to be written in. */
export function draftOf(name: string, design: AlignmentDesign, shafts: Shafts): OptionDraft {
  return {
    name,
    shafts: shafts.map(({ east, north, ...shaft }) => ({
      ...shaft,
      east: String(east),
      north: String(north),
    })),
    design: {
      levels: design.levels.map(({ chainage, level }) => ({
        chainage: String(chainage),
        level: String(level),
      })),
      diameter: String(design.diameter),
      bores: boresDraft(design.bores),
      direction: design.direction,
      groundLevel: String(design.groundLevel),
      volumeLoss: rangeDraft(design.volumeLoss, inPercent),
      troughWidth: rangeDraft(design.troughWidth, String),
      intervals: design.intervals.map(({ from, to, volumeLoss, troughWidth }) => ({
        from: String(from),
        to: String(to),
        volumeLoss: rangeDraft(volumeLoss, inPercent),
        troughWidth: rangeDraft(troughWidth, String),
      })),
    },
  };
}

/** A new option begins with the bores and the ground of another and the first of its levels. */
export function beginningLike({ levels, ...design }: AlignmentDesign): OptionDraft {
  const given = levels.slice(0, 1).map(({ level }) => ({ chainage: 0, level }));
  return draftOf('', { ...design, intervals: [], levels: given }, []);
}

function toNumber(text: string): number {
  return numberOf(text) ?? NaN;
}

function ofPercent(text: string): number {
  // through the text, so that no last bit of a division is kept
  return Number(`${toNumber(text)}e-2`);
}

function rangeOf({ low, central, high }: RangeDraft, read: (text: string) => number) {
  return { low: read(low), central: read(central), high: read(high) };
}

function boresOf({ kind, spacing, later, laterFactor }: OptionDraft['design']['bores']): unknown {
  if (kind === 'single') return { kind };
  return { kind, spacing: toNumber(spacing), later, laterFactor: toNumber(laterFactor) };
}

function designOf({ design }: OptionDraft, line: Line): unknown {
  return {
    line,
    levels: design.levels.map(({ chainage, level }) => ({
      chainage: toNumber(chainage),
      level: toNumber(level),
    })),
    diameter: toNumber(design.diameter),
    bores: boresOf(design.bores),
    direction: design.direction,
    groundLevel: toNumber(design.groundLevel),
    volumeLoss: rangeOf(design.volumeLoss, ofPercent),
    troughWidth: rangeOf(design.troughWidth, toNumber),
    intervals: design.intervals.map(({ from, to, volumeLoss, troughWidth }) => ({
      from: toNumber(from),
      to: toNumber(to),
      volumeLoss: rangeOf(volumeLoss, ofPercent),
      troughWidth: rangeOf(troughWidth, toNumber),
    })),
  };
}

function shaftsOf({ shafts }: OptionDraft) {
  return shafts.map(({ east, north, ...shaft }) => ({
    ...shaft,
    east: toNumber(east),
    north: toNumber(north),
  }));
}

/** The shafts that are written; null while something of them is missing or wrong. */
export function shaftsIfWhole(draft: OptionDraft): Shafts | null {
  return shaftsSchema.safeParse(shaftsOf(draft)).data ?? null;
}

/** The design that is written and drawn; null while something of it is missing or wrong. */
export function designIfWhole(draft: OptionDraft, line: Line): AlignmentDesign | null {
  return alignmentDesignSchema.safeParse(designOf(draft, line)).data ?? null;
}

function faultWords({ message }: { readonly message: string }): string {
  if (message.startsWith('Too small')) return 'Too small.';
  return message.startsWith('Too big') ? 'Too large.' : message;
}

/** Checks what is written together with the line that is drawn. */
export function checkWith(line: Line) {
  return zodResolver(
    draftSchema<OptionDraft, { name: string; design: AlignmentDesign; shafts: Shafts }>(
      newAlignmentSchema,
      (draft) => ({
        name: draft.name,
        design: designOf(draft, line),
        shafts: shaftsOf(draft),
      }),
      faultWords,
    ),
  );
}

function kept<T>(mine: T, from: T, onto: T): T {
  return JSON.stringify(mine) === JSON.stringify(from) ? onto : mine;
}

/** A line begun from one version, laid on another: the one that was drawn on stays. */
export function rebasedLine(mine: Line, from: Line, onto: Line): Line {
  return kept(mine, from, onto);
}

/** A draft begun from one version, laid on another: each value that was written stays as written. */
export function rebasedOption(
  mine: OptionDraft,
  from: OptionDraft,
  onto: OptionDraft,
): OptionDraft {
  function of<K extends keyof OptionDraft['design']>(key: K): OptionDraft['design'][K] {
    return kept(mine.design[key], from.design[key], onto.design[key]);
  }
  return {
    name: kept(mine.name, from.name, onto.name),
    shafts: kept(mine.shafts, from.shafts, onto.shafts),
    design: {
      levels: of('levels'),
      diameter: of('diameter'),
      bores: of('bores'),
      direction: of('direction'),
      groundLevel: of('groundLevel'),
      volumeLoss: of('volumeLoss'),
      troughWidth: of('troughWidth'),
      intervals: of('intervals'),
    },
  };
}
