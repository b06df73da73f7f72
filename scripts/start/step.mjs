/**
 * A doer of steps. Each prints a line of progress: what it is, then what came of it and how long it took;
 * its work answers with a word or two as `said`. No step begins after the signal to stop.
 */
export function stepper(signal) {
  return async (title, work) => {
    signal.throwIfAborted();
    process.stdout.write(`${title.padEnd(11)} … `);
    const start = performance.now();
    try {
      const { said = 'ready', ...result } = (await work()) ?? {};
      console.log(`${said} (${((performance.now() - start) / 1000).toFixed(1)} s)`);
      return result;
    } catch (error) {
      console.log('failed');
      throw error;
    }
  };
}
