import type { Services } from '../services.ts';
import { remindLate } from './remind-late.ts';

const HOUR_MS = 60 * 60 * 1000;

/** Reminds late owners now and every hour, until told to stop. */
export function keepReminding(
  services: Pick<Services, 'database' | 'outbox' | 'env' | 'logger'>,
): () => void {
  const { logger } = services;
  function remind(): void {
    remindLate(services).then(
      (count) => {
        if (count > 0) logger.info({ count }, 'owners were reminded');
      },
      (error: unknown) => {
        logger.error({ err: error }, 'owners could not be reminded');
      },
    );
  }
  remind();
  const timer = setInterval(remind, HOUR_MS);
  return () => {
    clearInterval(timer);
  };
}
