import { describe } from 'vitest';
import { clayDepthRule } from '../../shared/checks/clay-depth-rule.ts';
import { verifyCheck } from '../support/verify-check.ts';

describe(clayDepthRule.name, () => {
  verifyCheck(clayDepthRule);
});
