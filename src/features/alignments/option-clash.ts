import type { AlignmentAnswer } from '../../../shared/schemas/alignments.ts';
import { isRefusal } from '../../lib/api-error.ts';

/** An option as somebody else left it, where mine was refused for that; and whether it is gone. */
export function optionClash(
  base: AlignmentAnswer | null,
  options: readonly AlignmentAnswer[],
  error: Error | null,
): { readonly theirs: AlignmentAnswer | null; readonly isGone: boolean } {
  if (base === null) return { theirs: null, isGone: false };
  const fresh = options.find(({ id }) => id === base.id);
  const isNewer = fresh !== undefined && fresh.version !== base.version;
  return {
    theirs: isRefusal(error, 'conflict') && isNewer ? fresh : null,
    isGone: isRefusal(error, 'not-found'),
  };
}
