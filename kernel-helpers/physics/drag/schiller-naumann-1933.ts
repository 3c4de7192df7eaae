import { method } from "../../method/index.js";
import { dragFamily, sphereDrag, sphereReynolds } from "./sphere-drag.js";

/**
 * Drag coefficient of a sphere.
 *
 * Cd = (24/Re)(1 + 0.15 Re^0.687) up to Re = 1000 (stated to 800), 0.44 above, a common extension up
 * to the drag crisis near 3e5; Re = ρvd/µ on the slip velocity, Cd on πd²/4. Within 5 % below 1000;
 * the step at 1000 is 0.4 %. Schiller and Naumann (1933).
 */
export const schillerNaumann = method({
  id: "schiller-naumann-1933",
  revision: 1,
  family: dragFamily,
  title: "Drag coefficient of a sphere (Schiller and Naumann)",
  tex: String.raw`\begin{cases}\frac{24}{\mathrm{Re}}\left(1+0.15\,\mathrm{Re}^{0.687}\right)&\mathrm{Re}\le1000\\0.44&\mathrm{Re}>1000\end{cases}`,
  source: {
    cite: "schiller1933",
    where: "as quoted by many; 0.44 above Re 1000 is the usual extension",
  },
  inputs: { Re: { ...sphereReynolds, range: [0, 1000] } },
  output: sphereDrag,
  compute: ({ Re }) => (Re <= 1000 ? (24 / Re) * (1 + 0.15 * Re ** 0.687) : 0.44),
  checks: [
    {
      from: { cite: "stokes1851", where: "24/Re as Re → 0" },
      basis: "exact limit or identity",
      rows: [{ given: { Re: 1e-9 }, printed: "2.4000e10" }],
    },
    {
      from: { cite: "lapple1940", where: "standard drag curve" },
      basis: "from memory",
      rows: [
        {
          given: { Re: 10 },
          printed: "4.1",
          within: 0.05,
          because: "read from the curve; the fit is stated to 5 %",
        },
        {
          given: { Re: 100 },
          printed: "1.07",
          within: 0.05,
          because: "read from the curve; the fit is stated to 5 %",
        },
        {
          given: { Re: 1000 },
          printed: "0.46",
          within: 0.05,
          because: "read from the curve; the fit is stated to 5 %",
        },
      ],
    },
    {
      from: { cite: "schiller1933", where: "evaluated apart from this program" },
      basis: "from memory",
      rows: [
        { given: { Re: 0.1 }, printed: "247.40" },
        { given: { Re: 1 }, printed: "27.600" },
        { given: { Re: 10 }, printed: "4.1511" },
        { given: { Re: 100 }, printed: "1.0917" },
        {
          given: { Re: 999 },
          printed: "0.43836",
          within: 0.0002,
          because: "next to the step, by hand",
        },
        { given: { Re: 1001 }, printed: "0.4400" },
        { given: { Re: 1e4 }, printed: "0.4400" },
      ],
    },
  ],
});
