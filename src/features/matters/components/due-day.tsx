import { formatShortDay } from '../../../lib/format-date.ts';

type DueDayProps = { readonly due: string | null; readonly isOverdue: boolean };

/** A day by which something is due, and whether that day has passed. */
export function DueDay({ due, isOverdue }: DueDayProps) {
  if (due === null) return <span className="text-ink-3">No day</span>;
  if (!isOverdue) return formatShortDay(due);
  return <span className="font-semibold text-clay-deep">{formatShortDay(due)}, late</span>;
}
