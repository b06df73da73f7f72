/**
 * The most that letters hold.
 *
 * Units: letters for texts, pieces. Valid: read only. Source: [own].
 */
export const LETTER_LIMITS = {
  subject: 200,
  body: 10_000,
  why: 500,
  comment: 2000,
  chosen: 5000,
  letters: 20_000,
} as const;
