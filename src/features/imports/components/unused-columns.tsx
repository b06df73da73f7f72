import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';

const FEW = 6;

/** What a file holds beside, by name; it is left where it is. */
export function UnusedColumns({
  columns,
}: {
  readonly columns: readonly ImportAnswer['columns'][number][];
}) {
  if (columns.length === 0) return null;
  const names = columns.map(({ name }) => name).join(', ');
  if (columns.length <= FEW) return <p className="text-small text-ink-2">Not used: {names}.</p>;
  return (
    <details className="text-small text-ink-2">
      <summary className="w-fit py-1 max-sm:py-3">{columns.length} columns are not used</summary>
      <p className="mt-1 break-words">{names}</p>
    </details>
  );
}
