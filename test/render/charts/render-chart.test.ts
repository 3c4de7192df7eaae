import { describe, expect, it } from "vitest";
import { RenderError } from "../../../kernel-helpers/errors/index.js";
import type { ChartSpec } from "../../../kernel-helpers/render/charts/chart-spec.js";
import { chartTheme } from "../../../kernel-helpers/render/charts/chart-theme.js";
import { depthChart } from "../../../kernel-helpers/render/charts/depth-chart.js";
import { renderChart } from "../../../kernel-helpers/render/charts/render-chart.js";
import { there } from "../there.js";

const depth = [1000, 2000, 3000];
const spec = depthChart({
  description: `"Pressure" <against> depth`,
  series: [{ label: "flow <10⁻³ m³/s>", depth, value: [10, 20, 40] }],
  depthRange: [1000, 3000],
  depthTitle: "Depth [m]",
  xTitle: "Pressure & more [MPa]",
  width: 400,
  height: 400,
  plotTop: 50,
  plotBottom: 350,
});
const bars: ChartSpec = {
  description: "Bars",
  config: chartTheme,
  data: { values: [{ a: "x", b: 1 }] },
  mark: { type: "bar", clip: true },
  encoding: { x: { field: "a", type: "nominal" }, y: { field: "b", type: "quantitative" } },
};
const refusal = async (bad: ChartSpec): Promise<string> => {
  const error: unknown = await renderChart(bad).catch((e: unknown) => e);
  return error instanceof RenderError ? error.code : `no refusal: ${String(error)}`;
};

describe("a drawn chart", () => {
  it("is one image with its description escaped", async () => {
    const svg = await renderChart(spec);
    expect(svg).toMatch(
      /^<svg role="img" aria-label="&quot;Pressure&quot; &lt;against&gt; depth" /,
    );
    expect(svg.match(/ (role|aria-[a-z]+)=/g)).toHaveLength(2);
    expect(svg).toContain("overflow:visible");
  });
  it("has the size asked for and the plot where it was asked for", async () => {
    const svg = await renderChart(spec);
    expect(svg).toMatch(/ width="400" height="400"/);
    expect(svg).toMatch(/transform="translate\(\d+,50\)"/);
    // The line runs from the top of the plot to its bottom, 300 px below.
    expect(svg).toMatch(/<path d="M[\d.]+,0L[\d.]+,150L[\d.]+,300"/);
  });
  it("is the same each time, also in the ids that it needs", async () => {
    const first = await renderChart(spec);
    expect(await renderChart(spec)).toBe(first);
    const once = await renderChart(bars);
    await renderChart(spec);
    expect(await renderChart(bars)).toBe(once);
  });
  it("has ids of its own", async () => {
    const ids = async (s: ChartSpec): Promise<string[]> =>
      [...(await renderChart(s)).matchAll(/ id="([^"]+)"/g)].map((m) => there(m[1]));
    const [a, b] = [await ids(spec), await ids(bars)];
    expect(a.length).toBeGreaterThan(0);
    expect(b.length).toBeGreaterThan(0);
    expect(a.filter((id) => b.includes(id))).toEqual([]);
    for (const s of [spec, bars]) {
      const svg = await renderChart(s);
      for (const [, id] of svg.matchAll(/url\(#([^)]+)\)/g))
        expect(svg).toContain(` id="${there(id)}"`);
    }
  });
  it("escapes what it writes and sets raised digits as small ones", async () => {
    const svg = await renderChart(spec);
    expect(svg).not.toContain("<10");
    expect(svg).toContain('flow &lt;10<tspan baseline-shift="33%" font-size="72%">−3</tspan>');
    expect(svg).toContain("Pressure &amp; more [MPa]");
  });
  it("holds no script, no outside address and no number with endless digits", async () => {
    const svg = await renderChart(spec);
    expect(svg).not.toMatch(/<script|javascript:|href=|http:\/\/(?!www\.w3\.org)/);
    expect(svg).not.toMatch(/\d\.\d{3}/);
  });
  it("does not change its specification", async () => {
    const before = JSON.stringify(bars);
    await renderChart(bars);
    expect(JSON.stringify(bars)).toBe(before);
  });
  it("is refused without a description, with outside data, pictures or links, or if it is none", async () => {
    expect(await refusal({ ...bars, description: "" })).toBe("no-description");
    for (const url of ["file:///etc/hostname", "http://127.0.0.1:9/x.json", "data.csv"])
      expect(await refusal({ ...bars, data: { url } })).toBe("outside-data");
    expect(await refusal({ ...bars, mark: "no such mark" })).toBe("bad-chart");
    const picture = { mark: "image", encoding: { url: { value: "http://127.0.0.1:9/x.png" } } };
    expect(await refusal({ ...bars, ...picture })).toBe("outside-data");
    const link = { encoding: { href: { value: "http://127.0.0.1:9/" } } };
    expect(await refusal({ ...bars, mark: "point", ...link })).toBe("outside-data");
  });
});
