import { useEffect, useState } from 'react';
import { createLatestAsked, type LatestAsked } from '../preview/latest-asked.ts';
import { openPreviewWorker } from '../preview/open-preview-worker.ts';
import type { Case, Question, Worked } from '../preview/preview-work.ts';

/** The thread in which a page works out its line. */
export function usePreviewThread(): LatestAsked {
  const [thread] = useState(() => createLatestAsked(openPreviewWorker));
  useEffect(() => thread.end, [thread]);
  return thread;
}

/** The newest answer to a question of its kind; the older one stays until it is there. */
export function useWorked(
  thread: LatestAsked,
  preview: Case | null,
  question: Question,
): Worked | null {
  const [worked, setWorked] = useState<Worked | null>(null);
  useEffect(() => {
    if (preview !== null) thread.ask({ preview, question, onWorked: setWorked });
  }, [thread, preview, question]);
  return preview === null ? null : worked;
}
