import { nameCommands, textCommands } from "./tex-dictionary.js";

export interface TexToken {
  readonly text: string;
  /** Plain letters, such as the argument of `\mathrm`, and not TeX. */
  readonly isWords: boolean;
  /** Running text, such as the argument of `\text`. */
  readonly isText: boolean;
}

const token = /\\(?:operatorname\*|[A-Za-z]+|[^])|\d+(?:(?:\\,|\{,\})\d{3})*(?:\.\d+)?|\.\d+|\S/uy;

/** TeX cut into commands, numbers, characters and plain words; spaces between them are dropped. */
export function texTokens(tex: string): readonly TexToken[] {
  const tokens: TexToken[] = [];
  let at = 0;
  while (at < tex.length) {
    token.lastIndex = at;
    let text = token.exec(tex)?.[0];
    if (text === undefined) {
      at++;
      continue;
    }
    // TeX raises one digit only: x^23 is x squared times 3.
    if (/^[\d.]/.test(text) && ["^", "_"].includes(tokens.at(-1)?.text ?? ""))
      text = text.slice(0, 1);
    at += text.length;
    // The space below a row: \\[1ex].
    if (text === "\\\\") at += /^\s*\[[^\]]*\]/.exec(tex.slice(at))?.[0].length ?? 0;
    const isText = textCommands.has(text);
    const isName = nameCommands.has(text);
    const isEnvironment = text === "\\begin" || text === "\\end";
    if (isEnvironment || !(isText || isName))
      tokens.push({
        text: /^\d/.test(text) ? text.replace(/[^\d.]/g, "") : text,
        isWords: false,
        isText: false,
      });
    if (!isText && !isName && !isEnvironment) continue;
    // What such a command sets upright may itself be TeX, as in \mathrm{m^3}; it is then read as such.
    const words = /^\s*\{([^{}\\^_$]*)\}/.exec(tex.slice(at));
    if (!words) continue;
    at += words[0].length;
    tokens.push({
      text: (words[1] ?? "").replace(/[\s~]+/g, " ").trim(),
      isWords: true,
      isText,
    });
  }
  return tokens;
}
