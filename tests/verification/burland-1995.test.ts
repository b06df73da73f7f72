import { describe } from 'vitest';
import { wallSquareToDrive } from '../../shared/checks/wall-square-to-drive.ts';
import { verifyCheck } from '../support/verify-check.ts';

describe(wallSquareToDrive.name, () => {
  verifyCheck(wallSquareToDrive);
});
