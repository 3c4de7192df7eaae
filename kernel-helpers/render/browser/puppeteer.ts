import type { ChildProcess } from "node:child_process";
import { pathToFileURL } from "node:url";
import { RenderError } from "../../errors/index.js";
import { missingPackage, optionalPackage } from "./optional-package.js";

// The part of puppeteer that is used, spelled out: it is an optional peer, so that declarations which
// import its types would not be readable without it.

export interface PuppeteerRequest {
  url(): string;
  isNavigationRequest(): boolean;
  continue(): Promise<void>;
  abort(code: "aborted" | "blockedbyclient"): Promise<void>;
}

export interface PuppeteerPage {
  setJavaScriptEnabled(enabled: boolean): Promise<void>;
  setRequestInterception(enabled: boolean): Promise<void>;
  emulateMediaType(type: "print"): Promise<void>;
  on(event: "request", handle: (request: PuppeteerRequest) => void): unknown;
  setContent(html: string, options: { waitUntil: "load"; timeout: number }): Promise<void>;
  evaluate(expression: string): Promise<unknown>;
  pdf(options: {
    preferCSSPageSize: boolean;
    printBackground: boolean;
    tagged: boolean;
    outline: boolean;
    timeout: number;
  }): Promise<Uint8Array>;
  close(): Promise<void>;
}

export interface PuppeteerBrowser {
  readonly connected: boolean;
  version(): Promise<string>;
  newPage(): Promise<PuppeteerPage>;
  close(): Promise<void>;
  process(): ChildProcess | null;
}

export interface Puppeteer {
  launch(options: {
    executablePath: string;
    headless: true | "shell";
    env: Record<string, string | undefined>;
    args: string[];
    pipe: boolean;
    handleSIGINT: boolean;
    handleSIGTERM: boolean;
    handleSIGHUP: boolean;
    signal?: AbortSignal;
    protocolTimeout: number;
  }): Promise<PuppeteerBrowser>;
}

/** Loaded when a page is printed, not before: it is large, and most work needs no browser. */
export async function loadPuppeteer(): Promise<Puppeteer> {
  const main = optionalPackage("puppeteer");
  if (main === null) throw missingPackage("puppeteer", "print PDF files");
  const loaded: unknown = await import(pathToFileURL(main).href);
  const found = [loaded, property(loaded, "default")].find(isPuppeteer);
  if (found) return found;
  throw new RenderError({
    code: "bad-package",
    where: "puppeteer",
    problem: "has no launch()",
    expected: "version 24",
    remedy: "install it again: npm install puppeteer@24",
  });
}

const isPuppeteer = (value: unknown): value is Puppeteer =>
  typeof property(value, "launch") === "function";

function property(value: unknown, name: string): unknown {
  if (value === null || (typeof value !== "object" && typeof value !== "function"))
    return undefined;
  return Reflect.get(value, name);
}
