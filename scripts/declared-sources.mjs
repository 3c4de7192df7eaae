// Finds every declared method, model and entity, and hashes what its numbers come from.
import { createHash } from "node:crypto";
import { existsSync, readFileSync, readdirSync } from "node:fs";
import { dirname, join, relative, sep } from "node:path";
import ts from "typescript";

const DECLARERS = new Set(["method", "model", "entity"]);
// Words for readers, and the name and number of the declaration itself. They are left out of
// declarations and tables, not of function bodies.
const WORDS = new Set([
  ...["id", "revision", "title", "tex", "source", "family", "about", "note", "symbol"],
  ...["checks", "cautions", "direction", "dimensional"],
]);
const ROOMS = ["physics", "materials", "well", "models"];

/**
 * The declarations of a package folder, by id, each with its revision and the hash of what it
 * computes: its own declaration without the words for readers, and every function, constant and
 * table of these rooms that it reaches. Another declaration that it reaches counts by its id, since
 * it has a revision of its own. Comments, types, formatting and parentheses do not count.
 */
export function declaredSources(folder) {
  const modules = new Modules(folder);
  const found = new Map();
  for (const room of ROOMS)
    for (const path of filesBelow(join(folder, room)))
      for (const [name, declared] of modules.at(path).declared) {
        const { id, revision, role } = declared;
        const where = relative(folder, path).split(sep).join("/");
        if (found.has(id))
          throw new Error(`${where}: "${id}" is declared in ${found.get(id).where} too`);
        found.set(id, { id, role, revision, where, ...walk(modules, path, name) });
      }
  return [...found.values()].sort((a, b) => (a.id < b.id ? -1 : 1));
}

function filesBelow(dir) {
  if (!existsSync(dir)) return [];
  return readdirSync(dir, { withFileTypes: true }).flatMap((e) =>
    e.isDirectory()
      ? filesBelow(join(dir, e.name))
      : e.name.endsWith(".ts")
        ? [join(dir, e.name)]
        : [],
  );
}

function walk(modules, path, name) {
  const seen = new Set();
  const parts = [];
  const reaches = [];
  const visit = (file, local, isUsed) => {
    const target = modules.resolve(file, local);
    if (!target) return;
    const key = `${relative(modules.folder, target.path).split(sep).join("/")}#${target.name}`;
    if (seen.has(key)) return;
    if (!isUsed && target.module.declared.has(target.name)) return;
    const isSelf = seen.size === 0;
    seen.add(key);
    const declared = target.module.declared.get(target.name);
    if (declared && !isSelf) {
      reaches.push(declared.id);
      return;
    }
    const shape = shapeOf(target.node);
    parts.push(`${target.name} ${shape.text}`);
    for (const [other, isUsedThere] of shape.names) visit(target.path, other, isUsedThere);
  };
  visit(path, name, true);
  // Sorted, since the order in which things are reached follows the order of lines in a file.
  reaches.sort();
  const text = [...parts.sort(), ...reaches].join("\n");
  return { hash: createHash("sha256").update(text).digest("hex").slice(0, 16), reaches };
}

/** The modules of the hashed rooms, with types and comments stripped by the compiler. */
class Modules {
  constructor(folder) {
    this.folder = folder;
    this.byPath = new Map();
  }

  at(path) {
    const known = this.byPath.get(path);
    if (known) return known;
    const module = read(path);
    this.byPath.set(path, module);
    return module;
  }

  /** The declaration that a name of a module stands for; null for one of another room, or not of a module. */
  resolve(path, name) {
    const module = this.at(path);
    const node = module.local.get(name);
    if (node) return { path, module, name, node };
    const imported = module.imports.get(name);
    return imported ? this.exported(imported.path, imported.name) : null;
  }

  exported(path, name) {
    if (!this.isHashed(path)) return null;
    if (name === "*") throw new Error(`${path}: import what is used by name`);
    const module = this.at(path);
    if (module.local.has(name)) return this.resolve(path, name);
    const renamed = module.reexports.get(name);
    if (renamed) return this.exported(renamed.path, renamed.name);
    for (const from of module.all) {
      const found = this.exported(from, name);
      if (found) return found;
    }
    return null;
  }

  isHashed(path) {
    const inside = relative(this.folder, path).split(sep);
    return ROOMS.includes(inside[0]) && existsSync(path);
  }
}

