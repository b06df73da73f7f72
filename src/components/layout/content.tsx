import type { ReactNode } from 'react';
import { classNames } from '../../lib/class-names.ts';

/** What is under the bar. It scrolls; the bar stays. */
export function Content({
  children,
  className = 'overflow-auto',
}: {
  readonly children: ReactNode;
  readonly className?: string;
}) {
  return (
    <main
      id="content"
      tabIndex={-1}
      className={classNames('min-h-0 flex-1 outline-none print:overflow-visible', className)}
    >
      {children}
    </main>
  );
}
