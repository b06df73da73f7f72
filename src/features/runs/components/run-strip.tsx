import type { ReactNode } from 'react';

/** A line under the basis line, as wide as the screen. */
export function RunStrip({ children }: { readonly children: ReactNode }) {
  return (
    <section
      aria-label="Runs"
      className="flex-none border-b border-hairline bg-paper-raised px-4 py-1.5 print:hidden"
    >
      {children}
    </section>
  );
}
