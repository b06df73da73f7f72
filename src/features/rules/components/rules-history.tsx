import type { RulesVersion } from '../../../../shared/schemas/rules.ts';
import { formatMoment } from '../../../lib/format-date.ts';
import { classNames } from '../../../lib/class-names.ts';

type RulesHistoryProps = {
  readonly versions: readonly RulesVersion[];
  readonly shown: number;
  readonly onShow: (version: number) => void;
};

/** Every version, the newest first; pressed, it is shown. */
export function RulesHistory({ versions, shown, onShow }: RulesHistoryProps) {
  return (
    <ol className="text-small">
      {versions.map(({ version, createdAt, createdBy }, index) => (
        <li key={version}>
          <button
            type="button"
            aria-current={version === shown ? 'true' : undefined}
            onClick={() => {
              onShow(version);
            }}
            className={classNames(
              'block w-full border-b border-hairline px-3 py-2 text-left',
              version === shown
                ? 'bg-select-wash shadow-[inset_4px_0_var(--select)]'
                : 'hover:bg-paper-sunk',
            )}
          >
            <b className="font-semibold">Version {version}</b>
            {index === 0 && <span className="ml-1.5 text-ink-3">in force</span>}
            <span className="block text-cap text-ink-2">
              {formatMoment(createdAt)}, {createdBy.name}
            </span>
          </button>
        </li>
      ))}
    </ol>
  );
}
