import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { Button } from '../../../components/ui/button.tsx';

type PagesProps = {
  /** What is counted, as `party` and `parties`. */
  readonly one: string;
  readonly many: string;
  readonly offset: number;
  readonly perPage: number;
  readonly found: number;
  readonly onGoTo: (offset: number) => void;
};

/** Which part of a long list is seen, and the ways to the others. */
export function Pages({ one, many, offset, perPage, found, onGoTo }: PagesProps) {
  const last = Math.min(found, offset + perPage);
  const all = `${found === 0 ? 'No' : formatCount(found)} ${found === 1 ? one : many}`;
  const part = `${formatCount(offset + 1)} to ${formatCount(last)} of ${all}`;
  return (
    <div className="mt-2 flex flex-wrap items-center gap-x-2 text-small text-ink-2">
      <span aria-live="polite">{found <= perPage && offset === 0 ? all : part}</span>
      {offset > 0 && (
        <Button
          kind="quiet"
          onClick={() => {
            onGoTo(Math.max(0, offset - perPage));
          }}
        >
          Earlier
        </Button>
      )}
      {last < found && (
        <Button
          kind="quiet"
          onClick={() => {
            onGoTo(offset + perPage);
          }}
        >
          Later
        </Button>
      )}
    </div>
  );
}
