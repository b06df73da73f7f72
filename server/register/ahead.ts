/**
 * The same items in the same order, the next one already being made while the last one is worked with, so
 * that the database and this thread are busy at the same time. Whoever leaves early waits for the one begun.
 */
export async function* ahead<T>(items: AsyncIterable<T>): AsyncGenerator<T> {
  const source = items[Symbol.asyncIterator]();
  function begin(): Promise<IteratorResult<T>> {
    const next = source.next();
    // a fault is told where the item is awaited, if it still is
    next.catch(() => undefined);
    return next;
  }
  let next = begin();
  try {
    for (;;) {
      const result = await next;
      if (result.done === true) return;
      next = begin();
      yield result.value;
    }
  } finally {
    await source.return?.();
  }
}
