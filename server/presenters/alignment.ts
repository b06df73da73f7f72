import { chainages } from '../../shared/geometry/chainages.ts';
import { alignmentDesignSchema, type AlignmentAnswer } from '../../shared/schemas/alignments.ts';
import type { AlignmentBy } from '../models/find-alignments.ts';

/** What leaves the server of an option for a line. */
export function presentAlignment({ alignment, by }: AlignmentBy): AlignmentAnswer {
  const { id, name, version, shafts, changedAt } = alignment;
  const design = alignmentDesignSchema.parse(alignment.design);
  return {
    id,
    name,
    version,
    design,
    shafts,
    length: chainages(design.line).at(-1) ?? 0,
    changedAt: changedAt.toISOString(),
    changedBy: by?.name ?? null,
  };
}
