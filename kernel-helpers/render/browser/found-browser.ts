/** The variables of a process, as `process.env` has them. */
export type Environment = Readonly<Record<string, string | undefined>>;

/** How a browser was come by: named by the user, found on the system, or unpacked from the package. */
export type BrowserKind = "chosen" | "installed" | "shipped";

/** A browser that can be started, with all that starting it needs. */
export interface FoundBrowser {
  readonly executable: string;
  readonly kind: BrowserKind;
  /** Known before the start only for the shipped browser. */
  readonly version: string | null;
  /** `"shell"` is the headless-only build, `true` the headless mode of a full browser. */
  readonly headless: true | "shell";
  /** The environment it is started with. */
  readonly env: Environment;
  readonly args: readonly string[];
}
