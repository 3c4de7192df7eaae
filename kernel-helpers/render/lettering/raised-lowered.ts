// Of these the body fonts hold only ¹ ² ³ as glyphs, and a fallback font would differ from machine to
// machine; so they are set as raised and lowered plain characters.
const raised = "⁰¹²³⁴⁵⁶⁷⁸⁹⁺⁻⁼⁽⁾ⁿⁱ";
const raisedPlain = "0123456789+−=()ni";
const lowered = "₀₁₂₃₄₅₆₇₈₉₊₋₌₍₎ₐₑₕᵢⱼₖₗₘₙₒₚᵣₛₜᵤᵥₓ";
const loweredPlain = "0123456789+−=()aehijklmnoprstuvx";

const runs = new RegExp(`([${raised}]+)|([${lowered}]+)`, "g");
const onlyGlyphs = new RegExp(`^[^${raised.replace(/[¹²³]/g, "")}${lowered}]*$`);

/**
 * Text cut into plain, raised and lowered runs; the raised and lowered ones in plain characters. Text
 * that has no others than ¹ ² ³ keeps them as they are; beside others they are set like those.
 */
export function raisedLowered(
  text: string,
): readonly { readonly set: "plain" | "raised" | "lowered"; readonly text: string }[] {
  if (onlyGlyphs.test(text)) return text === "" ? [] : [{ set: "plain", text }];
  const parts: { set: "plain" | "raised" | "lowered"; text: string }[] = [];
  let at = 0;
  for (const match of text.matchAll(runs)) {
    if (match.index > at) parts.push({ set: "plain", text: text.slice(at, match.index) });
    const isRaised = match[1] !== undefined;
    parts.push({
      set: isRaised ? "raised" : "lowered",
      text: isRaised ? swap(match[0], raised, raisedPlain) : swap(match[0], lowered, loweredPlain),
    });
    at = match.index + match[0].length;
  }
  if (at < text.length) parts.push({ set: "plain", text: text.slice(at) });
  return parts;
}

const swap = (text: string, from: string, to: string): string =>
  Array.from(text, (c) => to.charAt(from.indexOf(c))).join("");
