import { Refusal, withSentences } from './refusal.mjs';
import { signalToStop } from './signals.mjs';

/**
 * Serves until the signal to stop, or until `serve` resolves with the reason why it cannot go on, which is
 * a fault. Either way, what `serve` has put on its list to undo is undone, the newest first.
 */
export function untilStopped(serve) {
  return withSentences(async () => {
    const signal = signalToStop();
    const undo = [];
    // whoever read what is printed may go; what was started must still be stopped
    process.stdout.on('error', () => undefined);
    try {
      const reason = await serve(signal, undo);
      if (!signal.aborted) throw new Refusal(reason);
    } catch (error) {
      if (!signal.aborted) throw error;
    } finally {
      for (const stop of undo.reverse()) await stop();
    }
    console.log('\nStopped.');
  });
}
