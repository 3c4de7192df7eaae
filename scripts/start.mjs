// The sample study: runs the notebook, writes record, HTML and PDF under out/, and says what it concludes.
import { fileURLToPath } from "node:url";
import { main } from "../kernel-helpers/dist/cli/main.js";

process.chdir(fileURLToPath(new URL("..", import.meta.url)));
process.exitCode = await main(["package", "notebooks/first-look.ipynb", ...process.argv.slice(2)]);
