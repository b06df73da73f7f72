import type { LetterTextPart } from '../../../shared/presentation/letter-text.ts';

/** A letter as it stands on paper. */
export type LetterOnPaper = {
  /** How it is found again: the number of its batch and its own. */
  readonly mark: string;
  readonly name: string;
  readonly address: string;
  readonly subject: string;
  readonly parts: readonly LetterTextPart[];
};

/** Letters of one batch with what stands on all of them. */
export type LettersMaterial = {
  readonly schemeName: string;
  /** Who writes, line by line. */
  readonly sender: readonly string[];
  readonly day: string;
  /** Where owners read more. */
  readonly page: string;
  readonly letters: readonly LetterOnPaper[];
  /** Whether they are for the post: then a list of them with their pages comes first. */
  readonly hasManifest: boolean;
};
