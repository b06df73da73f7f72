import type { KeyHelp } from '../../config/keys-at-hand.ts';
import { classNames } from '../../lib/class-names.ts';
import { KeyCap } from './key-cap.tsx';

type KeyListProps = {
  readonly help: readonly KeyHelp[];
  /** Hairlines between the lines. */
  readonly ruled?: boolean;
  readonly className?: string;
};

/** Keys and what each does. */
export function KeyList({ help, ruled = false, className }: KeyListProps) {
  return (
    <dl
      className={classNames('grid grid-cols-[auto_1fr] items-center gap-x-4 text-small', className)}
    >
      {help.map(({ keys, does }) => (
        <div
          key={does}
          className={classNames(
            'col-span-2 grid grid-cols-subgrid items-center',
            ruled ? 'border-b border-hairline py-1.5' : 'py-[3px]',
          )}
        >
          <dt className="flex gap-1">
            {keys.map((key) => (
              <KeyCap key={key}>{key}</KeyCap>
            ))}
          </dt>
          <dd>{does}</dd>
        </div>
      ))}
    </dl>
  );
}
