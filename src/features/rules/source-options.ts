import { sourceWords } from '../../../shared/presentation/source-words.ts';
import { REFERENCES, type ReferenceKey } from '../../../shared/references.ts';

/** Whether a text is the key of a cited work. */
function isKey(text: string): text is ReferenceKey {
  return text in REFERENCES;
}

/** Every cited work, by the names of its authors. */
export const SOURCE_OPTIONS = Object.keys(REFERENCES)
  .filter(isKey)
  .map((key) => ({ value: key, label: sourceWords(key) }))
  .sort((a, b) => a.label.localeCompare(b.label));
