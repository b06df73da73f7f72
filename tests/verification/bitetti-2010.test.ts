import { describe } from 'vitest';
import { bitettiTroughs } from '../../shared/checks/bitetti-troughs.ts';
import { bitettiCategories } from '../../shared/checks/bitetti-categories.ts';
import { verifyCheck } from '../support/verify-check.ts';

describe(bitettiTroughs.name, () => {
  verifyCheck(bitettiTroughs);
});

describe(bitettiCategories.name, () => {
  verifyCheck(bitettiCategories);
});
