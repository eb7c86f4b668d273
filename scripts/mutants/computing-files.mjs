import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';

import ts from 'typescript';

/**
 * The computing files of shared/: those that export a function. Schemas, constants and types hold
 * no arithmetic; that rule leaves them out, and no file by its name.
 */
export function computingFiles(root) {
  return readdirSync(path.join(root, 'shared'), { recursive: true })
    .map((file) => path.posix.join('shared', file.split(path.sep).join('/')))
    .filter((file) => file.endsWith('.ts') && exportsFunction(path.join(root, file)))
    .sort();
}

function exportsFunction(file) {
  const source = ts.createSourceFile(file, readFileSync(file, 'utf8'), ts.ScriptTarget.ES2022);
  return source.statements.some((statement) => isExported(statement) && isFunction(statement));
}

function isExported(statement) {
  const modifiers = ts.canHaveModifiers(statement) ? (ts.getModifiers(statement) ?? []) : [];
  return modifiers.some(({ kind }) => kind === ts.SyntaxKind.ExportKeyword);
}

function isFunction(statement) {
  if (ts.isFunctionDeclaration(statement)) return true;
  if (!ts.isVariableStatement(statement)) return false;
  return statement.declarationList.declarations.some(
    ({ initializer }) =>
      initializer && (ts.isArrowFunction(initializer) || ts.isFunctionExpression(initializer)),
  );
}
