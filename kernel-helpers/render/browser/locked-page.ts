import type { PuppeteerBrowser, PuppeteerRequest } from "./puppeteer.js";

/** A page that runs none of its own scripts and loads nothing but what it holds itself. */
export interface LockedPage {
  /** What the page asked for and was refused, in order. */
  readonly blocked: readonly string[];
  /** The value of an expression of ours; works though the page's own scripts are off. */
  evaluate(expression: string): Promise<unknown>;
  /** Tags and outline cost as much time as the rest. */
  pdf(options: { readonly isTagged: boolean }): Promise<Uint8Array>;
  close(): Promise<void>;
}

// `document.fonts` itself can be hidden by an element of that name in the page.
const fontsReady = `Object.getOwnPropertyDescriptor(Document.prototype, "fonts").get.call(document).ready.then(() => true)`;
const loadTimeout = 60_000; // ms
const printTimeout = 600_000; // ms; a package of a thousand steps takes minutes on a slow machine

/** The HTML is handed over as text: a file: address would give it the right to read other files. */
export async function openLockedPage(browser: PuppeteerBrowser, html: string): Promise<LockedPage> {
  const blocked: string[] = [];
  const page = await browser.newPage();
  try {
    await page.setJavaScriptEnabled(false);
    await page.setRequestInterception(true);
    await page.emulateMediaType("print");
    page.on("request", (request) => {
      const url = request.url();
      const isOwn = /^data:/i.test(url) || url === "about:blank";
      if (!isOwn) blocked.push(url);
      // A page that is closing answers with an error, and has no need of the request any more.
      void (isOwn ? request.continue() : refuse(request)).catch(() => undefined);
    });
    await page.setContent(html, { waitUntil: "load", timeout: loadTimeout });
    await page.evaluate(fontsReady);
  } catch (error) {
    await page.close().catch(() => undefined);
    throw error;
  }
  return {
    blocked,
    evaluate: (expression) => page.evaluate(expression),
    pdf: ({ isTagged }) =>
      page.pdf({
        preferCSSPageSize: true,
        printBackground: true,
        tagged: isTagged,
        outline: isTagged,
        timeout: printTimeout,
      }),
    close: () => page.close().catch(() => undefined),
  };
}

/** A refused move to another address leaves the page as it is; other errors would replace it. */
const refuse = (request: PuppeteerRequest): Promise<void> =>
  request.abort(request.isNavigationRequest() ? "aborted" : "blockedbyclient");
