import { z } from 'zod';
import { footprintArea } from '../../shared/building/footprint-area.ts';
import { footprintSchema } from '../../shared/schemas/building-fields.ts';
import type { BuildingHistory } from '../../shared/schemas/register-changes.ts';
import type { HistoryEntry } from '../models/find-building-changes.ts';

const keptSchema = z.looseObject({ footprint: footprintSchema.optional() }).nullable();

/** What changed, as people read it: of a footprint its area, and nothing of what a file had said. */
function presentSide(kept: object | null): Record<string, unknown> | null {
  const side = keptSchema.parse(kept);
  if (side === null) return null;
  const { footprint } = side;
  const told = Object.entries(side).filter(([name]) => name !== 'footprint' && name !== 'imported');
  return {
    ...Object.fromEntries(told),
    ...(footprint !== undefined && { footprint: footprintArea(footprint) }),
  };
}

/** What leaves the server of a building's history, for one who may change the register or not. */
export function presentHistory(
  entries: readonly HistoryEntry[],
  mayUndo: boolean,
): BuildingHistory {
  return entries.map((entry) => ({
    changeId: entry.changeId,
    at: entry.at.toISOString(),
    by: entry.by,
    // what was undone is done again by undoing that
    kind: entry.undoings > 0 && entry.undoings % 2 === 0 ? 'redo' : entry.kind,
    source: entry.source,
    before: presentSide(entry.before),
    after: presentSide(entry.after),
    mayUndo: mayUndo && entry.isNewest && !entry.isUndone,
  }));
}
