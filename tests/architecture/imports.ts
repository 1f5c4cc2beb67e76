import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { dirname, join, normalize } from 'node:path';
import ts from 'typescript';

export interface Import {
  /** Project-relative file, or the package's name. */
  readonly target: string;
  readonly isPackage: boolean;
  readonly isTypeOnly: boolean;
}

const ROOTS = ['app', 'components', 'lib', 'db', 'docker-free-scripts'];

/** Every source file of the product, project-relative. */
export const sourceFiles = (): string[] =>
  ROOTS.flatMap((root) => [...walk(root)]).filter((file) => /\.(ts|tsx|mts|mjs)$/.test(file));

function* walk(folder: string): Generator<string> {
  if (!existsSync(folder)) return;
  for (const entry of readdirSync(folder)) {
    const path = join(folder, entry);
    if (statSync(path).isDirectory()) yield* walk(path);
    else yield path;
  }
}

/** Every import of a file, static or dynamic, with type-only ones told apart. */
export function importsOf(file: string): Import[] {
  const source = ts.createSourceFile(
    file,
    readFileSync(file, 'utf8'),
    ts.ScriptTarget.Latest,
    true,
  );
  const found: Import[] = [];
  const visit = (node: ts.Node): void => {
    if (ts.isImportDeclaration(node) && ts.isStringLiteral(node.moduleSpecifier)) {
      found.push(resolve(file, node.moduleSpecifier.text, isTypeOnlyImport(node)));
    } else if (
      ts.isExportDeclaration(node) &&
      node.moduleSpecifier !== undefined &&
      ts.isStringLiteral(node.moduleSpecifier)
    ) {
      found.push(resolve(file, node.moduleSpecifier.text, node.isTypeOnly));
    } else if (
      ts.isCallExpression(node) &&
      node.expression.kind === ts.SyntaxKind.ImportKeyword &&
      node.arguments[0] !== undefined &&
      ts.isStringLiteral(node.arguments[0])
    ) {
      found.push(resolve(file, node.arguments[0].text, false));
    }
    ts.forEachChild(node, visit);
  };
  visit(source);
  return found;
}

function isTypeOnlyImport(node: ts.ImportDeclaration): boolean {
  const clause = node.importClause;
  if (clause === undefined) return false;
  if (clause.phaseModifier === ts.SyntaxKind.TypeKeyword) return true;
  const bindings = clause.namedBindings;
  return (
    clause.name === undefined &&
    bindings !== undefined &&
    ts.isNamedImports(bindings) &&
    bindings.elements.length > 0 &&
    bindings.elements.every(({ isTypeOnly }) => isTypeOnly)
  );
}

function resolve(file: string, specifier: string, isTypeOnly: boolean): Import {
  const isLocal = specifier.startsWith('.') || specifier.startsWith('@/');
  if (!isLocal) return { target: specifier, isPackage: true, isTypeOnly };
  const base = specifier.startsWith('@/')
    ? specifier.slice(2)
    : normalize(join(dirname(file), specifier));
  const candidates = [
    base,
    ...['.ts', '.tsx', '.mts', '.mjs', '/index.ts'].map((end) => base + end),
  ];
  const target = candidates.find((path) => existsSync(path) && statSync(path).isFile()) ?? base;
  return { target, isPackage: false, isTypeOnly };
}
