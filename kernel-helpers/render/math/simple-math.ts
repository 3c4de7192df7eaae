import { escapeHtml } from "../lettering/escape-html.js";

const greek: Readonly<Record<string, string>> = {
  alpha: "α",
  beta: "β",
  gamma: "γ",
  delta: "δ",
  epsilon: "ϵ",
  varepsilon: "ε",
  zeta: "ζ",
  eta: "η",
  theta: "θ",
  kappa: "κ",
  lambda: "λ",
  mu: "μ",
  nu: "ν",
  xi: "ξ",
  pi: "π",
  rho: "ρ",
  sigma: "σ",
  tau: "τ",
  phi: "ϕ",
  varphi: "φ",
  chi: "χ",
  psi: "ψ",
  omega: "ω",
};
const upright: Readonly<Record<string, string>> = {
  Delta: "Δ",
  Gamma: "Γ",
  Omega: "Ω",
  Phi: "Φ",
  infty: "∞",
};

/**
 * A symbol such as `\rho_s`, `\mathrm{Re}_m` or `q/q_0` as a few plain elements: pages hold thousands
 * of them, and a full setting of each costs far more than it shows. Null for anything else.
 */
export function simpleMath(tex: string): string | null {
  const parser = new Simple(tex.trim());
  const html = parser.row("");
  return html !== null && parser.isDone ? html : null;
}

class Simple {
  private at = 0;
  constructor(private readonly tex: string) {}
  get isDone(): boolean {
    return this.at === this.tex.length;
  }

  /** Atoms with scripts, up to a closing brace or the end. */
  row(end: string): string | null {
    let out = "";
    while (!this.isDone && !this.tex.startsWith(end || "\u0000", this.at)) {
      const atom = this.atom();
      if (atom === null) return null;
      out += atom;
      for (const [mark, tag] of [
        ["_", "sub"],
        ["^", "sup"],
      ] as const) {
        if (this.tex[this.at] !== mark) continue;
        this.at += 1;
        const script = this.group();
        if (script === null) return null;
        out += `<${tag}>${script}</${tag}>`;
      }
    }
    return out;
  }

  private group(): string | null {
    if (this.tex[this.at] !== "{") return this.atom();
    this.at += 1;
    const inner = this.row("}");
    this.at += 1;
    return inner;
  }

  private atom(): string | null {
    const rest = this.tex.slice(this.at);
    const take = (length: number, html: string): string => {
      this.at += length;
      return html;
    };
    const words = /^\\(?:mathrm|text)\{([^{}\\]*)\}/.exec(rest);
    if (words) return take(words[0].length, escapeHtml(words[1] ?? ""));
    const name = /^\\([A-Za-z]+)\s*/.exec(rest);
    if (name) {
      const [all, word = ""] = name;
      if (greek[word] !== undefined) return take(all.length, `<i>${greek[word]}</i>`);
      if (upright[word] !== undefined) return take(all.length, upright[word]);
      return null;
    }
    if (rest.startsWith("\\,")) return take(2, "\u202f");
    if (/^[A-Za-z]/.test(rest)) return take(1, `<i>${rest.charAt(0)}</i>`);
    if (/^[0-9/.]/.test(rest)) return take(1, rest.charAt(0));
    if (/^\s/.test(rest)) return take(1, "");
    return null;
  }
}
