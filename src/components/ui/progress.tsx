import { useId } from 'react';
import { formatCount } from '../../../shared/presentation/format-number.ts';
import { Button } from './button.tsx';

type ProgressProps = {
  readonly label: string;
  readonly done: number;
  readonly total: number;
  /** What is counted, as `rows` or `kB`. */
  readonly unit: string;
  /** How long it will still take, when that can be told. */
  readonly left?: string;
  readonly onCancel?: () => void;
};

/** Long work as a figure: done of total, per cent, time left, and a way to stop it. */
export function Progress({ label, done, total, unit, left, onCancel }: ProgressProps) {
  const id = useId();
  const share = total === 0 ? 0 : Math.min(1, done / total);
  const percent = Math.floor(share * 100);
  const figure = `${formatCount(done)} of ${formatCount(total)} ${unit}`;
  return (
    <div>
      <div className="flex flex-wrap items-baseline gap-x-3 text-small">
        <span id={id} className="font-semibold">
          {label}
        </span>
        <span className="text-ink-2">
          {figure}, {percent} %{left === undefined ? '' : `, ${left}`}
        </span>
        {onCancel !== undefined && (
          <Button kind="quiet" className="ml-auto" onClick={onCancel}>
            Cancel
          </Button>
        )}
      </div>
      <div
        role="progressbar"
        aria-labelledby={id}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={percent}
        aria-valuetext={figure}
        className="mt-1.5 h-[5px] border-y border-hairline bg-paper-sunk"
      >
        <div className="h-full bg-ink" style={{ width: `${percent}%` }} />
      </div>
    </div>
  );
}
