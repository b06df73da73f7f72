import ts from 'typescript';
import { nodesOf, placeOf, type SourceFile } from '../support/source-files.ts';

/** What every engine rounds alike, to the last bit. */
const EXACT = [
  'abs',
  'ceil',
  'floor',
  'max',
  'min',
  'PI',
  'round',
  'sign',
  'sqrt',
  'SQRT1_2',
  'SQRT2',
  'trunc',
];

function isExactUse(math: ts.Identifier): boolean {
  const { parent } = math;
  return ts.isPropertyAccessExpression(parent) && EXACT.includes(parent.name.text);
}

/** Uses of Math, or of powers, that engines round each in their own way. */
export function inexactUses(file: SourceFile): string[] {
  return nodesOf(file)
    .filter((node) => {
      if (ts.isIdentifier(node)) return node.text === 'Math' && !isExactUse(node);
      return (
        node.kind === ts.SyntaxKind.AsteriskAsteriskToken ||
        node.kind === ts.SyntaxKind.AsteriskAsteriskEqualsToken
      );
    })
    .map((node) => `${placeOf(file, node)} ${node.parent.getText()}`);
}

/** Variables of a module, which would keep something from one call to the next. */
export function moduleState(file: SourceFile): string[] {
  return file.tree.statements
    .filter(ts.isVariableStatement)
    .filter(({ declarationList: { flags } }) => (flags & ts.NodeFlags.Const) === 0)
    .map((statement) => `${placeOf(file, statement)} ${statement.getText()}`);
}
