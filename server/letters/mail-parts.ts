import type { LetterTextPart } from '../../shared/presentation/letter-text.ts';
import type { LetterPart } from '../mail/render-letter.ts';

/** The parts of a letter as a mail has them, its link leading to an address. */
export function mailParts(parts: readonly LetterTextPart[], url: string): LetterPart[] {
  return parts.map((part) =>
    typeof part === 'object' && 'link' in part ? { label: part.link, url } : part,
  );
}
