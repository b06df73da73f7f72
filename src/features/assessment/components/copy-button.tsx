import { useState } from 'react';
import { Button } from '../../../components/ui/button.tsx';

type CopyButtonProps = {
  readonly children: string;
  /** What is copied; made only when it is asked for. */
  readonly textOf: () => string;
};

/** Copies a text, and says so. */
export function CopyButton({ children, textOf }: CopyButtonProps) {
  const [said, setSaid] = useState('');

  function copy() {
    navigator.clipboard.writeText(textOf()).then(
      () => {
        setSaid('Copied.');
      },
      () => {
        setSaid('This browser does not let a page copy.');
      },
    );
  }
  return (
    <span className="inline-flex items-center gap-2 print:hidden">
      <Button kind="quiet" className="-ml-1.5" onClick={copy}>
        {children}
      </Button>
      <span role="status" className="text-cap text-ink-2">
        {said}
      </span>
    </span>
  );
}
