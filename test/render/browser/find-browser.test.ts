import { chmodSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, describe, expect, it } from "vitest";
import { RenderError } from "../../../kernel-helpers/errors/index.js";
import { findBrowser } from "../../../kernel-helpers/render/browser/find-browser.js";

const folder = mkdtempSync(join(tmpdir(), "stillwell-test-"));
afterAll(() => rmSync(folder, { recursive: true }));
const program = join(folder, "chrome-headless-shell");
writeFileSync(program, "#!/bin/sh\n");
chmodSync(program, 0o755);
const text = join(folder, "text");
writeFileSync(text, "");
chmodSync(text, 0o644);

const failure = async (search: Parameters<typeof findBrowser>[0]): Promise<RenderError> => {
  const error: unknown = await findBrowser(search).catch((e: unknown) => e);
  if (error instanceof RenderError) return error;
  throw new Error("nothing was refused");
};

describe("the browser", () => {
  it("that is named comes first, even if others are there", async () => {
    const found = await findBrowser({ env: { STILLWELL_BROWSER: program, PATH: folder } });
    expect(found).toMatchObject({ executable: program, kind: "chosen", headless: "shell" });
  });
  it.each([join(folder, "none"), folder, text])("that is named as %s is refused", async (path) => {
    const error = await failure({ env: { STILLWELL_BROWSER: path } });
    expect(error.code).toBe("bad-browser");
    expect(error.message).toContain(path);
  });
  it("on the system is found on PATH", async () => {
    const search = { env: { PATH: folder }, kinds: ["installed"], platform: "linux" } as const;
    const found = await findBrowser(search);
    expect(found.kind).toBe("installed");
    expect(found.env).toBe(search.env);
  });
  it("that cannot be had is refused with the order tried and the remedies", async () => {
    const error = await failure({ env: {}, platform: "win32", arch: "arm64" });
    expect(error.code).toBe("no-browser");
    expect(error.message).toMatch(
      /STILLWELL_BROWSER \(not set\), Chrome or Chromium on this system \(not found\), the shipped browser \(for Linux on x64, not for win32 on arm64\)/,
    );
    expect(error.remedy).toMatch(/install Chrome or Chromium.*STILLWELL_BROWSER.*npm install/);
  });
});
