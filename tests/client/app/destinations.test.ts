// @vitest-environment node
import { expect, it } from 'vitest';
import { schemeLinks } from '../../../src/app/destinations.ts';
import { aSchemeAnswer } from '../../support/answers.ts';

function tabs(abilities: Readonly<Record<string, boolean>>): string[] {
  return schemeLinks(aSchemeAnswer({ abilities })).map(({ label }) => label);
}

it('leads to evidence before the settings, for who may read it', () => {
  const reads = { readScheme: true, readRegister: true, readRules: true };
  expect(tabs({ ...reads, readEvidence: true })).toEqual([
    ...['Plan', 'Register', 'Evidence', 'Settings'],
  ]);
  expect(tabs(reads)).toEqual(['Plan', 'Register', 'Settings']);
});

it('leads an owner to their own building alone', () => {
  expect(tabs({ readScheme: true, readOwnBuildings: true })).toEqual(['My building']);
});
