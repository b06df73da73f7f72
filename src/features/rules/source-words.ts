import { REFERENCES, type ReferenceKey } from '../../../shared/references.ts';

const INITIALS = /,\s(?:[A-Z]\.\s?)+/g;

/** A cited work in a few words, as "Mair, Taylor and Burland 1996". */
export function sourceWords(key: ReferenceKey): string {
  const { authors, year } = REFERENCES[key];
  const names = authors.replace(INITIALS, ' ').replace(/\s+,/g, ',').replace(/\s+/g, ' ').trim();
  return year === 0 ? names : `${names} ${year}`;
}

/** A cited work in full. */
export function sourceInFull(key: ReferenceKey): string {
  const { authors, year, title, where } = REFERENCES[key];
  return year === 0 ? `${title}.` : `${authors}, ${year}. ${title}. ${where}.`;
}

/** Whether a text is the key of a cited work. */
function isKey(text: string): text is ReferenceKey {
  return text in REFERENCES;
}

/** Every cited work, by the names of its authors. */
export const SOURCE_OPTIONS = Object.keys(REFERENCES)
  .filter(isKey)
  .map((key) => ({ value: key, label: sourceWords(key) }))
  .sort((a, b) => a.label.localeCompare(b.label));
