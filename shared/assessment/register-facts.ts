import { completeAttributes, type CompleteAttributes } from '../building/assumed-attributes.ts';
import { stiffnessOfConstruction } from '../building/stiffness-of-construction.ts';
import type { Wall } from '../building/wall.ts';
import { wallsOfFootprint } from '../building/walls-of-footprint.ts';
import { boundingBox } from '../geometry/bounding-box.ts';
import type { PlanPoint } from '../geometry/point.ts';
import { groundLevelBeside } from '../ground/ground-level-beside.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import { certain } from '../numerics/range.ts';
import type { HoldFacts } from './holds.ts';

/**
 * What a register knows of a building, as far as the method asks. Null is unknown.
 *
 * Units: m, levels above datum. Valid: parts of outer ring and holes, rings closed or not. Source: [own].
 */
export type RegisterFacts = {
  readonly id: string;
  readonly parts: readonly (readonly (readonly PlanPoint[])[])[];
  readonly storeys: number | null;
  readonly eavesHeight: number | null;
  readonly groundLevel: number | null;
  readonly foundingLevel: number | null;
  readonly eOverG: number | null;
  readonly poisson: number | null;
  readonly construction: string | null;
  readonly foundation: string | null;
  readonly listedGrade: string | null;
  readonly condition: string | null;
};

/**
 * What can be assumed of a building for want of a value.
 *
 * Units: none. Valid: closed list. Source: [common].
 */
export type Assumed = CompleteAttributes['assumed'][number] | 'groundLevel';

/**
 * A building of the register made ready: levels, walls by letter, and what had to be assumed.
 *
 * Units: m. Valid: made by `preparedBuilding`. Source: [own]; assumed values are [common].
 */
export type PreparedBuilding = {
  readonly id: string;
  readonly rings: readonly (readonly PlanPoint[])[];
  readonly groundLevel: number;
  readonly foundingLevel: number;
  readonly attributes: CompleteAttributes;
  readonly walls: readonly Wall[];
  readonly holds: HoldFacts;
  readonly assumed: readonly Assumed[];
};

const LETTERS = 'abcdefghijklmnopqrstuvwxyz';

/**
 * The letter of a wall: a to z, then aa, ab and so on.
 *
 * Units: none. Valid: indexes from 0. Source: [own].
 */
export function wallLetter(index: number): string {
  const [rest, last] = [Math.floor(index / LETTERS.length) - 1, index % LETTERS.length];
  const letter = LETTERS.charAt(last);
  return rest < 0 ? letter : wallLetter(rest) + letter;
}

function middleOf(parts: RegisterFacts['parts']): PlanPoint {
  const { west, south, east, north } = boundingBox(parts.flat(2));
  return [(west + east) / 2, (south + north) / 2];
}

/** Undefined where nobody knows: what is unknown holds nothing. */
function says(words: string | null, pattern: RegExp): boolean | undefined {
  return words === null ? undefined : pattern.test(words);
}

function holdFacts(facts: RegisterFacts, foundingDepth: number | undefined): HoldFacts {
  const known = {
    foundingDepth,
    piled: says(facts.foundation, /\bpile/i),
    listed:
      facts.listedGrade === null ? undefined : !/^(not listed|none|no)$/i.test(facts.listedGrade),
    poorCondition: says(facts.condition, /\b(very )?(poor|bad)\b/i),
  };
  return Object.fromEntries(Object.entries(known).filter(([, value]) => value !== undefined));
}

function attributesOf(facts: RegisterFacts, foundingDepth: number | undefined): CompleteAttributes {
  const stiffness = stiffnessOfConstruction(facts.construction);
  const known = {
    storeys: facts.storeys ?? undefined,
    eavesHeight: facts.eavesHeight ?? undefined,
    foundingDepth,
    eOverG: facts.eOverG ?? stiffness?.eOverG,
    poisson: facts.poisson ?? stiffness?.poisson,
  };
  const given = Object.fromEntries(
    Object.entries(known).filter(([, value]) => value !== undefined),
  );
  return completeAttributes(given);
}

/**
 * Makes a building of the register ready for the method: what is unknown is assumed and named, the ground
 * level is that beside the nearest drive where the building has none, walls are lettered part by part.
 *
 * Units: m. Valid: any facts; `defaultGroundLevel` stands where no drive tells one either.
 * Source: [own]; assumed values are [common].
 */
export function preparedBuilding(
  facts: RegisterFacts,
  model: GroundModel,
  defaultGroundLevel: number,
): PreparedBuilding {
  const groundLevel =
    facts.groundLevel ?? groundLevelBeside(model, middleOf(facts.parts)) ?? defaultGroundLevel;
  const depth = facts.foundingLevel === null ? undefined : groundLevel - facts.foundingLevel;
  const attributes = attributesOf(facts, depth);
  const foundingLevel = facts.foundingLevel ?? groundLevel - attributes.foundingDepth;
  const isGroundAssumed = facts.groundLevel === null;
  const walls = facts.parts.flatMap((rings) => wallsOfFootprint(rings));
  return {
    id: facts.id,
    rings: facts.parts.flat(),
    groundLevel,
    foundingLevel,
    attributes,
    walls: walls.map((segment, index) => ({
      name: wallLetter(index),
      segment,
      groundLevel,
      groundLevelAssumed: isGroundAssumed,
      foundingLevel,
      height: attributes.height,
      eOverG: certain(attributes.eOverG),
      poisson: attributes.poisson,
    })),
    holds: holdFacts(facts, depth),
    assumed: [...attributes.assumed, ...(isGroundAssumed ? (['groundLevel'] as const) : [])],
  };
}
