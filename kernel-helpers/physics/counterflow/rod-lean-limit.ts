import { method, positive } from "../../method/index.js";
import { deg, m } from "../../units/index.js";
import { bore } from "../fields.js";
import { refuseTooWide } from "../refuse.js";

/**
 * Largest angle at which a flat-ended rod can lean in a bore, reached from upright.
 *
 * Root t of L sin t + d cos t = D: t = asin(D/h) − atan(d/L) with h = √(L²+d²), in radians; 90° when
 * h ≤ D, where the rod can turn over. d rod, D bore, L [m]. Exact for a flat-ended round rod while
 * tan t < L/d; nearly (D−d)/L for long rods. Throws InputError for d ≥ D.
 */
export const rodLeanLimit = method({
  id: "rod-lean-limit",
  revision: 1,
  family: "largest lean of a rod in a bore",
  title: "Largest lean of a rod in a bore",
  tex: String.raw`t:\ L\sin t+d\cos t=D,\quad t=\frac\pi2\ \text{if}\ L^2+d^2\le D^2`,
  source: { cite: "derivation", where: "width of a leaning cylinder in its plane of lean" },
  inputs: {
    d: { kind: "length", symbol: "d", note: "diameter of the rod", possible: positive },
    D: bore,
    L: { kind: "length", symbol: "L", note: "length of the rod", possible: positive },
  },
  output: { kind: "angle", symbol: String.raw`t_{\max}`, note: "angle from the axis of the bore" },
  compute: ({ d, D, L }) => {
    refuseTooWide("rod-lean-limit", d, D);
    const h2 = L ** 2 + d ** 2;
    if (h2 <= D ** 2) return Math.PI / 2;
    // sin t of the difference of the two angles, free of the cancellation as d → D
    return Math.asin(((D - d) * (D + d)) / (D * L + d * Math.sqrt(h2 - D ** 2)));
  },
  checks: [
    {
      from: { cite: "derivation", where: "L sin 30° + d cos 30° for L 100 mm, d 50 mm" },
      basis: "exact limit or identity",
      rows: [
        {
          given: { d: m(0.05), D: m(0.0933012702), L: m(0.1) },
          in: deg,
          printed: "30.00000",
        },
        { given: { d: m(3), D: m(5), L: m(4) }, in: deg, printed: "90.00000" },
        { given: { d: m(5), D: m(12), L: m(10.9) }, in: deg, printed: "90.00000" },
      ],
    },
    {
      from: { cite: "derivation", where: "solved apart from this program" },
      basis: "from memory",
      rows: [
        { given: { d: m(0.05), D: m(0.1), L: m(0.5) }, in: deg, printed: "5.768" },
        { given: { d: m(0.05), D: m(0.1), L: m(0.12) }, in: deg, printed: "27.665" },
        { given: { d: m(0.09), D: m(0.1), L: m(1) }, in: deg, printed: "0.573" },
      ],
    },
  ],
});
