import ts from 'typescript';
import { placeOf, type SourceFile } from '../support/source-files.ts';

/** A statement by which a module gives something to others. */
export type Export = {
  readonly names: readonly string[];
  readonly isDefault: boolean;
  /** Names taken from another module and passed on. */
  readonly passedOn: boolean;
  readonly place: string;
  /** The words in one line of the block comment directly before; undefined without one. */
  readonly words: string | undefined;
};

function modifiersOf(statement: ts.Statement): ts.SyntaxKind[] {
  const modifiers = ts.canHaveModifiers(statement) ? ts.getModifiers(statement) : undefined;
  return (modifiers ?? []).map(({ kind }) => kind);
}

function namesOf(statement: ts.Statement): string[] {
  if (ts.isVariableStatement(statement)) {
    return statement.declarationList.declarations.map(({ name }) => name.getText());
  }
  if (ts.isExportDeclaration(statement)) {
    const clause = statement.exportClause;
    const named = clause !== undefined && ts.isNamedExports(clause);
    return named ? clause.elements.map(({ name }) => name.getText()) : ['*'];
  }
  const declares =
    ts.isFunctionDeclaration(statement) ||
    ts.isClassDeclaration(statement) ||
    ts.isTypeAliasDeclaration(statement) ||
    ts.isInterfaceDeclaration(statement) ||
    ts.isEnumDeclaration(statement);
  return declares && statement.name !== undefined ? [statement.name.text] : [];
}

function wordsBefore({ text }: SourceFile, statement: ts.Statement): string | undefined {
  const last = ts.getLeadingCommentRanges(text, statement.getFullStart())?.at(-1);
  if (last === undefined) return undefined;
  const comment = text.slice(last.pos, last.end);
  const directly = /^\s?$/.test(text.slice(last.end, statement.getStart()).replace('\r', ''));
  if (!comment.startsWith('/**') || !directly) return undefined;
  return comment
    .slice(3, -2)
    .replaceAll(/^\s*\* ?/gm, '')
    .replaceAll(/\s+/g, ' ')
    .trim();
}

/** What a source exports, statement by statement. */
export function exportsOf(file: SourceFile): Export[] {
  return file.tree.statements.flatMap((statement) => {
    const kinds = modifiersOf(statement);
    const passedOn = ts.isExportDeclaration(statement);
    const assigned = ts.isExportAssignment(statement);
    if (!passedOn && !assigned && !kinds.includes(ts.SyntaxKind.ExportKeyword)) return [];
    const names = namesOf(statement);
    const isDefault =
      assigned || kinds.includes(ts.SyntaxKind.DefaultKeyword) || names.includes('default');
    const words = wordsBefore(file, statement);
    return [{ names, isDefault, passedOn, place: placeOf(file, statement), words }];
  });
}
