import type { ReactNode } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { Segments } from '../../../components/ui/segments.tsx';
import type { StripChoice } from '../hooks/use-strip-choice.ts';
import { ChainageField } from './chainage-field.tsx';

const VIEWS = [
  { value: 'across', label: 'Across' },
  { value: 'along', label: 'Along' },
] as const;

export type StripTools = {
  readonly strip: StripChoice;
  readonly chainage: number;
  readonly onGo: (chainage: number) => void;
  readonly isTable: boolean;
  readonly onTable: () => void;
};

type StripHeadProps = StripTools & {
  /** How it is drawn. */
  readonly words: string;
  /** The figures, each with the line that stands for it. */
  readonly children?: ReactNode;
};

/** Over the section: where it is, which one, how it is drawn, its figures. */
export function StripHead({ words, children, ...tools }: StripHeadProps) {
  const { strip, chainage, onGo, isTable, onTable } = tools;
  return (
    <div className="flex flex-wrap items-center gap-x-3.5 gap-y-1.5 px-4 pt-2 pb-1 text-cap text-ink-2">
      <div className="flex items-center gap-1.5 text-ink">
        <h2 className="text-small font-semibold">Section</h2>
        <ChainageField chainage={chainage} onGo={onGo} />
      </div>
      <div className="print:hidden">
        <Segments
          label="View of the section"
          segments={VIEWS}
          value={strip.view}
          onChange={strip.see}
        />
      </div>
      <p>{words}</p>
      <div className="ml-auto flex flex-wrap items-center gap-x-3.5 gap-y-1">{children}</div>
      <div className="flex items-center print:hidden">
        <Button kind="quiet" aria-pressed={isTable} onClick={onTable}>
          Table{' '}
          <span className="max-sm:hidden">
            <KeyCap>T</KeyCap>
          </span>
        </Button>
        <Button
          kind="quiet"
          aria-label="Hide the section"
          onClick={() => {
            strip.open(false);
          }}
        >
          Hide
        </Button>
      </div>
    </div>
  );
}
