import type { Browser, ConsoleMessage, Page, Request } from 'playwright-core';

export type Visitor = {
  readonly page: Page;
  /** Opens a page of ours by its path, or by its whole address. */
  readonly open: (path: string) => Promise<void>;
  /** Takes back one fault that the journey meant to bring about, and complains where there was none. */
  readonly expectFault: (pattern: RegExp) => void;
  /** What went wrong so far, seen from the browser. */
  readonly faults: readonly string[];
  readonly leave: () => Promise<void>;
};

const PATIENCE_MS = 60_000;

export type Size = { readonly width: number; readonly height: number };
export const DESK: Size = { width: 1280, height: 800 };
export const PHONE: Size = { width: 390, height: 844 };

/** Errors on the console and in scripts, and requests that leave this machine. */
function watch(page: Page, faults: string[]): void {
  page.on('console', (message: ConsoleMessage) => {
    if (message.type() !== 'error') return;
    faults.push(`console: ${message.text()} ${message.location().url}`);
  });
  page.on('pageerror', (error: Error) => {
    faults.push(`script: ${error.message}`);
  });
  page.on('request', (request: Request) => {
    const { protocol, hostname } = new URL(request.url());
    if (['data:', 'blob:'].includes(protocol) || hostname === '127.0.0.1') return;
    faults.push(`request to ${request.url()}`);
  });
}

/** Somebody with a browser window of their own, not signed in. */
export async function newVisitor(browser: Browser, baseURL: string, size = DESK): Promise<Visitor> {
  const context = await browser.newContext({
    baseURL,
    viewport: size,
    locale: 'en-GB',
    reducedMotion: 'reduce',
    // what is drawn by software takes time by its pixels; pages are laid out as at the full number
    deviceScaleFactor: 0.5,
  });
  context.setDefaultTimeout(PATIENCE_MS);
  const faults: string[] = [];
  context.on('page', (page) => {
    watch(page, faults);
  });
  const page = await context.newPage();
  return {
    page,
    faults,
    open: async (path) => {
      await page.goto(path);
    },
    expectFault: (pattern) => {
      const index = faults.findIndex((fault) => pattern.test(fault));
      if (index < 0) throw new Error(`No fault like ${pattern} among: ${faults.join('; ')}`);
      faults.splice(index, 1);
    },
    leave: () => context.close(),
  };
}
