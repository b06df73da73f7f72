import type { ReactNode } from 'react';
import { classNames } from '../../lib/class-names.ts';

type BasisLineProps = {
  /** What the screen rests on, from the most to the least important. */
  readonly parts: readonly ReactNode[];
  /** Which value is shown, or what is not recorded. */
  readonly end?: ReactNode;
  /** Nothing here is recorded: clay-washed, with a dashed edge. */
  readonly preview?: boolean;
};

/** The line under the bar that says what a working screen rests on. */
export function BasisLine({ parts, end, preview = false }: BasisLineProps) {
  return (
    <section
      aria-label="What this rests on"
      className={classNames(
        'flex min-h-7 flex-none flex-wrap items-center gap-y-0.5 px-4 py-1 text-cap text-ink-2',
        '[&_b]:font-semibold [&_b]:text-ink',
        preview
          ? 'border-b-2 border-dashed border-clay bg-clay-wash'
          : 'border-b border-hairline bg-paper',
      )}
    >
      {parts.map((part, index) => (
        <span
          key={index}
          className="border-rule max-sm:mr-3 sm:[&+&]:ml-3 sm:[&+&]:border-l sm:[&+&]:pl-3"
        >
          {part}
        </span>
      ))}
      {end !== undefined && <span className="sm:ml-auto sm:pl-6">{end}</span>}
    </section>
  );
}
