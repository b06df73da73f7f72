import type { RunAnswer } from '../../../../shared/schemas/runs.ts';
import { Menu, MENU_LINE } from '../../../components/ui/menu.tsx';
import { formatShortMoment } from '../../../lib/format-date.ts';
import { completeOf } from '../run-states.ts';
import { runName } from '../../../../shared/presentation/run-words.ts';

type RunMenuProps = {
  readonly runs: readonly RunAnswer[];
  readonly shown: RunAnswer | null;
  readonly onChoose: (runId: string) => void;
};

/** Which run is shown, and the others that can be. */
export function RunMenu({ runs, shown, onChoose }: RunMenuProps) {
  const now = new Date();
  const name =
    shown === null
      ? 'No run of it'
      : `${runName(shown)}, ${formatShortMoment(shown.startedAt, now)}`;
  return (
    <Menu
      align="left"
      name={`${name}, choose another run`}
      button={
        <>
          <b>{name}</b> <span aria-hidden="true">▾</span>
        </>
      }
      buttonClassName="-my-1 flex min-h-6 items-center gap-1 hover:text-ink max-sm:min-h-11"
    >
      {completeOf(runs).map((run) => (
        <button
          key={run.id}
          type="button"
          aria-pressed={run.id === shown?.id}
          className={MENU_LINE}
          onClick={() => {
            onChoose(run.id);
          }}
        >
          <span aria-hidden="true" className="w-3 flex-none">
            {run.id === shown?.id ? '✓' : ''}
          </span>
          <span>
            {runName(run)} · {run.option.name} · {formatShortMoment(run.startedAt, now)}
            <span className="block text-cap text-ink-3">
              {run.startedBy ?? 'Started by the system'}
              {run.isShown && ', the newest'}
            </span>
          </span>
        </button>
      ))}
    </Menu>
  );
}
