import { z } from 'zod';
import {
  BUILDING_FIELD_NAMES,
  BUILDING_FIELDS,
  buildingAttributesSchema,
  buildingReferenceSchema,
  type BuildingAttributes,
  type BuildingField,
  type BuildingValue,
} from '../../../shared/schemas/building-fields.ts';
import { draftSchema } from '../../lib/draft-schema.ts';
import { numberOf } from '../../lib/number-of.ts';
import type { BuildingValues } from '../../../shared/presentation/shown-value.ts';

/** Values as they stand in fields that are written in; empty is not known. */
export type DraftValues = Readonly<Record<BuildingField, string>>;

/** A building while it is being changed. */
export type BuildingDraft = { readonly reference: string; readonly attributes: DraftValues };

/** What was changed of a building. */
export type BuildingEdit = {
  readonly reference?: string;
  readonly attributes: BuildingAttributes;
};

/** What of a building is changed by hand. */
export type EditedName = 'reference' | BuildingField;

export const EDITED_NAMES: readonly EditedName[] = ['reference', ...BUILDING_FIELD_NAMES];

function textOfNumber(value: number): string {
  return String(value).replace('-', '\u2212');
}

/** The value that somebody wrote for a field; NaN for what should be a number and is none. */
export function valueOfText(field: BuildingField, text: string): BuildingValue {
  if (text.trim() === '') return null;
  if (BUILDING_FIELDS[field].kind === 'text') return text;
  return numberOf(text) ?? Number.NaN;
}

function draft(valueAt: (name: EditedName) => BuildingValue): BuildingDraft {
  const texts = BUILDING_FIELD_NAMES.map((field) => {
    const value = valueAt(field);
    return [field, typeof value === 'number' ? textOfNumber(value) : (value ?? '')] as const;
  });
  return {
    reference: String(valueAt('reference')),
    attributes: draftValuesSchema.parse(Object.fromEntries(texts)),
  };
}

/** What stands in the fields before anybody writes. */
export function draftOf(building: BuildingValues): BuildingDraft {
  return draft((name) => building[name]);
}

/** What was written, in the fields again. */
export function draftOfWritten(written: WrittenBuilding): BuildingDraft {
  return draft((name) => valueOf(written, name));
}

const draftValuesSchema = z.record(z.enum(BUILDING_FIELD_NAMES), z.coerce.string());

const wholeSchema = z.strictObject({
  reference: buildingReferenceSchema,
  attributes: buildingAttributesSchema,
});

/** Checks what was written for a whole building. */
export const buildingDraftSchema = draftSchema(
  wholeSchema,
  ({ reference, attributes }: BuildingDraft) => ({
    reference,
    attributes: Object.fromEntries(
      BUILDING_FIELD_NAMES.map((field) => [field, valueOfText(field, attributes[field])]),
    ),
  }),
);

/** A whole building as it was written. */
export type WrittenBuilding = z.infer<typeof wholeSchema>;

function valueOf({ reference, attributes }: WrittenBuilding, name: EditedName): BuildingValue {
  return name === 'reference' ? reference : (attributes[name] ?? null);
}

/** The names of what was written otherwise than it was seen. */
export function changedNames(
  written: WrittenBuilding,
  seen: BuildingValues,
): readonly EditedName[] {
  return EDITED_NAMES.filter((name) => valueOf(written, name) !== seen[name]);
}

/** What is to be changed, of the names that are meant. */
export function editOf(written: WrittenBuilding, names: readonly EditedName[]): BuildingEdit {
  const fields = BUILDING_FIELD_NAMES.filter((field) => names.includes(field));
  const attributes = fields.map((field) => [field, valueOf(written, field)]);
  return {
    ...(names.includes('reference') && { reference: written.reference }),
    attributes: buildingAttributesSchema.parse(Object.fromEntries(attributes)),
  };
}

/** What was written of the names that are meant, on top of a building as it stands. */
export function onTopOf(
  building: BuildingValues,
  written: WrittenBuilding,
  names: readonly EditedName[],
): WrittenBuilding {
  const values = Object.fromEntries(
    EDITED_NAMES.map((name) => [
      name,
      names.includes(name) ? valueOf(written, name) : building[name],
    ]),
  );
  const { reference, ...attributes } = values;
  return wholeSchema.parse({ reference, attributes });
}

/** What somebody else did to a building while it was being changed here. */
export type Clash = {
  /** Changed by both to different values. */
  readonly both: readonly { name: EditedName; mine: BuildingValue; theirs: BuildingValue }[];
  /** Changed here alone. */
  readonly mineOnly: readonly EditedName[];
  /** Changed there alone, which stays. */
  readonly theirsOnly: readonly EditedName[];
};

export function clashOf(
  written: WrittenBuilding,
  seen: BuildingValues,
  fresh: BuildingValues,
): Clash {
  const mine = changedNames(written, seen).filter((name) => valueOf(written, name) !== fresh[name]);
  const theirs = EDITED_NAMES.filter((name) => fresh[name] !== seen[name]);
  return {
    both: mine
      .filter((name) => theirs.includes(name))
      .map((name) => ({ name, mine: valueOf(written, name), theirs: fresh[name] })),
    mineOnly: mine.filter((name) => !theirs.includes(name)),
    theirsOnly: theirs.filter((name) => !mine.includes(name)),
  };
}
