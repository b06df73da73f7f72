import type { ReferenceKey } from '../../../shared/references.ts';
import { sourceWords } from '../rules/source-words.ts';

/** Where a formula is from: a cited work, common practice, or this project. */
export function sourceNote(key: ReferenceKey): string {
  if (key === 'own') return 'worked out here';
  if (key === 'common-practice') return 'common practice, no source';
  return sourceWords(key);
}
