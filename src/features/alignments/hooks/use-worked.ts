import { useEffect, useRef, useState } from 'react';
import { createLatestAsked } from '../preview/latest-asked.ts';
import { openPreviewWorker } from '../preview/open-preview-worker.ts';
import type { Asked, Worked } from '../preview/preview-work.ts';

type Answer = { readonly worked: Worked; readonly asked: Asked };

/** The newest answer of a worker of its own; the older one stays until it is there. */
export function useWorked(asked: Asked | null): Answer | null {
  const [answer, setAnswer] = useState<Answer | null>(null);
  const line = useRef<ReturnType<typeof createLatestAsked> | null>(null);

  useEffect(() => {
    if (asked === null) return;
    line.current ??= createLatestAsked(openPreviewWorker(), (worked, of) => {
      setAnswer({ worked, asked: of });
    });
    line.current.ask(asked);
  }, [asked]);
  useEffect(
    () => () => {
      line.current?.end();
      line.current = null;
    },
    [],
  );
  return asked === null ? null : answer;
}
