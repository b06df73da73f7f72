import { Segments } from '../../../components/ui/segments.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import type { ImportDraft } from '../hooks/use-import-draft.ts';

const WAYS = [
  { value: 'ask', label: 'Ask me for each' },
  { value: 'keep ours', label: 'Keep ours' },
  { value: 'take theirs', label: 'Take theirs' },
] as const;

type SettleAllProps = { readonly count: number; readonly draft: ImportDraft };

/** Settles every value that changed both here and in the file, but for the rows settled by themselves. */
export function SettleAll({ count, draft }: SettleAllProps) {
  const { settle } = draft.options;
  const own = Object.keys(settle.rows).length;
  return (
    <div className="border-l-4 border-clay bg-clay-wash px-3 py-2.5 text-body">
      <p className="mb-2">
        <b className="font-semibold">
          {count === 1
            ? 'One building changed both here and in the file.'
            : `${formatCount(count)} buildings changed both here and in the file.`}
        </b>{' '}
        Say which value stands, for all or row by row.
      </p>
      <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
        <Segments
          label="Where both changed"
          segments={WAYS}
          value={settle.others}
          onChange={(others) => {
            draft.chooseNow({ settle: { ...settle, others } });
          }}
        />
        {own > 0 && <span className="text-small text-ink-2">{own} settled by themselves.</span>}
      </div>
    </div>
  );
}
