import { chromium, type Browser } from 'playwright-core';

const FLAGS = [
  '--no-sandbox',
  '--disable-dev-shm-usage',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--use-angle=swiftshader',
  '--enable-unsafe-swiftshader',
  '--disable-gpu-rasterization',
];

/**
 * Opens the Chromium of this machine that has no windows of its own. It asks for nothing outside and draws
 * without a graphics processor.
 */
export function openChromium(): Promise<Browser> {
  return chromium.launch({ executablePath: '/usr/bin/chromium-headless-shell', args: FLAGS });
}
