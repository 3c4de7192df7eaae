import { posix } from "node:path";
import ts from "typescript";
import type { Import, SourceFile } from "./source-file.js";

/** A rule names what breaks it, one line each: `path:line says`. */
export type Rule = (file: SourceFile) => string[];

/** The layer of each room; a file imports from a lower layer or from its own room. */
export const LAYERS: { readonly [room: string]: number } = {
  errors: 0,
  units: 1,
  numerics: 1,
  method: 2,
  tables: 2,
  physics: 3,
  materials: 4,
  well: 4,
  models: 5,
  study: 6,
  review: 7,
  document: 8,
  files: 8,
  queue: 8,
  render: 9,
  notebook: 9,
  desk: 10,
  cli: 11,
};
const ROOT_INDEX = "index.ts";
const LONGEST = 400;

const roomOf = (path: string): string => path.split("/")[0] ?? "";
const at = ({ path }: SourceFile, line: number, says: string): string => `${path}:${line} ${says}`;
const lineOf = ({ tree }: SourceFile, node: ts.Node): number =>
  tree.getLineAndCharacterOfPosition(node.getStart()).line + 1;

/** The package that a specifier names, without the sub-path and the `node:` before a built-in. */
const packageOf = (specifier: string): string => {
  const [first = "", second = ""] = specifier.replace(/^node:/, "").split("/");
  return first.startsWith("@") ? `${first}/${second}` : first;
};
const importsOf = (file: SourceFile, is: (i: Import) => boolean, says: string): string[] =>
  file.imports.filter(is).map((i) => at(file, i.line, `${says}: ${i.specifier}`));

export const importsDownwards: Rule = (file) => {
  if (file.path === ROOT_INDEX) return [];
  const room = roomOf(file.path);
  const layer = LAYERS[room];
  if (layer === undefined) return [at(file, 1, `${room} is not a room of the table of layers`)];
  return file.imports.flatMap(({ specifier, line }) => {
    if (specifier === "stillwell") return [at(file, line, "imports the package by its name")];
    if (!specifier.startsWith(".")) return [];
    const target = posix.join(posix.dirname(file.path), specifier);
    if (target.startsWith("..")) return [at(file, line, `leaves the package: ${specifier}`)];
    const other = roomOf(target);
    if (other === room || (LAYERS[other] ?? Infinity) < layer) return [];
    return [at(file, line, `${room} imports ${other}, which is not below it`)];
  });
};

export const rootOnlyReexports: Rule = (file) =>
  file.path !== ROOT_INDEX
    ? []
    : file.tree.statements
        .filter((s) => !ts.isExportDeclaration(s) || !s.moduleSpecifier)
        .map((s) => at(file, lineOf(file, s), "the root index only re-exports"));

/** `as const`, `as T` and `satisfies T` taken off. */
const bare = (e: ts.Expression): ts.Expression =>
  ts.isAsExpression(e) || ts.isSatisfiesExpression(e) || ts.isParenthesizedExpression(e)
    ? bare(e.expression)
    : e;
const isListed = (e: ts.Expression): boolean => {
  const x = bare(e);
  if (ts.isSpreadElement(x)) return isListed(x.expression) || isLiteralList(x.expression);
  return ts.isIdentifier(x) || (ts.isPropertyAccessExpression(x) && isListed(x.expression));
};
const isLiteralList = (e: ts.Expression): boolean => {
  const x = bare(e);
  if (ts.isArrayLiteralExpression(x)) return x.elements.every(isListed);
  return (
    ts.isObjectLiteralExpression(x) &&
    x.properties.every(
      (p) =>
        ts.isShorthandPropertyAssignment(p) ||
        (ts.isPropertyAssignment(p) && isListed(p.initializer)),
    )
  );
};

