import type { z } from 'zod';
import { pathText } from './path-text.ts';

type Issue = z.core.$ZodIssue;

/** Where no form of a union fits, the one that gets farthest says best what is wrong. */
function deepest(issue: Issue): Issue {
  if (issue.code !== 'invalid_union') return issue;
  const inner = issue.errors
    .flatMap(([first]) => (first === undefined ? [] : [deepest(first)]))
    .map((found) => ({ ...found, path: [...issue.path, ...found.path] }));
  const depth = (found: Issue) => found.path.length + (found.code === 'invalid_type' ? 0 : 0.5);
  return inner.reduce<Issue>((best, found) => (depth(found) > depth(best) ? found : best), inner[0] ?? issue);
}

/**
 * What is wrong with a document in one line: the place of the first fault, the fault, and how many
 * more there are.
 *
 * Units: none. Valid: an error of a zod schema. Source: [own].
 */
export function firstIssue(error: z.ZodError): string {
  const [first, ...others] = error.issues;
  if (first === undefined) return 'the document is not valid';
  const issue = deepest(first);
  const more = others.length === 0 ? '' : ` (and ${others.length} more)`;
  const keys = issue.code === 'unrecognized_keys' ? issue.keys : [];
  const [key] = keys;
  const place = pathText(key === undefined ? issue.path : [...issue.path, key]);
  const fault = key === undefined ? issue.message : 'is not a key that is known here';
  return `${place}: ${fault}${more}`;
}
