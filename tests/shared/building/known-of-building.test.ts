import { describe, expect, it } from 'vitest';
import { completeAttributes } from '../../../shared/building/assumed-attributes.ts';
import { knownOfBuilding } from '../../../shared/building/known-of-building.ts';
import {
  STIFF_CONSTRUCTIONS,
  stiffnessOfConstruction,
} from '../../../shared/building/stiffness-of-construction.ts';
import { BUILDING_WORDS } from '../../../shared/schemas/building-fields.ts';
import { REFERENCES } from '../../../shared/references.ts';

const NOTHING = {
  storeys: null,
  eavesHeight: null,
  groundLevel: null,
  foundingLevel: null,
  construction: null,
  eOverG: null,
  poisson: null,
};

function assumed(more: Partial<Parameters<typeof knownOfBuilding>[0]>) {
  return completeAttributes(knownOfBuilding({ ...NOTHING, ...more })).assumed;
}

describe('stiffness by construction', () => {
  it('is that of masonry or of a frame, whatever the letters', () => {
    expect(stiffnessOfConstruction(' Masonry ')).toMatchObject({ eOverG: 2.6, poisson: 0.3 });
    for (const words of ['framed', 'Steel-framed', 'concrete framed', 'timber framed']) {
      expect(stiffnessOfConstruction(words)?.eOverG).toBe(12.5);
    }
    expect(Object.keys(REFERENCES)).toContain(stiffnessOfConstruction('masonry')?.source);
  });

  it('is known of every word that is offered', () => {
    for (const words of BUILDING_WORDS.construction ?? []) {
      expect(stiffnessOfConstruction(words)).toBeDefined();
    }
  });

  it('is not known of anything else', () => {
    for (const words of [null, '', 'mud', 'constructor', '__proto__', 'timber']) {
      expect(stiffnessOfConstruction(words)).toBeUndefined();
    }
    expect(STIFF_CONSTRUCTIONS).toHaveLength(5);
  });
});

describe('what is known of a building', () => {
  it('leaves everything to be assumed where nothing is', () => {
    expect(assumed({})).toEqual(['storeys', 'eavesHeight', 'foundingDepth', 'eOverG', 'poisson']);
  });

  it('takes a founding depth from two levels, and none that is not under the ground', () => {
    const known = knownOfBuilding({ ...NOTHING, groundLevel: 3, foundingLevel: 1.5 });
    expect(known).toEqual({ foundingDepth: 1.5 });
    expect(assumed({ groundLevel: 3, foundingLevel: 3 })).toContain('foundingDepth');
    expect(assumed({ foundingLevel: 3 })).toContain('foundingDepth');
  });

  it('takes stiffness as given before that of the construction', () => {
    const known = knownOfBuilding({ ...NOTHING, construction: 'masonry', eOverG: 4 });
    expect(known).toEqual({ eOverG: 4, poisson: 0.3 });
  });
});
