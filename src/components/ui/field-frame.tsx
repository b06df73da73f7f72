import { useId, type ReactNode } from 'react';
import { classNames } from '../../lib/class-names.ts';

/** What every field is told around its input. */
export type FieldWords = {
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  readonly error?: string | undefined;
};

/** What ties an input to its label, hint and error. */
export type FieldTies = {
  readonly id: string;
  readonly 'aria-invalid': true | undefined;
  readonly 'aria-describedby': string | undefined;
};

/** The look of a box that is written in. */
export const INPUT_STYLE =
  'w-full rounded border border-control bg-sheet px-2 text-body text-ink max-sm:text-h3 ' +
  'aria-invalid:border-clay aria-invalid:border-l-4';

type FrameProps = FieldWords & {
  readonly className?: string | undefined;
  readonly children: (ties: FieldTies) => ReactNode;
};

/** Label above, hint and error below; the error is tied to the input and said aloud when it comes. */
export function FieldFrame({ label, hint, error, className, children }: FrameProps) {
  const id = useId();
  const hintId = hint === undefined ? undefined : `${id}-hint`;
  const errorId = error === undefined ? undefined : `${id}-error`;
  const described = [hintId, errorId].filter((part) => part !== undefined).join(' ');
  return (
    <div className={classNames('min-w-0', className)}>
      <label htmlFor={id} className="mb-1 block text-small font-semibold">
        {label}
      </label>
      {children({
        id,
        'aria-invalid': error === undefined ? undefined : true,
        'aria-describedby': described === '' ? undefined : described,
      })}
      <div aria-live="polite">
        {error !== undefined && (
          <p id={errorId} className="mt-1 text-small font-medium text-clay-deep">
            {error}
          </p>
        )}
      </div>
      {hint !== undefined && (
        <p id={hintId} className="mt-1 text-cap text-ink-3">
          {hint}
        </p>
      )}
    </div>
  );
}
