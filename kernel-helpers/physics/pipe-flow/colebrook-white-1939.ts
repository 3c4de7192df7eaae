import { method } from "../../method/index.js";
import { frictionFactor, frictionFamily, frictionInputs } from "./friction-inputs.js";

/**
 * Darcy friction factor of turbulent flow in a round pipe.
 *
 * 1/√f = −2 log₁₀[ε/D/3.7 + 2.51/(Re√f)] (Darcy), solved to full precision by Newton steps on 1/√f;
 * Re = ρvD/µ, ε/D relative roughness. For 4000 < Re < 1e8, ε/D < 0.05; the basis of Moody's diagram,
 * ±5 % of measurements in commercial pipe. Colebrook (1939), on measurements with White.
 */
export const colebrookWhite = method({
  id: "colebrook-white-1939",
  revision: 1,
  family: frictionFamily,
  title: "Darcy friction factor, turbulent (Colebrook and White)",
  tex: String.raw`f:\ \frac1{\sqrt f}=-2\log_{10}\left(\frac{\varepsilon/D}{3.7}+\frac{2.51}{\mathrm{Re}\sqrt f}\right)`,
  source: { cite: "colebrook1939", where: "equation for the transition region" },
  inputs: {
    Re: { ...frictionInputs.Re, range: [4e3, 1e8] },
    eD: { ...frictionInputs.eD, range: [0, 0.05] },
  },
  output: frictionFactor,
  compute: ({ Re, eD }) => {
    const rough = eD / 3.7;
    const smooth = 2.51 / Re;
    // The left side less the right is concave and rises in x = 1/√f, so Newton steps converge from the left
    let x = 1;
    for (let i = 0; i < 60; i++) {
      const inner = rough + smooth * x;
      const g = x + 2 * Math.log10(inner);
      const step = g / (1 + (2 / Math.LN10) * (smooth / inner));
      x -= step;
      if (x <= 0) x = 1e-6;
      if (Math.abs(step) <= 1e-15 * x) break;
    }
    return 1 / x ** 2;
  },
  checks: [
    {
      from: { cite: "fluids", where: "friction.Colebrook, docstring example" },
      basis: "general reference library",
      rows: [
        {
          given: { Re: 1e5, eD: 1e-4 },
          printed: "0.018513866077",
          within: 1e-10,
          because: "printed to eleven digits",
        },
      ],
    },
    {
      from: { cite: "moody1944", where: "diagram: rough limit at ε/D 0.05, 0.072" },
      basis: "from memory",
      rows: [
        {
          given: { Re: 1e8, eD: 0.05 },
          printed: "0.0716",
          within: 2e-3,
          because: "Nikuradse's rough law: (2 log10(3.7/0.05))^−2",
        },
      ],
    },
  ],
});
