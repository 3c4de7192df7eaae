export { withBrowser, type BrowserOptions, type BrowserSession } from "./browser-session.js";
export { findBrowser, type BrowserSearch } from "./find-browser.js";
export type { BrowserKind, Environment, FoundBrowser } from "./found-browser.js";
export type { LockedPage } from "./locked-page.js";
