import type { Properties, Scalar } from './source.ts';

type Writable = Record<string, Scalar>;

/** An object without a prototype: "__proto__" and "constructor" are columns like any other. */
export function noProperties(): Writable {
  return Object.create(null) as Writable;
}

function scalar(value: unknown): Scalar | undefined {
  if (value === null || typeof value === 'string' || typeof value === 'boolean') return value;
  if (typeof value === 'number') return Number.isFinite(value) ? value : null;
  if (!Array.isArray(value)) return undefined;
  const texts = value.map(scalar).filter((one) => one !== undefined && one !== null);
  return texts.join(', ');
}

/** The attributes of an object of JSON: lists in one text, what lies one object deeper as "outer.inner". */
export function flatProperties(given: unknown, first: Properties = noProperties()): Properties {
  const flat = Object.assign(noProperties(), first);
  if (typeof given !== 'object' || given === null || Array.isArray(given)) return flat;
  for (const [name, value] of Object.entries<unknown>({ ...given })) {
    const plain = scalar(value);
    if (plain !== undefined) flat[name] = plain;
    else if (typeof value === 'object' && value !== null) {
      for (const [inner, deeper] of Object.entries<unknown>({ ...value })) {
        flat[`${name}.${inner}`] = scalar(deeper) ?? null;
      }
    }
  }
  return flat;
}
