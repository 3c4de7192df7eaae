import type { Reference } from "../../method/index.js";

type Author = NonNullable<Reference["author"]>[number];

const mostNamed = 6;

/** "R. B. Bird, W. E. Stewart, and E. N. Lightfoot"; beyond six the first "et al.". */
export function personNames(authors: readonly Author[]): string {
  const names = authors.map(personName).filter((name) => name !== "");
  const [first = "", second = ""] = names;
  if (names.length > mostNamed) return `${first} et al.`;
  if (names.length < 2) return first;
  if (names.length === 2) return `${first} and ${second}`;
  return `${names.slice(0, -1).join(", ")}, and ${names[names.length - 1] ?? ""}`;
}

function personName(author: Author): string {
  if ("literal" in author) return author.literal;
  const initials = (author.given ?? "")
    .split(/\s+|(?<=\.)(?=\p{L})/u)
    .filter((name) => name !== "")
    .map((name) => name.split("-").map(initial).join("-"))
    .join("\u00a0");
  return initials === "" ? author.family : `${initials}\u00a0${author.family}`;
}

/** "Sabri" becomes "S."; a particle such as "van" stays. */
const initial = (name: string): string => {
  const first = Array.from(name)[0] ?? "";
  return first === first.toUpperCase() ? `${first}.` : name;
};
