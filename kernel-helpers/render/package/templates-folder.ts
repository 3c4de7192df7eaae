import { existsSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { RenderError } from "../../errors/index.js";

/** The folder of the templates, found by walking up from this file: beside the sources or in the installed package. */
export function templatesFolder(from = dirname(fileURLToPath(import.meta.url))): string {
  for (let folder = from; ; folder = dirname(folder)) {
    const here = join(folder, "templates");
    if (existsSync(join(here, "skeleton.njk"))) return here;
    if (folder === dirname(folder))
      throw new RenderError({
        code: "no-templates",
        where: from,
        problem: "no folder above it holds templates/skeleton.njk",
        remedy: "install the package again",
      });
  }
}
