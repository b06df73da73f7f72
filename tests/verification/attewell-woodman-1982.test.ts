import { describe } from 'vitest';
import { troughIdentities } from '../../shared/checks/trough-identities.ts';
import { attewellWoodmanFace } from '../../shared/checks/attewell-woodman-face.ts';
import { verifyCheck } from '../support/verify-check.ts';

describe(troughIdentities.name, () => {
  verifyCheck(troughIdentities);
});

describe(attewellWoodmanFace.name, () => {
  verifyCheck(attewellWoodmanFace);
});
