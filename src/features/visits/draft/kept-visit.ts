import {
  VISITED_FIELDS,
  type NewVisit,
  type VisitedField,
} from '../../../../shared/schemas/visits.ts';
import type { BuildingValue } from '../../../../shared/schemas/building-fields.ts';
import { numberOf } from '../../../lib/number-of.ts';
import { valueOfText } from '../../buildings/building-draft.ts';

type Part = NewVisit['part'];
type Kind = NewVisit['defects'][number]['kind'];

/** A defect as it stands in its fields. */
export type WrittenDefect = {
  readonly id: string;
  readonly place: string;
  readonly kind: Kind;
  /** In mm; empty where it was not measured. */
  readonly width: string;
  readonly note: string;
};

/** A photograph whose file is kept beside. */
export type KeptPhotograph = NewVisit['photographs'][number] & { readonly isSent: boolean };

/** What the register said of a building when it was visited. */
export type SeenBuilding = {
  readonly version: number;
  readonly values: Readonly<Partial<Record<VisitedField, BuildingValue>>>;
};

/** What was found, as it stands in the fields; what is empty was not looked at. */
export type Findings = {
  readonly part: Part | null;
  readonly texts: Readonly<Partial<Record<VisitedField, string>>>;
  readonly notes: string;
  readonly defects: readonly WrittenDefect[];
};

/**
 * A visit on this phone: being written, kept until it is sent, or held up because somebody changed the
 * register meanwhile or the server would not have it.
 */
export type KeptVisit = {
  readonly id: string;
  readonly personId: string;
  readonly schemeId: string;
  readonly buildingId: number;
  /** What the building is called, for lists that are read without a network. */
  readonly title: string;
  readonly state: 'draft' | 'kept' | 'clash' | 'refused';
  /** When it was recorded here; null while it is being written. */
  readonly visitedAt: string | null;
  /** Null where the register could not be reached: nothing of it is then put right. */
  readonly seen: SeenBuilding | null;
  readonly findings: Findings;
  readonly photographs: readonly KeptPhotograph[];
  /** The server has it; photographs may still be on their way. */
  readonly isRecorded: boolean;
  readonly fault: string | null;
};

type Place = Pick<KeptVisit, 'id' | 'personId' | 'schemeId' | 'buildingId' | 'title'>;

/** A visit of which nothing is written yet. */
export function blankVisit(place: Place): KeptVisit {
  return {
    ...place,
    state: 'draft',
    visitedAt: null,
    seen: null,
    findings: { part: null, texts: {}, notes: '', defects: [] },
    photographs: [],
    isRecorded: false,
    fault: null,
  };
}

/** What of a building a visit may put right, as the register has it now. */
export function seenOf(
  building: { readonly version: number } & Readonly<Record<VisitedField, BuildingValue>>,
): SeenBuilding {
  const values = Object.fromEntries(VISITED_FIELDS.map((field) => [field, building[field]]));
  return { version: building.version, values };
}

/** The values that were written otherwise than the register has them. */
export function correctedOf({ seen, findings }: KeptVisit): [VisitedField, BuildingValue][] {
  if (seen === null) return [];
  return VISITED_FIELDS.flatMap((field): [VisitedField, BuildingValue][] => {
    const text = findings.texts[field]?.trim() ?? '';
    if (text === '') return [];
    const value = valueOfText(field, text);
    return value === seen.values[field] ? [] : [[field, value]];
  });
}

function widthOf(text: string): number | null {
  return text.trim() === '' ? null : (numberOf(text) ?? Number.NaN);
}

function announced(photograph: KeptPhotograph): NewVisit['photographs'][number] {
  const { id, caption, takenAt, width, height, keepsPlace, place } = photograph;
  return { id, caption, takenAt, width, height, keepsPlace, place };
}

/** The visit as it is sent; what is wrong with it is for the schema to say. */
export function sentOf(visit: KeptVisit): unknown {
  const { id, visitedAt, seen, findings, photographs } = visit;
  const { part, texts, notes, defects } = findings;
  const corrected = correctedOf(visit);
  const word = (text: string | undefined) => (text?.trim() ? text : null);
  return {
    ...{ id, visitedAt, part, notes },
    condition: word(texts.condition),
    construction: word(texts.construction),
    defects: defects.map(({ place, kind, width, note }) => {
      return { place, kind, width: widthOf(width), note };
    }),
    photographs: photographs.map(announced),
    changes:
      seen === null || corrected.length === 0
        ? null
        : { version: seen.version, values: Object.fromEntries(corrected) },
  };
}

/** Whether anything was written or taken. */
export function isBlank({ findings, photographs }: KeptVisit): boolean {
  const { part, texts, notes, defects } = findings;
  const written = [notes, ...Object.values(texts)].some((text) => text.trim() !== '');
  return part === null && !written && defects.length === 0 && photographs.length === 0;
}

function twoDigits(value: number): string {
  return String(Math.trunc(Math.abs(value))).padStart(2, '0');
}

/** A moment with the offset of this phone, so that its day is the day where the building stands. */
export function momentHere(moment: Date): string {
  const east = -moment.getTimezoneOffset();
  const local = new Date(moment.getTime() + east * 60_000).toISOString().slice(0, 19);
  return `${local}${east < 0 ? '-' : '+'}${twoDigits(east / 60)}:${twoDigits(Math.abs(east) % 60)}`;
}
