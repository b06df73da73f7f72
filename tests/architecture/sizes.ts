import ts from 'typescript';
import { nodesOf, placeOf, type SourceFile } from '../support/source-files.ts';

/** How long something is, in plain lines. */
export type Size = { readonly name: string; readonly lines: number };

export type Limits = { readonly median: number; readonly p90: number; readonly largest: number };

export function fileSize({ path, text }: SourceFile): Size {
  return { name: path, lines: text.replace(/\n$/, '').split('\n').length };
}

function isNamedFunction(node: ts.Node): boolean {
  if (ts.isArrowFunction(node) || ts.isFunctionExpression(node)) {
    return ts.isVariableDeclaration(node.parent);
  }
  return ts.isFunctionLike(node) && 'body' in node && node.body !== undefined;
}

/** The functions of a source that have a name, without their comments; what they pass on inline is
 * part of them. */
export function functionSizes(file: SourceFile): Size[] {
  return nodesOf(file)
    .filter(isNamedFunction)
    .map((node) => ({
      name: placeOf(file, node),
      lines: node.getText(file.tree).split('\n').length,
    }));
}

function quantile(sizes: readonly Size[], share: number): number {
  const sorted = sizes.map(({ lines }) => lines).sort((a, b) => a - b);
  return sorted[Math.max(0, Math.ceil(share * sorted.length) - 1)] ?? 0;
}

/** What is too long; where many are, only by how much. */
export function sizeFaults(sizes: readonly Size[], { median, p90, largest }: Limits): string[] {
  const faults = sizes
    .filter(({ lines }) => lines > largest)
    .map(({ name, lines }) => `${name} has ${lines} lines, at most ${largest}`);
  const [half, most] = [quantile(sizes, 0.5), quantile(sizes, 0.9)];
  if (half > median) faults.push(`the median is ${half} lines, at most ${median}`);
  if (most > p90) faults.push(`nine in ten have up to ${most} lines, at most ${p90}`);
  return faults;
}
