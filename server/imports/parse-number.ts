/** A number as it stands in a file: read, blank, or not to be read and why. */
export type ParsedNumber =
  { readonly value: number | null; readonly isCommaGuessed?: boolean } | { readonly fault: string };

const UNKNOWN =
  /^(-+|–|—|\?+|n\.?\/?a\.?|nan|#n\/a|null|<null>|\(null\)|none|unknown|unbekannt|k\.?\s?a\.?|s\/?d|inconnue?|desconocid[oa]|onbekend|sconosciut[oa])$/i;

/** What lengths are written in, as metres. */
const LENGTHS: readonly (readonly [RegExp, number])[] = [
  [/^(m|mtrs?|metres?|meters?|meter|metros?|m[eè]tres?|metri)\.?$/i, 1],
  [/^cm$/i, 0.01],
  [/^mm$/i, 0.001],
  [/^(ft|feet|foot|['′])\.?$/i, 0.3048],
];
const STOREYS =
  /^(storeys?|stories|story|floors?|levels?|fl|st|geschosse?|etagen?|étages?|niveaux?|plantas?|pisos?|piani|bouwlagen|verdiepingen)\.?$/i;

function factorOf(unit: string, kind: 'm' | 'storeys' | undefined): number | undefined {
  if (unit === '') return 1;
  if (kind === 'storeys') return STOREYS.test(unit) ? 1 : undefined;
  return kind === 'm' ? LENGTHS.find(([written]) => written.test(unit))?.[1] : undefined;
}

/** Digits with the thousands' marks taken out; undefined where the marks do not stand by threes. */
function ungrouped(digits: string, mark: string): string | undefined {
  const [first = '', ...groups] = digits.split(mark);
  const isGrouped = /^\d{1,3}$/.test(first) && groups.every((group) => /^\d{3}$/.test(group));
  return groups.length === 0 || isGrouped ? first + groups.join('') : undefined;
}

function decimal(text: string): { digits: string; isCommaGuessed: boolean } | undefined {
  const [commas, dots] = [text.split(',').length - 1, text.split('.').length - 1];
  const mark = text.lastIndexOf(',') > text.lastIndexOf('.') ? ',' : '.';
  const isGroupMark = (mark === ',' ? commas : dots) > 1;
  if (isGroupMark) {
    if (commas > 0 && dots > 0) return undefined;
    const digits = ungrouped(text, mark);
    return digits === undefined ? undefined : { digits, isCommaGuessed: false };
  }
  const [whole = '', fraction] = text.split(mark);
  const digits = ungrouped(whole, mark === ',' ? '.' : ',');
  if (digits === undefined) return undefined;
  const isCommaGuessed = mark === ',' && dots === 0 && /^[1-9]\d{0,2},\d{3}$/.test(text);
  return { digits: fraction === undefined ? digits : `${digits}.${fraction}`, isCommaGuessed };
}

/** Blanks and apostrophes between thousands. */
function withoutThousands(text: string): string | undefined {
  const mark = /[\s'’]/.exec(text)?.[0];
  if (mark === undefined) return text;
  const [whole = '', ...rest] = text.split(/(?=[.,])/);
  const digits = ungrouped(whole, mark);
  return digits === undefined ? undefined : digits + rest.join('');
}

/**
 * Reads a number as people write it: with a decimal comma, blanks or apostrophes between thousands, and
 * a unit after it. Blanks and words for it are unknown.
 */
export function parseNumber(text: string, kind: 'm' | 'storeys' | undefined): ParsedNumber {
  const trimmed = text.trim();
  if (trimmed === '' || UNKNOWN.test(trimmed)) return { value: null };
  const parts = /^([+\-−]?)([\d.,\s'’]*\d[.,]?)(e[+-]?\d{1,3})?\s*(\D*)$/i.exec(trimmed);
  if (parts === null) return { fault: 'is no number' };
  const [, sign = '', body = '', exponent = '', unit = ''] = parts;
  const factor = factorOf(unit.trim(), kind);
  if (factor === undefined) return { fault: `is no number${kind === 'm' ? ' in metres' : ''}` };
  const plain = withoutThousands(body.trim());
  const read = plain === undefined ? undefined : decimal(plain);
  if (read === undefined) return { fault: 'is no number' };
  const value = Number(`${sign === '' || sign === '+' ? '' : '-'}${read.digits}${exponent}`);
  if (!Number.isFinite(value)) return { fault: 'is no number' };
  const scaled = factor === 1 ? value : Math.round(value * factor * 1e6) / 1e6;
  return read.isCommaGuessed ? { value: scaled, isCommaGuessed: true } : { value: scaled };
}
