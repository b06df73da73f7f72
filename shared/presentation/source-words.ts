import { REFERENCES, type ReferenceKey } from '../references.ts';

const INITIALS = /,\s(?:[A-Z]\.\s?)+/g;

/**
 * A cited work in a few words, as "Mair, Taylor and Burland 1996".
 *
 * Units: none. Valid: any key. Source: [own].
 */
export function sourceWords(key: ReferenceKey): string {
  const { authors, year } = REFERENCES[key];
  const names = authors.replace(INITIALS, ' ').replace(/\s+,/g, ',').replace(/\s+/g, ' ').trim();
  return year === 0 ? names : `${names} ${year}`;
}

/**
 * A cited work in full.
 *
 * Units: none. Valid: any key. Source: [own].
 */
export function sourceInFull(key: ReferenceKey): string {
  const { authors, year, title, where } = REFERENCES[key];
  return year === 0 ? `${title}.` : `${authors}, ${year}. ${title}. ${where}.`;
}
