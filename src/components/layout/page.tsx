import type { ReactNode } from 'react';
import { classNames } from '../../lib/class-names.ts';
import { PageTitle } from './page-title.tsx';

type PageProps = {
  readonly title: string;
  /** Stands under the heading. */
  readonly lead?: ReactNode;
  /** What is at the right: lists beside forms, forms beside lists. */
  readonly aside?: ReactNode;
  readonly children: ReactNode;
};

/** A page with one heading; what stands aside comes after it on a phone. */
export function Page({ title, lead, aside, children }: PageProps) {
  return (
    <div
      className={classNames(
        'min-h-full',
        aside !== undefined && 'grid grid-cols-[minmax(0,1fr)_404px] max-lg:flex max-lg:flex-col',
      )}
    >
      <PageTitle>{title}</PageTitle>
      <div className="min-w-0 px-8 pt-[22px] pb-8 max-sm:px-4 max-sm:pt-4">
        <h1
          className={classNames(
            'text-h1 text-balance max-sm:text-h2',
            lead === undefined ? 'mb-3' : 'mb-1',
          )}
        >
          {title}
        </h1>
        {lead !== undefined && (
          <div className="mb-4 max-w-[84ch] text-roomy text-ink-2">{lead}</div>
        )}
        {children}
      </div>
      {aside !== undefined && (
        <aside className="border-l border-ink bg-paper-raised px-6 pt-[26px] pb-8 max-lg:flex-1 max-lg:border-t max-lg:border-l-0 max-lg:px-8 max-sm:px-4">
          {aside}
        </aside>
      )}
    </div>
  );
}
