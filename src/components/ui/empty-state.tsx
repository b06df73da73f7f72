import type { ReactNode } from 'react';

/** One sentence on what goes here and, for who may take it, one button for the first step. */
export function EmptyState({
  children,
  action,
}: {
  readonly children: ReactNode;
  readonly action?: ReactNode;
}) {
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-3 py-4 text-body text-ink-2">
      <p className="max-w-[60ch]">{children}</p>
      {action}
    </div>
  );
}
