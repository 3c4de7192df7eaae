import type ts from "@tslab/typescript-for-tslab";

export interface EarlierNamesParts {
  readonly compiler: typeof ts;
  readonly checker: ts.TypeChecker;
  /** The file in which tslab keeps the declarations of earlier cells. */
  readonly earlier: ts.SourceFile;
}

/**
 * tslab reaches names of earlier cells as properties of `exports`, but leaves the `d` of `{ d }` as
 * it is, so that it is not defined, and takes the key of `const { d: x } = y` for such a name.
 * This rewrites both before tslab sees them.
 */
export function earlierNames(parts: EarlierNamesParts): ts.TransformerFactory<ts.SourceFile> {
  const { compiler, checker, earlier } = parts;
  const { factory } = compiler;
  return (context) => {
    const visit = (node: ts.Node): ts.Node => {
      const inside = compiler.visitEachChild(node, visit, context);
      if (compiler.isShorthandPropertyAssignment(node)) return written(node, inside) ?? inside;
      if (compiler.isBindingElement(inside) && isPlainKey(inside.propertyName))
        return factory.updateBindingElement(
          inside,
          inside.dotDotDotToken,
          factory.createStringLiteral(inside.propertyName.text),
          inside.name,
          inside.initializer,
        );
      return inside;
    };
    return (file) => compiler.visitEachChild(file, visit, context);
  };

  /** `{ d }` in full, where `d` is of an earlier cell. */
  function written(node: ts.ShorthandPropertyAssignment, inside: ts.Node): ts.Node | null {
    const symbol = checker.getShorthandAssignmentValueSymbol(node);
    const isEarlier = symbol?.declarations?.some((d) => d.getSourceFile() === earlier) ?? false;
    if (!isEarlier || !compiler.isShorthandPropertyAssignment(inside)) return null;
    const { text } = node.name;
    const target = factory.createPropertyAccessExpression(
      factory.createIdentifier("exports"),
      text,
    );
    const fallback = inside.objectAssignmentInitializer;
    const value = fallback ? factory.createAssignment(target, fallback) : target;
    const whole = factory.createPropertyAssignment(text, compiler.setTextRange(value, node));
    return compiler.setTextRange(whole, node);
  }

  function isPlainKey(name: ts.PropertyName | undefined): name is ts.Identifier {
    return name !== undefined && compiler.isIdentifier(name);
  }
}

/** True when a cell has a `for await` of its own, which tslab does not take for an await. */
export function awaitsInLoop(compiler: typeof ts, file: ts.SourceFile): boolean {
  const search = (node: ts.Node): boolean => {
    if (compiler.isFunctionLike(node) || compiler.isClassLike(node)) return false;
    if (compiler.isForOfStatement(node) && node.awaitModifier) return true;
    return compiler.forEachChild(node, (child) => search(child) || undefined) ?? false;
  };
  return search(file);
}
