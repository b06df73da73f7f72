const LEFT_OUT = new Set(['skipped', 'pending', 'todo', 'disabled']);

/**
 * Passed and failed tests of a JSON report of vitest. A test that was left out has not passed, and a
 * file that fails besides its tests, because it does not load, counts as one more failure.
 */
export function testCounts({ testResults = [] }, { choosing = false } = {}) {
  let passed = 0;
  let failed = 0;
  for (const { status, assertionResults } of testResults) {
    const good = assertionResults.filter((test) => test.status === 'passed').length;
    const out = assertionResults.filter((test) => LEFT_OUT.has(test.status)).length;
    const bad = assertionResults.length - good - out;
    passed += good;
    failed += bad + (choosing ? 0 : out);
    if (status === 'failed' && bad === 0) failed += 1;
  }
  return { passed, failed };
}
