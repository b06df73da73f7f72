import {
  BUILDING_FIELDS,
  BUILDING_TEXT,
  type BuildingField,
  type BuildingFieldFacts,
  type BuildingValue,
} from '../../shared/schemas/building-fields.ts';
import type { Scalar } from '../importers/source.ts';
import { parseNumber } from './parse-number.ts';
import { REMARKS } from './remarks.ts';

/** A value of a field, undefined where it could not be read, with what there is to say of it. */
export type ParsedValue = {
  readonly value: BuildingValue | undefined;
  readonly remark?: string;
};

const YES = /^(y|yes|true|ja|j|oui|o|si|sí|s|sim|tak)$/i;
const NO = /^(n|no|not|false|nein|non|nee|não|nao|nie)$/i;

/** What yes and no mean in fields that have words for them. */
const YES_NO: Readonly<Partial<Record<BuildingField, readonly [yes: string, no: string]>>> = {
  listedGrade: ['listed', 'not listed'],
  inspected: ['inside', 'not inspected'],
};

/** One line without control characters. */
export function oneLine(text: string): string {
  return text.replaceAll(/\p{Cc}+/gu, ' ').trim();
}

function yesOrNo(field: BuildingField, raw: Scalar): string | undefined {
  const words = YES_NO[field];
  const text = String(raw).trim();
  const isYes = raw === true || YES.test(text) || (field === 'inspected' && text === '1');
  const isNo = raw === false || NO.test(text) || (field === 'inspected' && text === '0');
  if (typeof raw !== 'boolean' && words === undefined) return undefined;
  if (isYes) return words?.[0] ?? 'yes';
  return isNo ? (words?.[1] ?? 'no') : undefined;
}

function parseText(field: BuildingField, column: string, raw: Scalar): ParsedValue {
  const text = yesOrNo(field, raw) ?? oneLine(String(raw));
  if (text === '' || /^<?null>?$/i.test(text)) return { value: null };
  if (text.length <= BUILDING_TEXT.text) return { value: text };
  const value = text.slice(0, BUILDING_TEXT.text).trim();
  return { value, remark: REMARKS.longText({ field, column }) };
}

function boundsFault({ kind, least, most, unit }: BuildingFieldFacts, value: number) {
  if (kind === 'whole' && !Number.isInteger(value)) return 'is no whole number';
  if (least === undefined || most === undefined || (value >= least && value <= most)) {
    return undefined;
  }
  return `is not from ${least} to ${most}${unit === undefined ? '' : ` ${unit}`}`;
}

function parseFigure(field: BuildingField, column: string, raw: Scalar): ParsedValue {
  const facts: BuildingFieldFacts = BUILDING_FIELDS[field];
  const at = { field, column };
  const text = oneLine(String(raw));
  const kind = facts.unit === 'm' ? 'm' : field === 'storeys' ? 'storeys' : undefined;
  const parsed = typeof raw === 'number' ? { value: raw } : parseNumber(text, kind);
  if ('fault' in parsed) {
    return { value: undefined, remark: REMARKS.unreadable(at, text, parsed.fault) };
  }
  const { value } = parsed;
  if (value === null) return { value };
  const fault = Number.isFinite(value) ? boundsFault(facts, value) : 'is no number';
  if (fault !== undefined) {
    return { value: undefined, remark: REMARKS.unreadable(at, text, fault) };
  }
  const isGuessed = 'isCommaGuessed' in parsed && parsed.isCommaGuessed;
  return isGuessed ? { value, remark: REMARKS.commaRead(at, text, value) } : { value };
}

/** Reads a cell as a field of the register: blank is unknown, and what cannot be read is said. */
export function parseValue(field: BuildingField, column: string, raw: Scalar): ParsedValue {
  if (raw === null) return { value: null };
  const { kind } = BUILDING_FIELDS[field];
  return kind === 'text' ? parseText(field, column, raw) : parseFigure(field, column, raw);
}
