import { useEffect, useRef, useState } from 'react';
import { createLatestAsked } from '../preview/latest-asked.ts';
import { openPreviewWorker } from '../preview/open-preview-worker.ts';
import type { Case, Worked } from '../preview/preview-work.ts';

/** The newest answer of a worker of its own; the older one stays until it is there. */
export function useWorked(asked: Case | null): Worked | null {
  const [worked, setWorked] = useState<Worked | null>(null);
  const line = useRef<ReturnType<typeof createLatestAsked> | null>(null);

  useEffect(() => {
    if (asked === null) return;
    line.current ??= createLatestAsked(openPreviewWorker(), setWorked);
    line.current.ask(asked);
  }, [asked]);
  useEffect(
    () => () => {
      line.current?.end();
      line.current = null;
    },
    [],
  );
  return asked === null ? null : worked;
}
