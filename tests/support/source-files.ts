import { existsSync, readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import ts from 'typescript';

const ROOT = path.resolve(import.meta.dirname, '../..');

/** A source by its path from the root of the project, with its text and its syntax tree. */
export type SourceFile = {
  readonly path: string;
  readonly text: string;
  readonly tree: ts.SourceFile;
};

/** A source from its text, as if it stood at a path. */
export function parsed(file: string, text: string): SourceFile {
  const tree = ts.createSourceFile(file, text, ts.ScriptTarget.Latest, true);
  return { path: file, text, tree };
}

/** Every file of some rooms, whatever its kind; a room that is not built yet has none. */
export function filesIn(...rooms: readonly string[]): string[] {
  return rooms
    .filter((room) => existsSync(path.join(ROOT, room)))
    .flatMap((room) =>
      readdirSync(path.join(ROOT, room), { withFileTypes: true, recursive: true })
        .filter((entry) => entry.isFile())
        .map((entry) => path.relative(ROOT, path.join(entry.parentPath, entry.name))),
    )
    .map((file) => file.split(path.sep).join('/'))
    .sort();
}

export function textOf(file: string): string {
  return readFileSync(path.join(ROOT, file), 'utf8');
}

/** Every program text of some rooms, parsed. */
export function sourcesIn(...rooms: readonly string[]): SourceFile[] {
  return filesIn(...rooms)
    .filter((file) => /\.(ts|tsx|mjs)$/.test(file))
    .map((file) => parsed(file, textOf(file)));
}

/** `path:line`, where a node begins. */
export function placeOf({ path: file, tree }: SourceFile, node: ts.Node): string {
  return `${file}:${tree.getLineAndCharacterOfPosition(node.getStart(tree)).line + 1}`;
}

/** Every node of a source, at any depth, in the order of the text. */
export function nodesOf({ tree }: SourceFile): ts.Node[] {
  const nodes: ts.Node[] = [];
  function visit(node: ts.Node): void {
    nodes.push(node);
    ts.forEachChild(node, visit);
  }
  visit(tree);
  return nodes;
}
