import { completeAttributes, type CompleteAttributes } from '../building/assumed-attributes.ts';
import { footprintMiddle } from '../building/footprint-middle.ts';
import { knownOfBuilding, type RegisteredAttributes } from '../building/known-of-building.ts';
import type { Wall } from '../building/wall.ts';
import { wallsOfFootprint } from '../building/walls-of-footprint.ts';
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
export type RegisterFacts = RegisteredAttributes & {
  readonly id: string;
  readonly parts: readonly (readonly (readonly PlanPoint[])[])[];
  readonly foundation: string | null;
  readonly listedGrade: string | null;
  readonly condition: string | null;
  readonly structureScore: number | null;
  readonly featuresScore: number | null;
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
  readonly middle: PlanPoint;
  readonly groundLevel: number;
  readonly foundingLevel: number;
  readonly attributes: CompleteAttributes;
  readonly walls: readonly Wall[];
  readonly holds: HoldFacts;
  readonly scores: SensitivityScores;
  readonly assumed: readonly Assumed[];
};

/**
 * What assessors scored of a building; null where nobody has.
 *
 * Units: none. Valid: 0 to 2 each. Source: [common].
 */
export type SensitivityScores = Pick<RegisterFacts, 'structureScore' | 'featuresScore'>;

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

const UNKNOWN = /^(unknown|not known|n\/?a|-|\?)$/i;

/** Undefined where nobody knows: what is unknown holds nothing. */
function says(words: string | null, yes: RegExp, no: RegExp): boolean | undefined {
  const said = words?.trim() ?? '';
  if (said === '' || UNKNOWN.test(said)) return undefined;
  return yes.test(said) && !no.test(said);
}

/**
 * Whether a building is listed, at whatever grade; undefined where nobody knows.
 *
 * Units: none. Valid: any words of a register. Source: [own].
 */
export function isListed({ listedGrade }: Pick<RegisterFacts, 'listedGrade'>): boolean | undefined {
  return says(listedGrade, /./, /^(not listed|unlisted|none|no)$/i);
}

/** What holds a building, as the words of its register have it; whatever grade is listed. */
function holdFacts(facts: RegisterFacts, foundingDepth: number | undefined): HoldFacts {
  const piled = says(facts.foundation, /\bpile/i, /^(not |no |without )/i);
  const listed = isListed(facts);
  const poorCondition = says(facts.condition, /\b(poor|bad)\b/i, /^not /i);
  return {
    ...(foundingDepth !== undefined && { foundingDepth }),
    ...(piled !== undefined && { piled }),
    ...(listed !== undefined && { listed }),
    ...(poorCondition !== undefined && { poorCondition }),
  };
}

/**
 * The ground level of a building: its own, or that beside the nearest drive.
 *
 * Units: m above datum. Valid: `defaultGroundLevel` stands where no drive tells one. Source: [own].
 */
function groundLevelOf(
  facts: RegisterFacts,
  model: GroundModel,
  defaultGroundLevel: number,
): number {
  return (
    facts.groundLevel ??
    groundLevelBeside(model, footprintMiddle(facts.parts)) ??
    defaultGroundLevel
  );
}

/**
 * What of a building of the register may hold it, before any category is known.
 *
 * Units: founding depth m. Valid: as `preparedBuilding`; the footprint is asked for only where there is a
 * founding level and no ground level. Source: [own].
 */
export function holdFactsOf(
  facts: RegisterFacts,
  model: GroundModel,
  defaultGroundLevel: number,
): HoldFacts {
  if (facts.foundingLevel === null) return holdFacts(facts, undefined);
  const groundLevel = groundLevelOf(facts, model, defaultGroundLevel);
  return holdFacts(facts, knownOfBuilding({ ...facts, groundLevel }).foundingDepth);
}

/**
 * Makes a building of the register ready for the method: what is unknown is assumed and named, the ground
 * level is that beside the nearest drive where the building has none, walls are lettered part by part.
 *
 * Units: m. Valid: any facts; `defaultGroundLevel` stands where no drive tells one either. A founding level
 * at the ground says nothing; one above it stays, for the method to refuse.
 * Source: [own]; assumed values are [common].
 */
export function preparedBuilding(
  facts: RegisterFacts,
  model: GroundModel,
  defaultGroundLevel: number,
): PreparedBuilding {
  const groundLevel = groundLevelOf(facts, model, defaultGroundLevel);
  const known = knownOfBuilding({ ...facts, groundLevel });
  const attributes = completeAttributes(known);
  const isFoundingGiven =
    facts.foundingLevel !== null &&
    (known.foundingDepth !== undefined || facts.foundingLevel > groundLevel);
  const foundingLevel = isFoundingGiven
    ? facts.foundingLevel
    : groundLevel - attributes.foundingDepth;
  const isGroundAssumed = facts.groundLevel === null;
  const walls = facts.parts.flatMap((rings) => wallsOfFootprint(rings));
  return {
    id: facts.id,
    rings: facts.parts.flat(),
    middle: footprintMiddle(facts.parts),
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
    holds: holdFacts(facts, known.foundingDepth),
    scores: { structureScore: facts.structureScore, featuresScore: facts.featuresScore },
    assumed: [...attributes.assumed, ...(isGroundAssumed ? (['groundLevel'] as const) : [])],
  };
}
