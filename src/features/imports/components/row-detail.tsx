import type { ImportAnswer, ImportRow } from '../../../../shared/schemas/imports.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import type { ImportDraft } from '../hooks/use-import-draft.ts';
import { isOpen } from '../import-states.ts';
import { MendPictures } from './mend-pictures.tsx';
import { RowChanges } from './row-changes.tsx';
import { SettleRow } from './settle-row.tsx';

type RowDetailProps = {
  readonly answer: ImportAnswer;
  readonly row: ImportRow;
  readonly draft: ImportDraft;
};

/** All that is to be said of a row: remarks, values here and in the file, outlines before and after. */
export function RowDetail({ answer, row, draft }: RowDetailProps) {
  const scheme = useScheme();
  const { reference } = row;
  const isQuiet = row.remarks.length === 0 && row.changes.length === 0 && !row.isMended;
  return (
    <div className="grid grid-cols-1 justify-items-start gap-3 text-small whitespace-normal">
      <p className="font-semibold">
        Row {formatCount(row.row)}
        {reference !== null && `, ${reference}`}
      </p>
      {isQuiet && <p className="text-ink-2">Nothing to remark.</p>}
      {row.remarks.map((remark) => (
        <p key={remark} className="max-w-[70ch]">
          {remark}
        </p>
      ))}
      {row.changes.length > 0 && <RowChanges row={row} settle={draft.options.settle} />}
      {row.changes.some(({ isConflict }) => isConflict) &&
        reference !== null &&
        isOpen(answer.state) && <SettleRow reference={reference} draft={draft} />}
      {row.isMended && <MendPictures schemeId={scheme.id} importId={answer.id} row={row.row} />}
    </div>
  );
}
