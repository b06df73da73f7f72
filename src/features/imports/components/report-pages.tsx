import { Button } from '../../../components/ui/button.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { ROWS_PER_PAGE } from '../api/list-rows.ts';

type ReportPagesProps = {
  readonly offset: number;
  readonly found: number;
  readonly onGoTo: (offset: number) => void;
};

/** Which lines of how many are shown, and the way to the others. */
export function ReportPages({ offset, found, onGoTo }: ReportPagesProps) {
  const last = Math.min(found, offset + ROWS_PER_PAGE);
  return (
    <div className="flex flex-wrap items-center gap-x-2 text-small text-ink-2">
      <span aria-live="polite">
        {found === 0
          ? 'No lines'
          : `Lines ${formatCount(offset + 1)} to ${formatCount(last)} of ${formatCount(found)}`}
      </span>
      {offset > 0 && (
        <Button
          kind="quiet"
          onClick={() => {
            onGoTo(Math.max(0, offset - ROWS_PER_PAGE));
          }}
        >
          Earlier lines
        </Button>
      )}
      {last < found && (
        <Button
          kind="quiet"
          onClick={() => {
            onGoTo(offset + ROWS_PER_PAGE);
          }}
        >
          Later lines
        </Button>
      )}
    </div>
  );
}
