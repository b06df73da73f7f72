import { ALL_CHECKS } from '../../../../shared/checks/all-checks.ts';
import { runChecks } from './run-checks.ts';

self.addEventListener('message', () => {
  self.postMessage(runChecks(ALL_CHECKS, () => performance.now()));
});
