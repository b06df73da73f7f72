import { describe, expect, it, vi } from 'vitest';
import {
  createLatestAsked,
  type WorkerPort,
} from '../../../../src/features/alignments/preview/latest-asked.ts';
import {
  createPreviewWork,
  type Message,
  type Question,
  type Worked,
} from '../../../../src/features/alignments/preview/preview-work.ts';
import { aDesign } from '../../../support/designs.ts';

const RULES = { depth: { kind: 'clay' }, focus: 'axis' } as const;
const CASE = { design: aDesign(), rules: RULES };
const CONTOURS: Question = { kind: 'contours' };
const ALONG: Question = { kind: 'along' };

function across(chainage: number): Question {
  return { kind: 'across', chainage, halfWidth: 40 };
}

/** A worker that notes what it is asked, and answers when it is told to. */
function notedWorker() {
  const [sent, opened, ended] = [[] as Message[], vi.fn(), vi.fn()];
  let answer: (event: MessageEvent<Worked>) => void = () => undefined;
  const open = (): WorkerPort => {
    opened();
    return {
      postMessage: (message) => sent.push(message),
      terminate: ended,
      addEventListener: (_, listener) => {
        answer = listener;
      },
    };
  };
  return {
    ...{ open, sent, opened, ended },
    answer: (data: Worked) => {
      answer(new MessageEvent('message', { data }));
    },
  };
}

const ANSWER: Worked = { kind: 'contours', contours: [] };

describe('what a case is asked', () => {
  it('is answered for the case that was given last', () => {
    const work = createPreviewWork();
    const first = work({ preview: CASE, question: across(500) });
    expect(first).toMatchObject({ kind: 'across', trough: { section: { chainage: 500 } } });
    const rows = work({ preview: null, question: ALONG });
    if (rows.kind !== 'along' || first.kind !== 'across') throw new Error('other answers');
    const middle = first.trough.section.points.find(({ offset }) => offset === 0);
    expect(rows.rows.find(({ chainage }) => chainage === 500)?.settlement).toEqual(
      middle?.settlement,
    );
    const other = { ...CASE, design: aDesign({ groundLevel: 5 }) };
    expect(work({ preview: other, question: across(500) })).toMatchObject({
      trough: { section: { groundLevel: 5 } },
    });
  });

  it.each([CONTOURS, ALONG, across(0)])('is refused in words of a bad line', (question) => {
    const preview = { ...CASE, design: aDesign({ line: [[0, 0], [0, 0]] }) }; // prettier-ignore
    expect(createPreviewWork()({ preview, question })).toMatchObject({ kind: 'fault' });
  });
});

describe('asking a worker', () => {
  it('sends one question at a time, and of a kind that waits only the newest', () => {
    const worker = notedWorker();
    const { ask } = createLatestAsked(worker.open);
    expect(worker.opened).not.toHaveBeenCalled();
    const onWorked = vi.fn();
    for (const chainage of [1, 2, 3]) ask({ preview: CASE, question: across(chainage), onWorked });
    expect(worker.sent).toEqual([{ preview: CASE, question: across(1) }]);
    worker.answer(ANSWER);
    expect(worker.sent[1]).toEqual({ preview: null, question: across(3) });
    worker.answer(ANSWER);
    expect([worker.sent.length, onWorked.mock.calls.length]).toEqual([2, 2]);
    expect(worker.opened).toHaveBeenCalledTimes(1);
  });

  it('puts what follows the cursor first, and tells each who asked', () => {
    const worker = notedWorker();
    const { ask } = createLatestAsked(worker.open);
    const [onContours, onAcross] = [vi.fn(), vi.fn()];
    ask({ preview: CASE, question: ALONG, onWorked: vi.fn() });
    ask({ preview: CASE, question: CONTOURS, onWorked: onContours });
    ask({ preview: CASE, question: across(7), onWorked: onAcross });
    worker.answer(ANSWER);
    worker.answer(ANSWER);
    expect(worker.sent.map(({ question }) => question.kind)).toEqual([
      'along',
      'across',
      'contours',
    ]);
    expect(onAcross).toHaveBeenCalledTimes(1);
    expect(onContours).not.toHaveBeenCalled();
  });

  it('sends a case again when another was asked about between, and after an end', () => {
    const worker = notedWorker();
    const { ask, end } = createLatestAsked(worker.open);
    const other = { ...CASE, design: aDesign({ diameter: 9 }) };
    for (const preview of [CASE, other, CASE]) {
      ask({ preview, question: ALONG, onWorked: vi.fn() });
      worker.answer(ANSWER);
    }
    expect(worker.sent.map(({ preview }) => preview)).toEqual([CASE, other, CASE]);
    end();
    expect(worker.ended).toHaveBeenCalledTimes(1);
    ask({ preview: CASE, question: ALONG, onWorked: vi.fn() });
    expect(worker.sent[3]?.preview).toBe(CASE);
    expect(worker.opened).toHaveBeenCalledTimes(2);
  });
});
