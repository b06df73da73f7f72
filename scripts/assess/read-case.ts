import { readFileSync, statSync } from 'node:fs';
import { assessCaseSchema, type AssessCase } from '../../shared/schemas/assess-case.ts';
import { firstIssue } from '../../shared/schemas/first-issue.ts';
import { jsonFault } from '../../shared/schemas/json-fault.ts';
import { CaseError } from './case-error.ts';

const LARGEST_FILE = 512 * 1024 * 1024;

function textOf(file: string): string {
  const found = statSync(file, { throwIfNoEntry: false });
  if (found === undefined) throw new CaseError(`${file}: there is no such file`);
  if (!found.isFile()) throw new CaseError(`${file}: is not a file`);
  if (found.size > LARGEST_FILE) throw new CaseError(`${file}: is larger than 512 MiB`);
  return readFileSync(file, 'utf8').replace(/^\uFEFF/, '');
}

function documentOf(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    throw new CaseError(jsonFault(text));
  }
}

/** Reads and checks a case; what is wrong is said in one line with its path. */
export function readCase(file: string): AssessCase {
  const document = documentOf(textOf(file));
  const parsed = assessCaseSchema.safeParse(document);
  if (!parsed.success) throw new CaseError(firstIssue(parsed.error, document));
  return parsed.data;
}
