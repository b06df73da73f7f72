import { act } from '@testing-library/react';
import { vi } from 'vitest';

/** A stream of events of which a test decides what comes. */
class FakeEventSource extends EventTarget {
  static readonly CLOSED = 2;
  static readonly opened: FakeEventSource[] = [];
  readonly url: string;
  readyState = 1;

  constructor(url: string) {
    super();
    this.url = url;
    FakeEventSource.opened.push(this);
  }

  close(): void {
    this.readyState = FakeEventSource.CLOSED;
  }
}

/** Puts streams in place of the browser's; `tell` sends something on the newest, `breakOff` ends it. */
export function fakeEventSource() {
  FakeEventSource.opened.length = 0;
  vi.stubGlobal('EventSource', FakeEventSource);
  const newest = () => FakeEventSource.opened.at(-1);
  return {
    opened: () => FakeEventSource.opened.map(({ url }) => url),
    isClosed: () => newest()?.readyState === FakeEventSource.CLOSED,
    tell: (data: unknown) => {
      act(() => {
        newest()?.dispatchEvent(new MessageEvent('message', { data: JSON.stringify(data) }));
      });
    },
    breakOff: () => {
      act(() => {
        newest()?.close();
        newest()?.dispatchEvent(new Event('error'));
      });
    },
  };
}
