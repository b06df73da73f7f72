import type { Letter } from '../mail/mailer.ts';
import type { Services } from '../services.ts';

/** Sends a letter after what it tells of is kept; whether it went out. What fails is in the log. */
export async function sendLetter(
  { mailer, logger }: Pick<Services, 'mailer' | 'logger'>,
  letter: Letter,
): Promise<boolean> {
  try {
    await mailer.send(letter);
    return true;
  } catch (error) {
    logger.error({ err: error, subject: letter.subject }, 'a letter was not sent');
    return false;
  }
}
