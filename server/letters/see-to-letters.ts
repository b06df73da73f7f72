import type { Services } from '../services.ts';
import { remindLate } from './remind-late.ts';
import { removeKept } from './remove-kept.ts';

const HOUR_MS = 60 * 60 * 1000;

/**
 * Reminds late owners, and removes what was kept of erased parties once its time has passed: now and every
 * hour, until told to stop.
 */
export function seeToLetters(
  services: Pick<Services, 'database' | 'outbox' | 'env' | 'logger'>,
): () => void {
  const { logger } = services;
  function see(work: Promise<number>, done: string, failed: string): void {
    work.then(
      (count) => {
        if (count > 0) logger.info({ count }, done);
      },
      (error: unknown) => {
        logger.error({ err: error }, failed);
      },
    );
  }
  function seeToAll(): void {
    see(remindLate(services), 'owners were reminded', 'owners could not be reminded');
    see(removeKept(services), 'kept letters were removed', 'kept letters could not be removed');
  }
  seeToAll();
  const timer = setInterval(seeToAll, HOUR_MS);
  return () => {
    clearInterval(timer);
  };
}
