// @vitest-environment node
import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { MAP_COLOURS } from '../../../../../src/features/map/style/map-colours.ts';

function tokenOf(name: string): string {
  return name.replace(/[A-Z0-9]/g, (letter) => `-${letter.toLowerCase()}`);
}

it('the map draws in the colours of the page', () => {
  const tokens = readFileSync('src/theme/tokens.css', 'utf8');
  const colours = [...tokens.matchAll(/--([a-z0-9-]+):\s*(#[0-9a-f]{6});/gi)];
  const page = new Map(colours.map(([, name = '', value = '']) => [name, value.toLowerCase()]));
  for (const [name, colour] of Object.entries(MAP_COLOURS)) {
    expect([name, page.get(tokenOf(name))]).toEqual([name, colour]);
  }
});
