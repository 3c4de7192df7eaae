import { RenderError } from "../../errors/index.js";
import { findBrowser } from "./find-browser.js";
import type { Environment, FoundBrowser } from "./found-browser.js";
import { loadPuppeteer, type Puppeteer, type PuppeteerBrowser } from "./puppeteer.js";
import { openLockedPage, type LockedPage } from "./locked-page.js";

/** A started browser that many pages can be printed with. */
export interface BrowserSession {
  readonly browser: FoundBrowser;
  /** As the browser itself states it: `Chrome/147.0.7727.0`. */
  readonly version: string;
  /** Shows HTML in a page that can run no script and load nothing, and closes it after use. */
  withPage<T>(html: string, use: (page: LockedPage) => Promise<T>): Promise<T>;
}

export interface BrowserOptions {
  readonly env?: Environment;
  /** The browser to start; searched for if not given. */
  readonly browser?: FoundBrowser;
  /** Stops the browser, whatever it is doing. */
  readonly signal?: AbortSignal;
}

const protocolTimeout = 180_000; // ms
const closingTime = 5_000; // ms

/**
 * Starts a browser, hands it over and closes it, also when the use fails or the signal stops it. It is
 * driven through pipes, so that it ends by itself should this process be killed.
 *
 * @throws RenderError `no-browser`, `bad-browser`, `missing-package`, `browser-start`, `browser-stopped`.
 */
export async function withBrowser<T>(
  use: (session: BrowserSession) => Promise<T>,
  options: BrowserOptions = {},
): Promise<T> {
  const { signal } = options;
  signal?.throwIfAborted();
  const { found, started } = await start(options);
  const end = endOf(started, signal);
  try {
    const version = await started.version();
    const session: BrowserSession = {
      browser: found,
      version,
      withPage: async (html, usePage) => {
        const page = await openLockedPage(started, html);
        try {
          return await usePage(page);
        } finally {
          await page.close();
        }
      },
    };
    // Puppeteer waits out its own timeouts for some answers of a browser that is gone.
    return await Promise.race([use(session), end.reached]);
  } catch (error) {
    signal?.throwIfAborted();
    if (error instanceof RenderError || (started.connected && !end.isReached())) throw error;
    throw new RenderError({
      code: "browser-stopped",
      where: found.executable,
      problem: "the browser stopped while it was printing",
      remedy: "try again; if it stops again, free memory or choose another with STILLWELL_BROWSER",
      cause: error,
    });
  } finally {
    end.forget();
    await close(started);
  }
}

/** Rejects when the browser ends by itself, or when the signal has ended it. */
function endOf(
  started: PuppeteerBrowser,
  signal: AbortSignal | undefined,
): {
  readonly reached: Promise<never>;
  readonly isReached: () => boolean;
  readonly forget: () => void;
} {
  const child = started.process();
  const ended = new AbortController();
  const onExit = (): void => ended.abort(new Error("the browser has ended"));
  const onAbort = (): void => {
    child?.kill("SIGKILL");
    ended.abort(signal?.reason);
  };
  child?.once("exit", onExit);
  signal?.addEventListener("abort", onAbort);
  const reached = new Promise<never>((_, reject) => {
    ended.signal.addEventListener("abort", () => reject(asError(ended.signal.reason)));
  });
  reached.catch(() => undefined);
  return {
    reached,
    isReached: () => ended.signal.aborted,
    forget: () => {
      child?.off("exit", onExit);
      signal?.removeEventListener("abort", onAbort);
    },
  };
}

const asError = (reason: unknown): Error =>
  reason instanceof Error ? reason : new Error(String(reason));

interface Started {
  readonly found: FoundBrowser;
  readonly started: PuppeteerBrowser;
}

async function start(options: BrowserOptions): Promise<Started> {
  const { env = process.env, browser, signal } = options;
  const puppeteer = await loadPuppeteer();
  const more = signal ? { signal } : {};
  const found = browser ?? (await findBrowser({ env, ...more }));
  try {
    return { found, started: await launch(puppeteer, found, signal) };
  } catch (error) {
    signal?.throwIfAborted();
    // A browser that happens to be on the system may be broken; one that was named is the user's choice.
    if (browser || found.kind !== "installed") throw error;
    const shipped = await findBrowser({ env, kinds: ["shipped"], ...more }).catch(() => null);
    if (shipped === null) throw error;
    return { found: shipped, started: await launch(puppeteer, shipped, signal) };
  }
}

async function launch(
  puppeteer: Puppeteer,
  found: FoundBrowser,
  signal: AbortSignal | undefined,
): Promise<PuppeteerBrowser> {
  const isUnsandboxed = process.getuid?.() === 0 || found.env["STILLWELL_NO_SANDBOX"] === "1";
  try {
    return await puppeteer.launch({
      executablePath: found.executable,
      headless: found.headless,
      env: { ...found.env },
      args: [
        // The sandbox refuses to start for the root user.
        ...(isUnsandboxed ? ["--no-sandbox"] : []),
        "--disable-dev-shm-usage",
        "--font-render-hinting=none",
        // No name or address resolves: a second wall behind the refusal of requests in each page.
        "--host-resolver-rules=MAP * ~NOTFOUND",
        ...found.args,
      ],
      pipe: true,
      // A kernel answers SIGINT by stopping a cell; puppeteer would end the whole process.
      handleSIGINT: false,
      handleSIGTERM: false,
      handleSIGHUP: false,
      protocolTimeout,
      ...(signal ? { signal } : {}),
    });
  } catch (error) {
    signal?.throwIfAborted();
    const reason = error instanceof Error ? error.message : String(error);
    throw new RenderError({
      code: "browser-start",
      where: found.executable,
      problem: `the ${found.kind} browser does not start: ${firstLines(reason)}`,
      remedy: /sandbox/i.test(reason)
        ? "this system forbids its sandbox: allow unprivileged user namespaces, or set STILLWELL_NO_SANDBOX=1"
        : "set STILLWELL_BROWSER to the path of another Chrome or Chromium",
      cause: error,
    });
  }
}

async function close(started: PuppeteerBrowser): Promise<void> {
  const child = started.process();
  const ended = new Promise<void>((resolve) => {
    if (!child || child.exitCode !== null || child.signalCode !== null) resolve();
    else child.once("exit", () => resolve());
  });
  const timer = setTimeout(() => child?.kill("SIGKILL"), closingTime);
  // A browser that is gone already cannot be asked to close.
  await started.close().catch(() => child?.kill("SIGKILL"));
  await ended;
  clearTimeout(timer);
}

const firstLines = (text: string): string =>
  text
    .split("\n")
    .map((line) => line.trim())
    .filter((line) => line !== "")
    .slice(0, 4)
    .join(" | ")
    .slice(0, 400);
