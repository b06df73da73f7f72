import type { ReactNode } from 'react';
import { BrandMark } from '../../../components/layout/brand-mark.tsx';
import { Content } from '../../../components/layout/content.tsx';
import { PageTitle } from '../../../components/layout/page-title.tsx';
import { StreetSection } from './street-section.tsx';

/** The pages before the house: a drawing, and a title block with one thing to do. */
export function Doorway({
  title,
  children,
}: {
  readonly title: string;
  readonly children: ReactNode;
}) {
  return (
    <Content className="grid grid-cols-[minmax(0,1fr)_404px] overflow-auto max-md:block">
      <PageTitle>{title}</PageTitle>
      <div className="flex flex-col bg-sheet p-8 max-md:p-0">
        <StreetSection />
        <p className="max-w-[46ch] text-h2 leading-snug text-ink-2 max-md:hidden">
          What a tunnel will do to every building above it, with the working shown.
        </p>
      </div>
      <div className="flex flex-col justify-center border-l border-ink bg-paper px-8 py-8 max-md:block max-md:border-t max-md:border-l-0 max-sm:px-4 max-sm:pt-5">
        <p className="mb-6 flex items-center gap-[9px] border-b-2 border-ink pb-2 text-lead font-bold">
          <BrandMark />
          Groundsill
        </p>
        <h1 className="mb-4 text-h1 max-sm:text-h2">{title}</h1>
        {children}
      </div>
    </Content>
  );
}
