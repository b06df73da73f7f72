import type { ReactNode } from 'react';

/** The one thing that an owner is asked to do. */
export function AskedBox({
  title,
  children,
}: {
  readonly title: string;
  readonly children: ReactNode;
}) {
  return (
    <section
      aria-label={title}
      className="mt-5 border-l-4 border-clay bg-paper-raised px-5 pt-4 pb-5 max-sm:-mx-[18px] print:hidden"
    >
      <h2 className="mb-2 text-h2">{title}</h2>
      {children}
    </section>
  );
}
