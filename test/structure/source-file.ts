import ts from "typescript";

/** One thing that a file imports, type-only and dynamic imports included. */
export interface Import {
  readonly specifier: string;
  readonly line: number;
  /** Loaded when the file is, not by `import()` inside a function and not for its types only. */
  readonly isStatic: boolean;
}

/** What the rules need to know of a source file. */
export interface SourceFile {
  /** Relative to kernel-helpers, with forward slashes. */
  readonly path: string;
  readonly text: string;
  readonly imports: readonly Import[];
  readonly tree: ts.SourceFile;
}

/** Reads a source file with the compiler's parser. */
export function sourceFile(path: string, text: string): SourceFile {
  const tree = ts.createSourceFile(path, text, ts.ScriptTarget.ES2022, true);
  const imports: Import[] = [];
  const add = (at: ts.Node, isStatic: boolean): void => {
    const line = tree.getLineAndCharacterOfPosition(at.getStart()).line + 1;
    if (ts.isStringLiteralLike(at)) imports.push({ specifier: at.text, line, isStatic });
  };
  const visit = (node: ts.Node): void => {
    if (ts.isImportDeclaration(node)) {
      add(node.moduleSpecifier, node.importClause?.phaseModifier !== ts.SyntaxKind.TypeKeyword);
    } else if (ts.isExportDeclaration(node) && node.moduleSpecifier) {
      add(node.moduleSpecifier, !node.isTypeOnly);
    } else if (ts.isCallExpression(node) && node.arguments[0]) {
      if (node.expression.kind === ts.SyntaxKind.ImportKeyword) add(node.arguments[0], false);
      else if (/(^|\.)(require|resolve)$/.test(node.expression.getText()))
        add(node.arguments[0], false);
    } else if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument)) {
      add(node.argument.literal, false);
    }
    ts.forEachChild(node, visit);
  };
  visit(tree);
  return { path, text, imports, tree };
}
