import { createHash } from "node:crypto";
import { RenderError } from "../../errors/index.js";
import { escapeHtml } from "../lettering/escape-html.js";
import type { ChartSpec } from "./chart-spec.js";
import { tidySvg } from "./tidy-svg.js";

/**
 * A vega-lite specification as a drawing that stands alone: no script, no outside file, the same
 * bytes each time. Its `description` becomes the text for screen readers.
 *
 * @throws RenderError `no-description`, `bad-chart`, `outside-data`.
 */
export async function renderChart(spec: ChartSpec): Promise<string> {
  if (typeof spec.description !== "string" || spec.description.trim() === "")
    throw new RenderError({
      code: "no-description",
      where: "chart",
      problem: "has no description",
      expected: "what it shows, in words, for readers who cannot see it",
    });
  // Top-level await in vega keeps it out of modules that a notebook loads with require.
  const [vega, vegaLite] = await Promise.all([import("vega"), import("vega-lite")]);
  // Vega only warns of what it could not load, and draws on without it.
  const problems: unknown[] = [];
  const refuse = (uri: string): RenderError => {
    const refusal = new RenderError({
      code: "outside-data",
      where: "chart",
      problem: `asks for ${uri}`,
      expected: "all its data within it",
    });
    problems.push(refusal);
    return refusal;
  };
  const loader = vega.loader();
  loader.load = (uri) => Promise.reject(refuse(uri));
  // A rejection here would go unhandled; a link to nowhere is never written, as the problem is thrown.
  loader.sanitize = (uri) => {
    refuse(uri);
    return Promise.resolve({ href: "" });
  };
  const logger = vega.logger(vega.Warn);
  logger.error = (...reasons) => {
    problems.push(...reasons);
    return logger;
  };
  logger.warn = () => logger;
  try {
    // The compiler fills in defaults where it stands, so it gets a copy.
    const copy = JSON.parse(JSON.stringify(spec)) as Parameters<typeof vegaLite.compile>[0];
    const compiled = vegaLite.compile(copy, { logger });
    const view = new vega.View(vega.parse(compiled.spec), { renderer: "none", loader, logger });
    try {
      const svg = await view.toSVG();
      if (problems.length > 0) throw problems[0];
      const prefix = createHash("sha256").update(JSON.stringify(spec)).digest("hex").slice(0, 8);
      return labelled(tidySvg(svg, prefix), spec.description);
    } finally {
      view.finalize();
    }
  } catch (error) {
    if (error instanceof RenderError) throw error;
    throw new RenderError({
      code: "bad-chart",
      where: "chart",
      problem: `cannot be drawn: ${error instanceof Error ? error.message : String(error)}`,
      expected: "a vega-lite specification",
      cause: error,
    });
  }
}

const labelled = (svg: string, description: string): string =>
  svg.replace(
    /^<svg /,
    () => `<svg role="img" aria-label="${escapeHtml(description)}" style="overflow:visible" `,
  );
