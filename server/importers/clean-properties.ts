import { noProperties } from './flat-properties.ts';
import type { Properties, Scalar } from './source.ts';

const LONGEST_TEXT = 2000;
/** Halves of letters and zeros, which a database does not take. */
const UNKEPT = /\p{Surrogate}|\0/gu;

function clean(value: Scalar): Scalar {
  if (typeof value !== 'string') return value;
  return value.slice(0, LONGEST_TEXT).replaceAll(UNKEPT, '');
}

/** The values of a row as they can be kept: long texts are cut. */
export function cleanProperties(given: Properties): Properties {
  const properties = noProperties();
  for (const [name, value] of Object.entries(given)) {
    properties[name.replaceAll(UNKEPT, '')] = clean(value);
  }
  return properties;
}
