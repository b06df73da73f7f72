import { execFileSync } from 'node:child_process';
import path from 'node:path';
import { describe, expect, it } from 'vitest';

const SCRIPT = path.resolve(import.meta.dirname, '../../scripts/test-counts.mjs');

function file(status: string, ...tests: string[]) {
  return { status, assertionResults: tests.map((each) => ({ status: each })) };
}

/** What the script, which is not TypeScript, makes of a report. */
function countsOf(report: object, options: object = {}): unknown {
  const program = `
    import { testCounts } from ${JSON.stringify(SCRIPT)};
    console.log(JSON.stringify(testCounts(${JSON.stringify(report)}, ${JSON.stringify(options)})));`;
  return JSON.parse(
    execFileSync('node', ['--input-type=module', '-e', program], { encoding: 'utf8' }),
  );
}

describe('testCounts', () => {
  it('counts tests over all files', () => {
    const testResults = [file('passed', 'passed', 'passed'), file('failed', 'passed', 'failed')];
    expect(countsOf({ testResults })).toEqual({ passed: 3, failed: 1 });
  });

  it('counts a file that does not load as a failure', () => {
    expect(countsOf({ testResults: [file('failed')] })).toEqual({ passed: 0, failed: 1 });
    expect(countsOf({ testResults: [file('failed', 'passed')] })).toEqual({ passed: 1, failed: 1 });
  });

  it.each(['skipped', 'pending', 'todo'])('counts a test that is %s as a failure', (status) => {
    const report = { testResults: [file('passed', 'passed', status)] };
    expect(countsOf(report)).toEqual({ passed: 1, failed: 1 });
    expect(countsOf(report, { choosing: true })).toEqual({ passed: 1, failed: 0 });
  });

  it('finds nothing in a report that was not written', () => {
    expect(countsOf({})).toEqual({ passed: 0, failed: 0 });
  });
});
