import path from 'node:path';
import ts from 'typescript';
import { nodesOf, placeOf, type SourceFile } from './source-files.ts';

/** One file's reach for another, or for a package. */
export type Import = {
  /** `path:line` of the import. */
  readonly place: string;
  readonly from: string;
  /** The path of the file imported; undefined for a package. */
  readonly target: string | undefined;
  /** The name of the package imported; undefined for a file. */
  readonly package: string | undefined;
  readonly typeOnly: boolean;
  /** Only when it is reached, by `import()`. */
  readonly late: boolean;
};

type Found = { readonly typeOnly: boolean; readonly late: boolean; readonly named: ts.Node };

function isTypeOnly(node: ts.ImportDeclaration): boolean {
  const clause = node.importClause;
  if (clause === undefined) return false;
  if (clause.phaseModifier === ts.SyntaxKind.TypeKeyword) return true;
  const named = clause.namedBindings;
  if (clause.name !== undefined || named === undefined || !ts.isNamedImports(named)) return false;
  return named.elements.length > 0 && named.elements.every((element) => element.isTypeOnly);
}

function found(node: ts.Node): Found | undefined {
  if (ts.isImportDeclaration(node)) {
    return { typeOnly: isTypeOnly(node), late: false, named: node.moduleSpecifier };
  }
  if (ts.isExportDeclaration(node) && node.moduleSpecifier !== undefined) {
    return { typeOnly: node.isTypeOnly, late: false, named: node.moduleSpecifier };
  }
  if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument)) {
    return { typeOnly: true, late: false, named: node.argument.literal };
  }
  if (!ts.isCallExpression(node)) return undefined;
  const [named] = node.arguments;
  const imports = node.expression.kind === ts.SyntaxKind.ImportKeyword;
  return imports && named !== undefined ? { typeOnly: false, late: true, named } : undefined;
}

function packageOf(specifier: string): string {
  if (specifier.startsWith('node:')) return specifier;
  return specifier
    .split('/')
    .slice(0, specifier.startsWith('@') ? 2 : 1)
    .join('/');
}

/** Every import of a source: declarations, re-exports, types by `import('…')` and late ones. */
export function importsOf(file: SourceFile): Import[] {
  return nodesOf(file).flatMap((node) => {
    const it = found(node);
    if (it === undefined || !ts.isStringLiteralLike(it.named)) return [];
    const specifier = it.named.text;
    const isFile = /^[./]/.test(specifier);
    return {
      place: placeOf(file, node),
      from: file.path,
      target: isFile ? path.posix.join(path.posix.dirname(file.path), specifier) : undefined,
      package: isFile ? undefined : packageOf(specifier),
      typeOnly: it.typeOnly,
      late: it.late,
    };
  });
}
