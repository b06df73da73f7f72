import type { Browser } from 'playwright-core';
import { expect, test } from 'vitest';
import { openChromium } from '../../../scripts/open-chromium.ts';
import { keepToOneProcessor } from './one-processor.ts';
import { takeDemo } from './take-demo.ts';
import { newVisitor, type Size, type Visitor } from './visitor.ts';

type Stage = {
  /** The address of the demo that the file has to itself. */
  readonly demo: string;
  readonly browser: Browser;
  /** A new visitor; whatever goes wrong in their window fails the journey. */
  readonly visit: (size?: Size) => Promise<Visitor>;
};

/** A test that goes through the application in Chromium, as people do. */
export const journey = test.extend<Stage>({
  demo: [
    async ({}, use) => {
      const { address, giveBack } = takeDemo();
      await use(address);
      giveBack();
    },
    { scope: 'file' },
  ],
  browser: [
    async ({}, use) => {
      keepToOneProcessor();
      const browser = await openChromium();
      await use(browser);
      await browser.close();
    },
    // one for all journeys of a worker: it keeps what the map's shaders came to
    { scope: 'worker' },
  ],
  visit: async ({ browser, demo }, use) => {
    const visitors: Visitor[] = [];
    await use(async (size) => {
      const visitor = await newVisitor(browser, demo, size);
      visitors.push(visitor);
      return visitor;
    });
    await Promise.all(visitors.map(({ leave }) => leave()));
    expect(visitors.flatMap(({ faults }) => faults)).toEqual([]);
  },
});
