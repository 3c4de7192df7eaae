import { RenderError } from "../../errors/index.js";

/**
 * A view that a template cannot misspell: reading a field that is not there throws, in loops,
 * conditions and filters too, where the template engine's own option stays silent.
 */
export function strictView<T>(value: T, path: string): T {
  if (typeof value !== "object" || value === null) return value;
  return new Proxy(value, {
    get(target, key, receiver) {
      const found: unknown = Reflect.get(target, key, receiver);
      if (typeof key === "symbol") return found;
      if (found === undefined && !(key in target))
        throw new RenderError({
          code: "unknown-field",
          where: `${path}.${key}`,
          problem: "is not in the view that templates are given",
          expected: Array.isArray(target)
            ? `an index below ${target.length}`
            : Object.keys(target).join(", "),
        });
      return strictView(found, `${path}.${key}`);
    },
  });
}
