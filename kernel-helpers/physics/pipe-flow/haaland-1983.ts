import { method } from "../../method/index.js";
import { frictionFactor, frictionFamily, frictionInputs } from "./friction-inputs.js";

/**
 * Darcy friction factor of turbulent flow in a round pipe, explicit.
 *
 * 1/√f = −1.8 log₁₀[(ε/D/3.7)^1.11 + 6.9/Re] (Darcy); Re = ρvD/µ, ε/D relative roughness. Within 2 % of
 * Colebrook and White for 4000 < Re < 1e8, 1e-6 < ε/D < 0.05. Haaland (1983).
 */
export const haaland = method({
  id: "haaland-1983",
  revision: 1,
  family: frictionFamily,
  title: "Darcy friction factor, turbulent (Haaland)",
  tex: String.raw`\left\{-1.8\log_{10}\left[\left(\frac{\varepsilon/D}{3.7}\right)^{1.11}+\frac{6.9}{\mathrm{Re}}\right]\right\}^{-2}`,
  source: { cite: "haaland1983", where: "as quoted by python3-fluids 1.0.22" },
  inputs: {
    Re: { ...frictionInputs.Re, range: [4e3, 1e8] },
    eD: { ...frictionInputs.eD, range: [0, 0.05] },
  },
  output: frictionFactor,
  compute: ({ Re, eD }) => (-1.8 * Math.log10((eD / 3.7) ** 1.11 + 6.9 / Re)) ** -2,
  checks: [
    {
      from: { cite: "fluids", where: "friction.Haaland, docstring example" },
      basis: "general reference library",
      rows: [
        {
          given: { Re: 1e5, eD: 1e-4 },
          printed: "0.018265053014793857",
          within: 1e-14,
          because: "double precision",
        },
      ],
    },
    {
      from: { cite: "moody1944", where: "diagram: smooth pipe at Re 1e5, 0.018" },
      basis: "from memory",
      rows: [{ given: { Re: 1e5, eD: 0 }, printed: "0.018" }],
    },
  ],
});
