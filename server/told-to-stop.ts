/** Resolves when this process is told to stop, or when the one that started it is gone. */
export function toldToStop(): Promise<void> {
  return new Promise((resolve) => {
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) {
      process.on(signal, () => {
        resolve();
      });
    }
    process.once('disconnect', resolve);
  });
}
