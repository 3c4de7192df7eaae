import type ts from "@tslab/typescript-for-tslab";
import { isKind } from "../../units/index.js";
import type { KnownType } from "../known-type.js";

const DEEPEST = 4;
const MOST_FIELDS = 60;

/** What the checker knows of a cell's last expression, if its last statement is one. */
export function lastExpressionType(
  compiler: typeof ts,
  checker: ts.TypeChecker,
  file: ts.SourceFile,
): KnownType | null {
  const statement = file.statements.filter((s) => !compiler.isExportDeclaration(s)).at(-1);
  if (!statement || !compiler.isExpressionStatement(statement)) return null;
  const { expression } = statement;
  return read(checker.getTypeAtLocation(expression), 0);

  function read(type: ts.Type, depth: number): KnownType | null {
    const kind = kindOf(type);
    if (kind) return kind;
    if (depth >= DEEPEST) return null;
    if (type.isUnion()) return merged(type.types, depth);
    if (checker.isArrayType(type)) {
      const [item] = checker.getTypeArguments(type as ts.TypeReference);
      const each = item ? read(item, depth + 1) : null;
      return each && { each };
    }
    return isFieldHolder(type) ? fieldsOf(type, depth) : null;
  }

  /** The brand of a quantity. */
  function kindOf(type: ts.Type): KnownType | null {
    const brand = type.getProperty("__kind");
    if (!brand) return null;
    const named = checker.getNonNullableType(checker.getTypeOfSymbolAtLocation(brand, expression));
    return named.isStringLiteral() && isKind(named.value) ? { kind: named.value } : null;
  }

  /** A value is one of several: a result, or the reason why there is none. */
  function merged(types: readonly ts.Type[], depth: number): KnownType | null {
    const read_ = types.map((t) => read(t, depth)).filter((t) => t !== null);
    const [first] = read_;
    if (!first || read_.length === 1) return first ?? null;
    const holders = read_.filter((t) => "fields" in t);
    if (holders.length < read_.length) return null;
    return { fields: Object.assign({}, ...holders.map((t) => t.fields)) as never };
  }

  function fieldsOf(type: ts.Type, depth: number): KnownType | null {
    const properties = checker.getPropertiesOfType(type);
    if (properties.length === 0 || properties.length > MOST_FIELDS) return null;
    const fields: Record<string, KnownType> = {};
    for (const property of properties) {
      const field = read(checker.getTypeOfSymbolAtLocation(property, expression), depth + 1);
      if (field) fields[property.name] = field;
    }
    return Object.keys(fields).length > 0 ? { fields } : null;
  }

  function isFieldHolder(type: ts.Type): boolean {
    const isObject = (type.flags & compiler.TypeFlags.Object) !== 0;
    return (isObject || type.isIntersection()) && type.getCallSignatures().length === 0;
  }
}
