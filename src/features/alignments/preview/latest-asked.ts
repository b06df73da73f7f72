import type { Case, Message, Question, Worked } from './preview-work.ts';

/** What is asked of a worker; tests give one that only notes it. */
export type WorkerPort = Pick<Worker, 'terminate'> & {
  readonly postMessage: (message: Message) => void;
  readonly addEventListener: (
    type: 'message',
    listener: (event: MessageEvent<Worked>) => void,
  ) => void;
};

type Asked = {
  readonly preview: Case;
  readonly question: Question;
  readonly onWorked: (worked: Worked) => void;
};

/** What follows the cursor goes before what may take its time. */
const ORDER: readonly Question['kind'][] = ['across', 'along', 'contours'];

/**
 * Asks a worker one thing at a time: while it is busy, only the newest question of each kind waits. The
 * worker is opened when something is first asked. A case is sent once for all questions that follow.
 */
export function createLatestAsked(open: () => WorkerPort) {
  const waiting = new Map<Question['kind'], Asked>();
  let worker: WorkerPort | null = null;
  let asked: Asked | null = null;
  let known: Case | null = null;

  function sendNext(): void {
    const kind = ORDER.find((one) => waiting.has(one));
    asked = kind === undefined ? null : (waiting.get(kind) ?? null);
    if (kind === undefined || asked === null) return;
    waiting.delete(kind);
    const { preview, question } = asked;
    worker?.postMessage({ preview: preview === known ? null : preview, question });
    known = preview;
  }
  function opened(): WorkerPort {
    const port = open();
    port.addEventListener('message', ({ data }) => {
      // what comes after the end was asked of a worker that is gone
      if (port !== worker) return;
      const answered = asked;
      sendNext();
      answered?.onWorked(data);
    });
    return port;
  }
  return {
    ask: (next: Asked) => {
      worker ??= opened();
      waiting.set(next.question.kind, next);
      if (asked === null) sendNext();
    },
    end: () => {
      worker?.terminate();
      [worker, asked, known] = [null, null, null];
      waiting.clear();
    },
  };
}

export type LatestAsked = ReturnType<typeof createLatestAsked>;
