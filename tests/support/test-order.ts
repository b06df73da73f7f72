import { readFileSync } from 'node:fs';
import type { TestSequencer, TestSpecification } from 'vitest/node';

type Place = { readonly spec: TestSpecification; readonly key: number; readonly size: number };

/** A worker goes on to the next file of its kind with what it has imported already. */
function placeOf(spec: TestSpecification, projects: readonly string[]): Place {
  const text = readFileSync(spec.moduleId, 'utf8');
  const ofItsOwnKind = text.startsWith('// @vitest-environment ') ? 0.5 : 0;
  return { spec, key: projects.indexOf(spec.project.name) + ofItsOwnKind, size: text.length };
}

/**
 * Files project by project, as they stand in the configuration, the largest first: what is long begins
 * early, so that no worker is left with it in the end, and the order is the same in every clone.
 */
export class TestOrder implements TestSequencer {
  shard(specs: TestSpecification[]): TestSpecification[] {
    return specs;
  }

  sort(specs: TestSpecification[]): TestSpecification[] {
    const projects = specs[0]?.project.vitest.projects.map(({ name }) => name) ?? [];
    return specs
      .map((spec) => placeOf(spec, projects))
      .sort((a, b) => a.key - b.key || b.size - a.size)
      .map(({ spec }) => spec);
  }
}
