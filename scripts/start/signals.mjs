/** Aborted by the first Ctrl-C or other signal to stop; later ones change nothing. */
export function signalToStop() {
  const controller = new AbortController();
  for (const name of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(name, () => controller.abort());
  return controller.signal;
}

export function whenAborted(signal) {
  return new Promise((resolve) => {
    if (signal.aborted) resolve();
    signal.addEventListener('abort', () => resolve(), { once: true });
  });
}
