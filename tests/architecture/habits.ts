import ts from 'typescript';
import { nodesOf, placeOf, type SourceFile } from '../support/source-files.ts';
import { exportsOf } from './exports.ts';

const BARRELS = /(^|\/)(models|routes)\/index\.ts$/;
const PUT_OFF = /\b(TODO|FIXME|XXX)\b|eslint-disable|@ts-(ignore|expect-error|nocheck)/;

/** Default exports, and files that only pass on what others export. */
export function exportFaults(file: SourceFile): string[] {
  const exports = exportsOf(file);
  const passedOn = exports.filter((one) => one.passedOn).length;
  const imports = file.tree.statements.filter(ts.isImportDeclaration).length;
  const isBarrel = passedOn > 0 && passedOn + imports === file.tree.statements.length;
  return [
    ...exports
      .filter(({ isDefault }) => isDefault)
      .map(({ place }) => `${place} exports by default`),
    ...(isBarrel && !BARRELS.test(file.path) ? [`${file.path} is a barrel`] : []),
  ];
}

/** Only an interface can add to a library's own type, which is done in a file of declarations. */
function mayBeInterface(node: ts.Node): boolean {
  return node.getSourceFile().fileName.endsWith('.d.ts');
}

function typeFault(node: ts.Node): string | undefined {
  if (ts.isInterfaceDeclaration(node) && !mayBeInterface(node))
    return 'is an interface where a type would do';
  if (node.kind === ts.SyntaxKind.AnyKeyword) return 'says any';
  if (ts.isNonNullExpression(node)) return 'asserts with !';
  const declares = ts.isVariableDeclaration(node) || ts.isPropertyDeclaration(node);
  return declares && node.exclamationToken !== undefined ? 'asserts with !' : undefined;
}

/** Functions of a module that are constants and not declared as functions. */
export function undeclaredFunctions({ tree, path }: SourceFile): string[] {
  return tree.statements
    .filter(ts.isVariableStatement)
    .flatMap(({ declarationList }) => [...declarationList.declarations])
    .filter(({ initializer }) => initializer !== undefined && ts.isFunctionLike(initializer))
    .map(({ name }) => `${path} ${name.getText()} is not declared as a function`);
}

/** Interfaces, `any` and `!`. */
export function typeFaults(file: SourceFile): string[] {
  return nodesOf(file).flatMap((node) => {
    const fault = typeFault(node);
    return fault === undefined ? [] : [`${placeOf(file, node)} ${fault}`];
  });
}

/** Where the compiler is told what type something has; `as const` tells it nothing. */
export function casts(file: SourceFile): string[] {
  return nodesOf(file)
    .filter((node) => ts.isAsExpression(node) || ts.isTypeAssertionExpression(node))
    .filter((node) => !ts.isConstTypeReference(node.type))
    .map((node) => `${placeOf(file, node)} ${node.getText()}`);
}

function commentsOf({ text, tree }: SourceFile): ts.CommentRange[] {
  const found = new Map<number, ts.CommentRange>();
  function visit(node: ts.Node): void {
    if (ts.isJSDoc(node) || ts.isJsxText(node)) return;
    const children = node.getChildren(tree);
    for (const child of children) visit(child);
    if (children.length > 0) return;
    const around = [
      ...(ts.getLeadingCommentRanges(text, node.pos) ?? []),
      ...(ts.getTrailingCommentRanges(text, node.end) ?? []),
    ];
    for (const comment of around) found.set(comment.pos, comment);
  }
  visit(tree);
  return [...found.values()];
}

/** Comments that put work off or silence a tool. */
export function commentFaults(file: SourceFile): string[] {
  return commentsOf(file)
    .filter(({ pos, end }) => PUT_OFF.test(file.text.slice(pos, end)))
    .map(({ pos, end }) => `${file.path} ${file.text.slice(pos, end)}`);
}
