import { describe } from 'vitest';
import { deepBeamRatios } from '../../shared/checks/deep-beam-ratios.ts';
import { verifyCheck } from '../support/verify-check.ts';

describe(deepBeamRatios.name, () => {
  verifyCheck(deepBeamRatios);
});
