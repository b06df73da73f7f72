import { describe } from 'vitest';
import { normalDistributionCheck } from '../../shared/checks/normal-distribution.ts';
import { verifyCheck } from '../support/verify-check.ts';

describe(normalDistributionCheck.name, () => {
  verifyCheck(normalDistributionCheck);
});
