import type { ReferenceKey } from '../references.ts';
import { sourceWords } from './source-words.ts';

/**
 * Where a formula is from: a cited work, common practice, or this project.
 *
 * Units: none. Valid: any key. Source: [own].
 */
export function sourceNote(key: ReferenceKey): string {
  if (key === 'own') return 'worked out here';
  if (key === 'common-practice') return 'common practice, no source';
  return sourceWords(key);
}
