import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { Page } from 'playwright-core';
import { createApp } from '../../server/app.ts';
import { hashPassword } from '../../server/authentication/password-hash.ts';
import { Membership } from '../../server/models/membership.ts';
import { Person } from '../../server/models/person.ts';
import type { Scheme } from '../../server/models/scheme.ts';
import type { OpenServices } from '../../server/open-services.ts';
import { openChromium } from '../open-chromium.ts';
import { percentiles } from './percentiles.ts';

const WHO = { email: 'designer@example.org', password: 'a password for the bench' } as const;
const SCREEN = { width: 1920, height: 1400 };
/** From where the Plan begins: once out and so often upwards, the whole town is seen. */
const UPWARDS = 4;
const PATIENCE_MS = 180_000;
const QUIET_MS = 500;
const CLOSER = 3;
const ROUNDS = 3;
/** What is pressed in turn; each changes what buildings are coloured by. */
const PRESSED = ['High', 'Low', 'Stage', 'Category', 'Settlement', 'Category'];

/** A frame of the map: when its last command was given, when all were carried out, and a sum of its pixels. */
type Frame = { readonly told: number; readonly seen: number; readonly picture: number };

/** The page with the frames that its map has drawn since somebody last forgot them. */
type Watched = Window & { drawnFrames: Frame[] };

/** In the page: notes the frames that are drawn. */
function watchFrames(): void {
  const watched = window as unknown as Watched;
  watched.drawnFrames = [];
  const { prototype } = WebGL2RenderingContext;
  const draw = Reflect.get(prototype, 'drawElements') as (...command: unknown[]) => void;
  let isNoted = false;
  Reflect.set(
    prototype,
    'drawElements',
    function (this: WebGL2RenderingContext, ...command: unknown[]): void {
      draw.apply(this, command);
      if (isNoted) return;
      isNoted = true;
      // runs once the whole frame has been told; to read from it is to wait until it is drawn
      queueMicrotask(() => {
        const told = performance.now();
        const [wide, high] = [this.drawingBufferWidth, this.drawingBufferHeight];
        const pixels = new Uint8Array(4 * wide * high);
        this.readPixels(0, 0, wide, high, this.RGBA, this.UNSIGNED_BYTE, pixels);
        const picture = new Uint32Array(pixels.buffer).reduce(
          (sum, one) => (31 * sum + one) | 0,
          0,
        );
        watched.drawnFrames.push({ told, seen: performance.now(), picture });
        isNoted = false;
      });
    },
  );
}

/** Waits until the map is at rest: what it was to fetch has come, and no frame is drawn any more. */
async function untilStill(page: Page): Promise<void> {
  await page.locator('[aria-busy="false"]').waitFor();
  await page.waitForFunction(
    (quiet) =>
      performance.now() - ((window as unknown as Watched).drawnFrames.at(-1)?.seen ?? 0) > quiet,
    QUIET_MS,
  );
}

type Recoloured = {
  /** From the press to the last command of the frame that shows it, less what others took to be drawn. */
  readonly told: number;
  /** From the press until that frame is drawn. */
  readonly seen: number;
};

/** Presses one of the ways to colour buildings: the frames since, with the one before. */
async function framesAfter(page: Page, name: string): Promise<{ start: number; frames: Frame[] }> {
  const start = await page.evaluate((label) => {
    const buttons = [...document.querySelectorAll<HTMLElement>('button[aria-pressed]')];
    const button = buttons.find(({ textContent }) => textContent === label);
    if (button === undefined) throw new Error(`There is nothing to press that is called ${label}.`);
    const watched = window as unknown as Watched;
    watched.drawnFrames = watched.drawnFrames.slice(-1);
    const pressed = performance.now();
    button.click();
    return pressed;
  }, name);
  await page.waitForFunction(() => (window as unknown as Watched).drawnFrames.length > 1);
  await untilStill(page);
  const frames = await page.evaluate(() => (window as unknown as Watched).drawnFrames);
  return { start, frames };
}

/** What a change of colour takes until nothing that is seen changes any more; null where nothing does. */
async function recoloured(page: Page, name: string): Promise<Recoloured | null> {
  const { start, frames } = await framesAfter(page, name);
  const last = frames.findLastIndex(
    ({ picture }, k) => k > 0 && picture !== frames[k - 1]?.picture,
  );
  const shown = frames[last];
  if (shown === undefined) return null;
  const others = frames.slice(1, last).reduce((sum, { told, seen }) => sum + seen - told, 0);
  return { told: shown.told - start - others, seen: shown.seen - start };
}

/** Prints what changes of colour take in what the map shows. */
async function benchView(page: Page, name: string): Promise<void> {
  await untilStill(page);
  const all: Recoloured[] = [];
  for (let round = 0; round < ROUNDS; round += 1) {
    for (const pressed of PRESSED) {
      const found = await recoloured(page, pressed);
      if (found !== null) all.push(found);
    }
  }
  const of = (part: keyof Recoloured) => percentiles(all.map((one) => one[part]));
  console.log(`map, ${name}: ${all.length} times other colours, told to whoever draws ${of('told')}; drawn without a graphics processor ${of('seen')}`); // prettier-ignore
}

async function openTown(page: Page, scheme: Scheme): Promise<void> {
  await page.addInitScript(watchFrames);
  await page.goto('/');
  await page.getByLabel('E-mail').fill(WHO.email);
  await page.getByLabel('Password', { exact: true }).fill(WHO.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.getByRole('heading', { name: 'Waiting for you' }).waitFor();
  await page.goto(`/schemes/${scheme.id}/plan`);
  await page.getByRole('region', { name: 'Legend' }).getByRole('table').waitFor();
}

async function press(page: Page, name: string, times: number): Promise<void> {
  for (let k = 0; k < times; k += 1) await page.getByRole('button', { name }).click();
}

async function benchInBrowser(address: string, scheme: Scheme): Promise<void> {
  const browser = await openChromium();
  try {
    const context = await browser.newContext({ baseURL: address, viewport: SCREEN });
    context.setDefaultTimeout(PATIENCE_MS);
    const page = await context.newPage();
    await openTown(page, scheme);
    await press(page, 'Zoom out', 1);
    await page.getByRole('region', { name: /^Map of / }).focus();
    for (let k = 0; k < UPWARDS; k += 1) await page.keyboard.press('ArrowUp');
    await benchView(page, 'the whole town');
    await press(page, 'Zoom in', CLOSER);
    await benchView(page, 'some streets of it');
  } finally {
    await browser.close();
  }
}

/** Prints what it takes to colour a town anew on the Plan, by what its newest run found. */
export async function benchRecolouring(
  { services, pool }: Pick<OpenServices, 'services' | 'pool'>,
  scheme: Scheme,
): Promise<void> {
  const passwordHash = await hashPassword(WHO.password);
  const { id } = await Person.create({ name: 'Designer', email: WHO.email, passwordHash });
  await Membership.create({ schemeId: scheme.id, personId: id, role: 'designer' });
  const server = createServer(createApp(services, pool, process.cwd()));
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.address() as AddressInfo;
  try {
    await benchInBrowser(`http://127.0.0.1:${port}`, scheme);
  } finally {
    server.closeAllConnections();
    server.close();
  }
}
