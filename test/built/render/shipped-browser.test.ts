import {
  chmodSync,
  existsSync,
  mkdirSync,
  readFileSync,
  readdirSync,
  truncateSync,
  utimesSync,
} from "node:fs";
import { join } from "node:path";
import { afterAll, describe, expect, it } from "vitest";
import { RenderError } from "../../../kernel-helpers/errors/index.js";
import {
  shippedBrowser,
  shippedBrowserFiles,
} from "../../../kernel-helpers/render/browser/shipped-browser.js";
import { folder, removeFolder } from "./browsers.js";

afterAll(removeFolder);

describe("the shipped browser", () => {
  it("is unpacked once by two at once, replaced when damaged, and refused in a folder others can write to", async () => {
    const cache = join(folder, "cache");
    mkdirSync(join(cache, "chromium-1.2.3.part"), { recursive: true });
    utimesSync(join(cache, "chromium-1.2.3.part"), 0, 0);
    const [a, b] = await Promise.all([
      shippedBrowser({ env: { LD_LIBRARY_PATH: "/x" }, cache }),
      shippedBrowser({ env: {}, cache }),
    ]);
    const final = join(cache, `chromium-${shippedBrowserFiles().version}`);
    expect(a.executable).toBe(join(final, "chromium"));
    expect(b.executable).toBe(a.executable);
    expect(readdirSync(cache)).toEqual([`chromium-${shippedBrowserFiles().version}`]);
    expect(a.env["LD_LIBRARY_PATH"]).toBe(`${join(final, "lib")}:/x`);
    expect(b.env["LD_LIBRARY_PATH"]).toBe(join(final, "lib"));
    expect(existsSync(join(final, "lib", "libnss3.so"))).toBe(true);
    expect(readFileSync(a.env["FONTCONFIG_FILE"] ?? "", "utf8")).toContain(join(final, "fonts"));

    truncateSync(a.executable, 1000);
    await shippedBrowser({ env: {}, cache });
    expect(readFileSync(a.executable).length).toBeGreaterThan(1e8);

    chmodSync(final, 0o777);
    const error: unknown = await shippedBrowser({ env: {}, cache }).catch((e: unknown) => e);
    expect(error).toBeInstanceOf(RenderError);
    expect(error).toMatchObject({ code: "bad-cache-folder", where: final });
  });

  it("leaves nothing behind when it is stopped while unpacking", async () => {
    const cache = join(folder, "stopped");
    const act = shippedBrowser({ env: {}, cache, signal: AbortSignal.timeout(100) });
    await expect(act).rejects.toMatchObject({ name: /AbortError|TimeoutError/ });
    expect(readdirSync(cache)).toEqual([]);
  });
});
