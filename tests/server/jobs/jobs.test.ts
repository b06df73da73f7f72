import { describe, expect, test } from 'vitest';
import { subjectOf, type Job } from '../../../server/jobs/job.ts';
import { createJobs } from '../../../server/jobs/jobs.ts';

function job(importId: string, schemeId = importId): Job {
  return { kind: 'check', importId, schemeId };
}

/** Jobs that end when they are told to, and what was done. */
function stage(most = 2) {
  const log: string[] = [];
  const ends = new Map<string, (error?: Error) => void>();
  const jobs = createJobs({
    atOnce: { import: most, print: 1 },
    run: (job, signal) =>
      new Promise((resolve, reject) => {
        log.push(`start ${subjectOf(job)}`);
        ends.set(subjectOf(job), (error) => {
          if (error) reject(error);
          else resolve();
        });
        signal.addEventListener('abort', () => {
          reject(new Error('stopped'));
        });
      }),
    onFailed: (failed, error) => {
      log.push(`failed ${subjectOf(failed)}: ${String(error)}`);
      return Promise.resolve(subjectOf(failed) === 'again' ? job('more') : undefined);
    },
    onEnded: (ended) => {
      log.push(`end ${subjectOf(ended)}`);
      return Promise.resolve();
    },
  });
  const turn = () => new Promise((resolve) => setImmediate(resolve));
  return { jobs, log, turn, end: (id: string, error?: Error) => ends.get(id)?.(error) };
}

describe('jobs', () => {
  test('are done few at once, and of a scheme one after the other', async () => {
    const { jobs, log, turn, end } = stage();
    for (const [id, scheme] of [['a', 's'], ['b', 's'], ['c', 't'], ['d', 'u']] as const) jobs.start(job(id, scheme)); // prettier-ignore
    await turn();
    expect(log).toEqual(['start a', 'start c']);
    end('c');
    await turn();
    expect(log.slice(2)).toEqual(['end c', 'start d']);
    end('a');
    await turn();
    expect(log.slice(4)).toEqual(['end a', 'start b']);
    end('b');
    end('d');
    await jobs.idle();
  });

  test('of printing wait for each other, and for no import', async () => {
    const { jobs, log, turn, end } = stage(1);
    jobs.start(job('a', 's'));
    for (const printId of ['p', 'q'])
      jobs.start({ kind: 'print', printId, schemeId: 's', file: '' });
    await turn();
    expect(log).toEqual(['start a', 'start p']);
    end('p');
    await turn();
    expect(log.slice(2)).toEqual(['end p', 'start q']);
    end('a');
    end('q');
    await jobs.idle();
  });

  test('stop when told, waiting or not, and have not failed then', async () => {
    const { jobs, log, turn } = stage(1);
    jobs.start(job('a'));
    jobs.start(job('b'));
    await turn();
    await Promise.all([jobs.stop('a'), jobs.stop('b')]);
    expect(log.toSorted()).toEqual(['end a', 'end b', 'start a']);
  });

  test('that fail are told, and may ask for another', async () => {
    const { jobs, log, turn, end } = stage();
    jobs.start(job('again'));
    await turn();
    end('again', new Error('no'));
    await turn();
    expect(log).toEqual(['start again', 'failed again: Error: no', 'end again', 'start more']);
    await jobs.close();
    expect(log.at(-1)).toBe('end more');
  });
});