/** A helper can be loaded twice in one kernel, so that nothing may register itself by being imported. */
export const registriesAreLiteral: Rule = (file) =>
  !/(^|[/-])registry\.ts$/.test(file.path)
    ? []
    : file.tree.statements
        .filter(ts.isVariableStatement)
        .filter((s) => s.modifiers?.some((m) => m.kind === ts.SyntaxKind.ExportKeyword))
        .flatMap((s) => [...s.declarationList.declarations])
        .filter((d) => !d.initializer || !isLiteralList(d.initializer))
        .map((d) =>
          at(file, lineOf(file, d), `${d.name.getText()} is not a literal list of names`),
        );

const OWNERS: { readonly [name: string]: string } = {
  nunjucks: "render",
  puppeteer: "render",
  "puppeteer-core": "render",
  tslab: "notebook",
  zeromq: "notebook",
  "danfojs-node": "tables",
};
export const packagesHaveOneOwner: Rule = (file) =>
  importsOf(
    file,
    ({ specifier }) => {
      const owner = OWNERS[packageOf(specifier)];
      return owner !== undefined && owner !== roomOf(file.path);
    },
    "imports a package of another room",
  );

const DISK_AND_NETWORK = new Set([
  ...["fs", "net", "http", "https", "http2", "tls", "dns", "dgram", "child_process"],
]);
export const onlyTheTopTouchesDisk: Rule = (file) => {
  const room = roomOf(file.path);
  if (room === "files" || room === "queue" || (LAYERS[room] ?? 0) >= 9) return [];
  return importsOf(
    file,
    ({ specifier }) => DISK_AND_NETWORK.has(packageOf(specifier)),
    "touches disk or network",
  );
};

// vega awaits at its top level, so that a notebook cell could not load what imports it; the others
// are slow to load.
const ON_DEMAND = new Set(["vega", "vega-lite", "danfojs-node", "puppeteer", "puppeteer-core"]);
export const heavyPackagesLoadOnDemand: Rule = (file) =>
  importsOf(
    file,
    ({ specifier, isStatic }) => isStatic && ON_DEMAND.has(packageOf(specifier)),
    "is loaded by import() inside a function",
  );

/** A cell loads the package with require, which cannot wait. */
export const noTopLevelAwait: Rule = (file) => {
  const found: string[] = [];
  const visit = (node: ts.Node): void => {
    if (ts.isFunctionLike(node)) return;
    if (ts.isAwaitExpression(node) || (ts.isForOfStatement(node) && node.awaitModifier))
      found.push(at(file, lineOf(file, node), "awaits at top level"));
    ts.forEachChild(node, visit);
  };
  visit(file.tree);
  return found;
};

export const filesAreShort: Rule = (file) => {
  const lines = file.text.trimEnd().split("\n").length;
  return lines > LONGEST ? [at(file, lines, `is longer than ${LONGEST} lines`)] : [];
};

export const namesSayWhatIsThere: Rule = ({ path }) =>
  path
    .replace(/(\.test)?(\.d)?\.ts$/, "")
    .split("/")
    .flatMap((name) => [
      ...(/^[a-z0-9]+(-[a-z0-9]+)*$/.test(name) ? [] : [`${path}:1 ${name} is not kebab-case`]),
      ...(/\b(utils?|helpers?|common|misc)\b/.test(name) ? [`${path}:1 ${name} says nothing`] : []),
    ]);

export const rules: { readonly [claim: string]: Rule } = {
  "a file imports from a lower layer or its own room": importsDownwards,
  "the root index only re-exports": rootOnlyReexports,
  "a registry is a literal list": registriesAreLiteral,
  "a package is imported in one room only": packagesHaveOneOwner,
  "only files, queue and the layers from 9 up touch disk or network": onlyTheTopTouchesDisk,
  "heavy packages load on demand": heavyPackagesLoadOnDemand,
  "nothing awaits at top level": noTopLevelAwait,
  "no file is longer than 400 lines": filesAreShort,
  "names are kebab-case and say what is there": namesSayWhatIsThere,
};
