import { readFileSync } from "node:fs";
import { join } from "node:path";
import type { PackageView } from "../../document/index.js";
import { pageCss, pageOfPages, type PaperSize } from "../pdf/page-css.js";

/** The style sheets of the package, with the running header and footer of its pages. */
export function packageStyles(folder: string, { cover }: PackageView, size: PaperSize): string {
  const read = (name: string): string => readFileSync(join(folder, name), "utf8");
  return [
    ...["look.css", "tables.css", "maths.css", "blocks.css", "phone.css"].map(read),
    read("print.css"),
    pageCss({
      size,
      header: {
        left: `${cover.number}  rev. ${cover.revision}`,
        right: cover.title.length > 70 ? `${cover.title.slice(0, 69)}…` : cover.title,
      },
      footer: {
        left: `${cover.status}. Advisory: check independently before use.`,
        right: pageOfPages,
      },
    }),
  ].join("\n");
}
