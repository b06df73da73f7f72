import type { z } from 'zod';
import { pathText } from './path-text.ts';

type Issue = z.core.$ZodIssue;

const KINDS: Readonly<Record<string, string>> = {
  array: 'a list',
  tuple: 'a list',
  object: 'an object',
  string: 'a text',
  number: 'a number',
  boolean: 'true or false',
};

/** The forms of a union that fail deeper inside say better what is wrong than those that fail at once. */
function deepest(issue: Issue): Issue {
  if (issue.code !== 'invalid_union' || issue.message !== 'Invalid input') return issue;
  const inner = issue.errors
    .flatMap(([first]) => (first === undefined ? [] : [deepest(first)]))
    .map((found) => ({ ...found, path: [...issue.path, ...found.path] }));
  const depth = (found: Issue) => found.path.length + (found.code === 'invalid_type' ? 0 : 0.5);
  const [first = issue] = inner;
  return inner.reduce<Issue>((best, found) => (depth(found) > depth(best) ? found : best), first);
}

function valueAt(document: unknown, path: readonly PropertyKey[]): unknown {
  let value = document;
  for (const part of path) {
    if (typeof value !== 'object' || value === null) return undefined;
    value = Object.entries(value).find(([key]) => key === String(part))?.[1];
  }
  return value;
}

function kindOf(value: unknown): string {
  if (value === null) return 'null';
  if (typeof value === 'number') return Number.isFinite(value) ? 'a number' : 'not finite';
  return KINDS[Array.isArray(value) ? 'array' : typeof value] ?? typeof value;
}

function faultOf(issue: Issue, value: unknown): string {
  switch (issue.code) {
    case 'invalid_type':
      if (value === undefined) return 'is missing';
      return `must be ${KINDS[issue.expected] ?? issue.expected} and is ${kindOf(value)}`;
    case 'unrecognized_keys':
      return 'is not a key that is known here';
    case 'too_small':
      if (issue.origin === 'array') return `needs at least ${issue.minimum} entries`;
      if (issue.origin === 'string') return 'must not be empty';
      return issue.message.startsWith('Too')
        ? `must be ${issue.inclusive === true ? 'at least' : 'more than'} ${issue.minimum}`
        : issue.message;
    case 'too_big':
      if (issue.origin === 'array') return `takes at most ${issue.maximum} entries`;
      if (issue.origin === 'string') return `takes at most ${issue.maximum} characters`;
      return issue.message.startsWith('Too') ? `must be at most ${issue.maximum}` : issue.message;
    case 'invalid_value':
      return `must be ${issue.values.map((allowed) => JSON.stringify(allowed)).join(' or ')}`;
    case 'invalid_format':
    case 'not_multiple_of':
    case 'invalid_union':
    case 'invalid_key':
    case 'invalid_element':
    case 'custom':
      return issue.message;
  }
}

/**
 * What is wrong with a document in one line: the place of the first fault, the fault, and how many
 * more there are.
 *
 * Units: none. Valid: an error of a zod schema for this document. Source: [own].
 */
export function firstIssue(error: z.ZodError, document: unknown): string {
  const [first, ...others] = error.issues;
  if (first === undefined) return 'the document: is not valid';
  const issue = deepest(first);
  const more = others.length === 0 ? '' : ` (and ${others.length} more)`;
  const [key] = issue.code === 'unrecognized_keys' ? issue.keys : [];
  const path = key === undefined ? issue.path : [...issue.path, key];
  return `${pathText(path)}: ${faultOf(issue, valueAt(document, path))}${more}`;
}
