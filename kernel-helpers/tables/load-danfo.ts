import { InputError } from "../errors/index.js";

/** What of danfojs a frame is built with. */
export interface Danfo {
  readonly DataFrame: new (
    data: { readonly [column: string]: unknown },
    options: { readonly dtypes: readonly string[] },
  ) => object;
}

/** Loads danfojs when the first frame is made; it is optional, and slow to load. */
export async function loadDanfo(
  load: () => Promise<unknown> = () => import("danfojs-node"),
): Promise<Danfo> {
  let found: unknown;
  try {
    found = await load();
  } catch (cause) {
    throw new InputError({
      code: "not-installed",
      where: "frame",
      problem: "danfojs-node cannot be loaded",
      remedy: "install it beside this package (npm install danfojs-node@1.2.0), or use toCsv",
      cause,
    });
  }
  const { DataFrame } = found as Partial<Danfo>;
  if (DataFrame) return { DataFrame };
  throw new InputError({
    code: "not-installed",
    where: "frame",
    problem: "danfojs-node has no DataFrame",
    remedy: "install version 1.2.0",
  });
}
