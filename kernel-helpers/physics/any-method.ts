import type { Basis, Finding, Method, Source, Use } from "../method/index.js";

/** Arguments of a method whose inputs the compiler does not know: SI numbers and chosen names. */
export interface AnyArguments {
  readonly [name: string]: number | string;
}

export interface AnyCheck {
  readonly from: Source;
  readonly basis: Basis;
  readonly rows: readonly {
    readonly given: object;
    readonly printed: string;
    readonly in?: { readonly scale: number; readonly offset: number };
    readonly within?: number;
    readonly because?: string;
  }[];
}

/** Any method, as in lists of methods: what can be said and done without knowing its inputs. */
export interface AnyMethod
  extends
    Use,
    Pick<
      Method,
      "tex" | "source" | "family" | "direction" | "cautions" | "dimensional" | "result" | "rules"
    > {
  readonly role: "method";
  readonly checks: readonly AnyCheck[];
  si(args: AnyArguments): number;
  findings(args: AnyArguments): readonly Finding[];
}
