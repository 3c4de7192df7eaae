import type { Reference } from "../../method/index.js";
import { typesetHtml } from "../lettering/typeset.js";
import { personNames } from "./person-names.js";

/**
 * A cited work as one line of HTML, in a numeric style: authors, title, where it stands, year, DOI.
 * What is not known is left out.
 */
export function formatReference(reference: Reference): string {
  const parts = [
    escaped(personNames(reference.author ?? [])),
    ...(stylesByType[reference.type] ?? standsAlone)(reference),
    year(reference),
    doi(reference),
  ].filter((part) => part !== "");
  const line = parts.join(", ").replace(/,”,/g, ",”").replace(/,”$/, ".”");
  return /[.?!](<\/\w+>|”)?$/.test(line) ? line : `${line}.`;
}

type Style = (reference: Reference) => readonly string[];

const inContainer: Style = (r) => [
  quoted(r.title),
  italic(r["container-title"]),
  prefixed("vol.", r.volume),
  prefixed("no.", r.issue ?? r.number),
  pages(r.page),
];
const chapter: Style = (r) => [
  quoted(r.title),
  r["container-title"] === undefined ? "" : `in ${italic(r["container-title"])}`,
  edition(r.edition),
  prefixed("vol.", r.volume),
  escaped(r.publisher),
  pages(r.page),
];
const standsAlone: Style = (r) => [
  italic(r.title),
  edition(r.edition),
  prefixed("vol.", r.volume),
  escaped(r.number),
  italic(r["container-title"]),
  escaped(r.publisher),
  pages(r.page),
];
const report: Style = (r) => [
  italic(r.title),
  prefixed("report", r.number),
  escaped(r.publisher),
  pages(r.page),
];
const standard: Style = (r) => [
  escaped(r.number),
  italic(r.title),
  edition(r.edition),
  escaped(r.publisher),
  pages(r.page),
];
const software: Style = (r) => [
  italic(r.title),
  r.number === undefined && r.edition === undefined
    ? "software"
    : `software, version ${escaped(r.number ?? r.edition)}`,
  escaped(r.publisher),
];

const stylesByType: Readonly<Record<string, Style | undefined>> = {
  "article-journal": inContainer,
  "article-magazine": inContainer,
  article: inContainer,
  "paper-conference": chapter,
  chapter,
  "entry-encyclopedia": chapter,
  book: standsAlone,
  thesis: standsAlone,
  report,
  standard,
  legislation: standard,
  regulation: standard,
  software,
  dataset: standsAlone,
};

const escaped = (text: string | undefined): string => typesetHtml(text ?? "");
const quoted = (text: string): string => `“${escaped(text)},”`;
const italic = (text: string | undefined): string =>
  text === undefined ? "" : `<i>${escaped(text)}</i>`;
const prefixed = (word: string, text: string | undefined): string =>
  text === undefined ? "" : `${word}\u00a0${escaped(text)}`;

function pages(text: string | undefined): string {
  if (text === undefined) return "";
  const range = text.replace(/(\w)\s*[-–—]+\s*(?=\w)/g, "$1–");
  return prefixed(/[–,]/.test(range) ? "pp." : "p.", range);
}

/** "2" becomes "2nd ed."; words stay as they are. */
function edition(text: string | undefined): string {
  if (text === undefined) return "";
  if (!/^\d+$/.test(text)) return escaped(/\bed(ition|\.)/i.test(text) ? text : `${text} ed.`);
  const n = Number(text);
  const isTeen = n % 100 >= 11 && n % 100 <= 13;
  const suffix = isTeen ? "th" : (["th", "st", "nd", "rd"][n % 10] ?? "th");
  return `${n}${suffix} ed.`;
}

const year = (r: Reference): string => {
  const found = r.issued?.["date-parts"][0]?.[0];
  return found === undefined ? "" : String(found);
};

function doi(r: Reference): string {
  if (r.DOI === undefined) return "";
  const id = r.DOI.replace(/^(https?:\/\/(dx\.)?doi\.org\/|doi:\s*)/i, "");
  const address = id.split("/").map(encodeURIComponent).join("/");
  return `<a href="https://doi.org/${address}">doi:${escaped(id)}</a>`;
}
