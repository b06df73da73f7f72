import { attewellWoodmanFace } from './attewell-woodman-face.ts';
import { bitettiCategories } from './bitetti-categories.ts';
import { bitettiTroughs } from './bitetti-troughs.ts';
import type { Check } from './check.ts';
import { clayDepthRule } from './clay-depth-rule.ts';
import { deepBeamRatios } from './deep-beam-ratios.ts';
import { normalDistributionCheck } from './normal-distribution.ts';
import { troughIdentities } from './trough-identities.ts';
import { wallSquareToDrive } from './wall-square-to-drive.ts';

/**
 * Every check of the product against something outside it, in the order of the method.
 *
 * Units: as each check. Valid: none may disagree. Source: each names its own.
 */
export const ALL_CHECKS: readonly Check[] = [
  bitettiTroughs,
  bitettiCategories,
  troughIdentities,
  attewellWoodmanFace,
  deepBeamRatios,
  wallSquareToDrive,
  clayDepthRule,
  normalDistributionCheck,
];
