import ts from 'typescript';
import { nodesOf, placeOf, type SourceFile } from '../support/source-files.ts';

const STARTS = ['it', 'test', 'describe', 'suite'];
const LEAVES_OUT = ['skip', 'only', 'todo', 'fails', 'skipIf', 'runIf'];

/** The name with which a chain of calls begins: `it` of `it.each([1]).skip`. */
function startOf(node: ts.Expression): string {
  if (ts.isPropertyAccessExpression(node) || ts.isCallExpression(node)) {
    return startOf(node.expression);
  }
  return ts.isIdentifier(node) ? node.text : '';
}

function leavesOut(node: ts.Node): boolean {
  if (ts.isPropertyAccessExpression(node)) {
    return LEAVES_OUT.includes(node.name.text) && STARTS.includes(startOf(node.expression));
  }
  return (
    ts.isPropertyAssignment(node) &&
    LEAVES_OUT.includes(node.name.getText()) &&
    ts.isObjectLiteralExpression(node.parent) &&
    ts.isCallExpression(node.parent.parent) &&
    STARTS.includes(startOf(node.parent.parent))
  );
}

/** Tests that do not run, that keep others from running, or that are meant to fail. */
export function leftOutTests(file: SourceFile): string[] {
  return nodesOf(file)
    .filter(leavesOut)
    .map((node) => `${placeOf(file, node)} ${node.getText()}`);
}