function read(path) {
  const { outputText } = ts.transpileModule(readFileSync(path, "utf8"), {
    compilerOptions: {
      target: ts.ScriptTarget.ES2022,
      module: ts.ModuleKind.ESNext,
      verbatimModuleSyntax: true,
      removeComments: true,
    },
    fileName: path,
  });
  const tree = ts.createSourceFile(path, outputText, ts.ScriptTarget.ES2022, true);
  const module = {
    local: new Map(),
    imports: new Map(),
    reexports: new Map(),
    all: [],
    declared: new Map(),
  };
  const sourceOf = (specifier) => join(dirname(path), specifier.text.replace(/\.js$/, ".ts"));
  const isOurs = (specifier) => specifier && specifier.text.startsWith(".");
  const texts = textConstants(tree);
  for (const s of tree.statements) {
    if (ts.isImportDeclaration(s) && isOurs(s.moduleSpecifier)) {
      const bindings = s.importClause?.namedBindings;
      if (bindings && ts.isNamespaceImport(bindings))
        module.imports.set(bindings.name.text, { path: sourceOf(s.moduleSpecifier), name: "*" });
      else
        for (const e of bindings?.elements ?? [])
          module.imports.set(e.name.text, {
            path: sourceOf(s.moduleSpecifier),
            name: (e.propertyName ?? e.name).text,
          });
    } else if (ts.isExportDeclaration(s) && isOurs(s.moduleSpecifier)) {
      const from = sourceOf(s.moduleSpecifier);
      if (!s.exportClause) module.all.push(from);
      else if (ts.isNamedExports(s.exportClause))
        for (const e of s.exportClause.elements)
          module.reexports.set(e.name.text, { path: from, name: (e.propertyName ?? e.name).text });
    } else if (ts.isVariableStatement(s)) {
      for (const d of s.declarationList.declarations) {
        for (const name of namesIn(d.name)) module.local.set(name, d);
        const declared = declarationOf(d.initializer, texts);
        if (declared) module.declared.set(d.name.text, declared);
      }
    } else if ((ts.isFunctionDeclaration(s) || ts.isClassDeclaration(s)) && s.name)
      module.local.set(s.name.text, s);
  }
  refuseHidden(tree, module, path);
  return module;
}

const namesIn = (name) =>
  ts.isIdentifier(name)
    ? [name.text]
    : name.elements.flatMap((e) => (ts.isOmittedExpression(e) ? [] : namesIn(e.name)));

/** `const ID = "…"` of a module. */
const textConstants = (tree) =>
  new Map(
    tree.statements
      .filter(ts.isVariableStatement)
      .flatMap((s) => [...s.declarationList.declarations])
      .filter((d) => d.initializer && ts.isStringLiteralLike(d.initializer))
      .map((d) => [d.name.getText(), d.initializer.text]),
  );

/** Id and revision of `method({ id: "…", revision: n, … })` and the like. */
function declarationOf(e, texts) {
  if (!e || !ts.isCallExpression(e) || !ts.isIdentifier(e.expression)) return null;
  if (!DECLARERS.has(e.expression.text)) return null;
  const [parts] = e.arguments;
  if (!parts || !ts.isObjectLiteralExpression(parts)) return null;
  const valueOf = (name) =>
    parts.properties.find((p) => ts.isPropertyAssignment(p) && p.name.getText() === name)
      ?.initializer;
  const name = valueOf("id");
  const id = name && (ts.isStringLiteralLike(name) ? name.text : texts.get(name.getText()));
  const revision = valueOf("revision");
  if (!id || !revision || !ts.isNumericLiteral(revision)) return null;
  return { id, role: e.expression.text, revision: Number(revision.text) };
}

/** A declaration that is not a constant of a module, or whose id is computed, cannot be locked. */
function refuseHidden(tree, module, path) {
  let calls = 0;
  const visit = (node) => {
    if (ts.isCallExpression(node) && ts.isIdentifier(node.expression))
      if (DECLARERS.has(node.expression.text)) calls += 1;
    ts.forEachChild(node, visit);
  };
  visit(tree);
  if (calls === module.declared.size) return;
  throw new Error(
    `${path}: declare each method, model and entity as a constant of the module, with id and revision written out`,
  );
}

/**
 * The tree of a declaration as text, without words for readers, and the names it may refer to, each
 * with whether more than its `inputs` are taken: a field shared with another method is no use of it.
 */
function shapeOf(root) {
  const names = new Map();
  const out = [];
  const visit = (node, inFunction) => {
    if (ts.isParenthesizedExpression(node)) return visit(node.expression, inFunction);
    if (!inFunction && ts.isPropertyAssignment(node) && WORDS.has(node.name.getText())) return;
    if (ts.isIdentifier(node)) {
      if (isReference(node)) names.set(node.text, names.get(node.text) || !isInputsOf(node));
      out.push(node.text);
      return;
    }
    const within = inFunction || ts.isFunctionLike(node);
    out.push(`(${ts.SyntaxKind[node.kind]}`);
    if ("operator" in node) out.push(ts.SyntaxKind[node.operator]);
    if ("text" in node) out.push(JSON.stringify(node.text));
    ts.forEachChild(node, (child) => visit(child, within));
    out.push(")");
  };
  visit(root, ts.isFunctionLike(root));
  return { text: out.join(" "), names };
}

const isReference = (node) => {
  const { parent } = node;
  if (ts.isPropertyAccessExpression(parent)) return parent.expression === node;
  if (ts.isPropertyAssignment(parent)) return parent.initializer === node;
  return !(ts.isMethodDeclaration(parent) && parent.name === node);
};

const isInputsOf = ({ parent }) =>
  ts.isPropertyAccessExpression(parent) && parent.name.text === "inputs";
