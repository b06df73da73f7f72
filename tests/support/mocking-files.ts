import { readdirSync, readFileSync } from 'node:fs';

/**
 * The test files in a folder that put something in a module's place. Files that share what they import would
 * share that too, so these run by themselves.
 */
export function mockingFiles(folder: string): string[] {
  return readdirSync(folder, { encoding: 'utf8', recursive: true })
    .filter((name) => /\.test\.tsx?$/.test(name))
    .map((name) => `${folder}/${name}`)
    .filter((file) => /\bvi\.(mock|doMock)\(/.test(readFileSync(file, 'utf8')));
}
