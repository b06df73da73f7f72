import type { ReactNode } from 'react';
import { Panel } from '../../../components/ui/panel.tsx';

type MethodSectionProps = {
  /** By which the contents and others point to it. */
  readonly id: string;
  readonly title: string;
  readonly note?: ReactNode;
  readonly action?: ReactNode;
  readonly children: ReactNode;
};

/** A part of the page that has a place of its own in the contents. */
export function MethodSection({ id, ...panel }: MethodSectionProps) {
  return (
    <div id={id} className="mt-8 scroll-mt-4 first:mt-0">
      <Panel {...panel} />
    </div>
  );
}
