import { describe, expect, test } from 'vitest';
import { assessCaseSchema } from '../../../shared/schemas/assess-case.ts';
import { firstIssue } from '../../../shared/schemas/first-issue.ts';
import { jsonFault } from '../../../shared/schemas/json-fault.ts';
import { pathText } from '../../../shared/schemas/path-text.ts';

function aCase() {
  return {
    groundLevel: 0,
    drives: [
      {
        name: 'A',
        axis: [
          [0, 0, -20],
          [100, 0, -20],
        ],
        diameter: 6,
        volumeLoss: 0.01,
        troughWidth: 0.5,
      },
    ],
    walls: [
      {
        name: 'W1',
        from: [50, 2],
        to: [50, 20],
        foundingLevel: 0,
        height: 9,
        eOverG: 2.6,
        poisson: 0.3,
      },
    ],
  };
}

function faultOf(document: unknown): string {
  const parsed = assessCaseSchema.safeParse(document);
  return parsed.success ? 'none' : firstIssue(parsed.error, document);
}

function withDrive(change: object): unknown {
  return { ...aCase(), drives: [{ ...aCase().drives[0], ...change }] };
}

function withWall(change: object): unknown {
  return { ...aCase(), walls: [{ ...aCase().walls[0], ...change }] };
}

describe('one line says where a case is wrong', () => {
  test.each<[string, unknown, string]>([
    ['a right case', aCase(), 'none'],
    ['unknown key', { ...aCase(), foo: 1 }, 'foo: is not a key that is known here'],
    [
      'unknown key within',
      withWall({ hight: 9 }),
      'walls[0].hight: is not a key that is known here',
    ],
    ['missing key', { ...aCase(), walls: undefined }, 'walls: is missing'],
    ['missing within', withWall({ height: undefined }), 'walls[0].height: is missing'],
    [
      'text for a number',
      withWall({ height: '9' }),
      'walls[0].height: must be a number and is a text',
    ],
    ['null', withWall({ height: null }), 'walls[0].height: must be a number and is null'],
    [
      'infinite',
      withWall({ height: Infinity }),
      'walls[0].height: must be a number and is not finite',
    ],
    ['zero height', withWall({ height: 0 }), 'walls[0].height: must be more than 0'],
    [
      'zero length',
      withWall({ to: [50, 2] }),
      'walls[0].to: is the same point as from, or within a millimetre of it: the wall has no length',
    ],
    [
      'per cent for a fraction',
      withDrive({ volumeLoss: 1.4 }),
      'drives[0].volumeLoss: must be a fraction up to 0.2: 1.5 % is 0.015',
    ],
    [
      'a range out of order',
      withDrive({ troughWidth: [0.5, 0.4, 0.6] }),
      'drives[0].troughWidth: must be in the order low, central, high',
    ],
    ['one point', withDrive({ axis: [[0, 0, -20]] }), 'drives[0].axis: needs at least 2 entries'],
    [
      'a backward interval',
      withDrive({ intervals: [{ from: 5, to: 5 }] }),
      'drives[0].intervals[0].to: must be beyond from',
    ],
    [
      'a rule that is not known',
      { ...aCase(), rules: { depth: 'rock' } },
      'rules.depth: must be "clay" or "constant" or "oreilly-new-clay" or "oreilly-new-sand"',
    ],
    [
      'a cut-off that is neither',
      { ...aCase(), rules: { cutoff: '3i' } },
      'rules.cutoff: must be metres from 0 (none) to 1, "2.5i" or { "widths": … }',
    ],
    ['not an object', [], 'the document: must be an object and is a list'],
  ])('%s', (_, document, line) => {
    expect(faultOf(document)).toBe(line);
  });

  test('counts what else is wrong', () => {
    expect(faultOf(withWall({ height: 0, poisson: 2 }))).toBe(
      'walls[0].height: must be more than 0 (and 1 more)',
    );
  });
});

describe('one line says where a text is not JSON', () => {
  test.each<[string, string, string]>([
    ['NaN', '{"walls": [{"height": NaN}]}', 'walls[0].height: "NaN" is not a value'],
    ['Infinity', '{"a": [1, -Infinity]}', 'a[1]: "-Infinity" is not a value'],
    ['a word', '{"a": tru}', 'a: "tru" is not a value'],
    ['a broken end', '{"a": [1, 2', 'a[1]: the text ends too early'],
    ['nothing', '', 'the document: the text ends too early'],
  ])('%s', (_, text, line) => {
    expect(jsonFault(text)).toContain(line);
  });

  test('gives line and column', () => {
    expect(jsonFault('{\n  "a": NaN\n}')).toContain('(line 2, column 8)');
  });

  test('nesting of 200,000 costs no stack and is cut short', () => {
    expect(jsonFault('['.repeat(200_000)).length).toBeLessThan(120);
  });
});

test('a path is written as people write it', () => {
  expect(pathText(['drives', 0, 'axis', 2])).toBe('drives[0].axis[2]');
  expect(pathText([])).toBe('the document');
});
