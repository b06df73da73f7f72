// @vitest-environment node
import { describe, expect, it } from 'vitest';
import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import { buildingFacts } from '../../../../src/features/plan/building-facts.ts';

function building(overrides: Partial<BuildingAnswer> = {}): BuildingAnswer {
  return {
    id: 1,
    reference: 'B0001',
    name: null,
    address: null,
    centre: [1.64, 54.75],
    use: 'offices',
    storeys: 3,
    eavesHeight: 12.5,
    groundLevel: 3.16,
    foundingLevel: 1.96,
    foundation: 'strip',
    construction: 'masonry',
    listedGrade: null,
    condition: 'unknown',
    eOverG: null,
    poisson: null,
    inspected: null,
    area: 0,
    groundLevelFrom: null,
    assumed: [],
    version: 1,
    walls: [],
    footprint: [],
    bounds: [1.63, 54.74, 1.65, 54.76],
    ...overrides,
  };
}

function fact(label: string, overrides: Partial<BuildingAnswer> = {}) {
  return buildingFacts(building(overrides)).find((one) => one.label === label);
}

describe('buildingFacts', () => {
  it('gives heights to the decimetre and levels to the centimetre, in metres', () => {
    expect(fact('Eaves above ground')).toMatchObject({ value: '12.5', unit: 'm' });
    expect(fact('Ground level', { groundLevel: 3 })).toMatchObject({ value: '3.00', unit: 'm' });
    expect(fact('Founding level', { foundingLevel: -1.2 })?.value).toBe('\u22121.20');
    expect(fact('Founding level', { foundingLevel: -0.001 })?.value).toBe('0.00');
  });

  it('works out the founding depth where both levels are known, and only there', () => {
    expect(fact('Founding depth')?.value).toBe('1.20');
    expect(fact('Founding depth', { foundingLevel: null })?.value).toBeNull();
    expect(fact('Founding depth', { groundLevel: null })?.value).toBeNull();
  });

  it.each([null, 'unknown', ' Unknown', 'not known', ''])('takes %j for not known', (text) => {
    expect(fact('Condition', { condition: text })?.value).toBeNull();
  });

  it('knows a storey count of nought from one that is missing', () => {
    expect(fact('Storeys', { storeys: 0 })?.value).toBe('0');
    expect(fact('Storeys', { storeys: null })?.value).toBeNull();
  });
});
