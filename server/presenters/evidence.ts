import {
  layoutSchema,
  printSchema,
  type LayoutAnswer,
  type PrintAnswer,
} from '../../shared/schemas/evidence.ts';
import type { FoundLayout } from '../models/plan-layouts.ts';
import type { FoundPrint } from '../models/prints.ts';

/** What leaves the server of a named layout. */
export function presentLayout(kept: FoundLayout): LayoutAnswer {
  const { id, name, version, layout, changedAt, changedBy } = kept;
  return layoutSchema.parse({
    ...{ id, name, version, layout, changedBy },
    changedAt: changedAt.toISOString(),
  });
}

/** What leaves the server of a print. */
export function presentPrint(print: FoundPrint): PrintAnswer {
  const { id, number, name, layout, runId, runNumber, state, done, sheets, fault } = print;
  const { bytes, fingerprint, askedAt, askedBy } = print;
  return printSchema.parse({
    ...{ id, number, name, layout, runId, runNumber, state, done, sheets, fault },
    ...{ bytes, fingerprint, askedBy, askedAt: askedAt.toISOString() },
  });
}
