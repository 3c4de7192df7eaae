import { method } from "../../method/index.js";
import { frictionFactor, frictionFamily, frictionInputs } from "./friction-inputs.js";

/**
 * Darcy friction factor in a round pipe for every regime, explicit.
 *
 * f = 8 [(8/Re)^12 + (A+B)^−1.5]^(1/12) (Darcy), A = {2.457 ln 1/[(7/Re)^0.9 + 0.27 ε/D]}^16,
 * B = (37 530/Re)^16; Re = ρvD/µ, ε/D relative roughness. 64/Re below 2100, within 3 % of Colebrook
 * and White above 4000; between, a smooth rise through a regime that has no single value. Churchill
 * (1977), whose own factor is an eighth of this.
 */
export const churchill = method({
  id: "churchill-1977",
  revision: 1,
  family: frictionFamily,
  title: "Darcy friction factor, all regimes (Churchill)",
  tex: String.raw`8\left[\left(\frac{8}{\mathrm{Re}}\right)^{12}+\frac{1}{(A+B)^{1.5}}\right]^{1/12},\quad A=\left\{2.457\ln\frac{1}{(7/\mathrm{Re})^{0.9}+0.27\,\varepsilon/D}\right\}^{16},\quad B=\left(\frac{37530}{\mathrm{Re}}\right)^{16}`,
  source: { cite: "churchill1977", where: "equation 18, as quoted by python3-fluids 1.0.22" },
  inputs: {
    Re: frictionInputs.Re,
    eD: { ...frictionInputs.eD, range: [0, 0.05], stated: false },
  },
  output: frictionFactor,
  compute: ({ Re, eD }) => {
    const A = (2.457 * Math.log((7 / Re) ** 0.9 + 0.27 * eD)) ** 16;
    const B = (37_530 / Re) ** 16;
    return 8 * ((8 / Re) ** 12 + (A + B) ** -1.5) ** (1 / 12);
  },
  checks: [
    {
      from: { cite: "fluids", where: "friction.Churchill_1977, docstring example" },
      basis: "general reference library",
      rows: [
        {
          given: { Re: 1e5, eD: 1e-4 },
          printed: "0.018462624566280075",
          within: 1e-13,
          because: "double precision",
        },
      ],
    },
    {
      from: { cite: "fluids", where: "friction.Churchill_1977 in the transition" },
      basis: "general reference library",
      rows: [
        {
          given: { Re: 3000, eD: 0 },
          printed: "0.042974656318",
          within: 1e-10,
          because: "eleven digits",
        },
      ],
    },
    {
      from: { cite: "derivation", where: "64/Re at Re 500" },
      basis: "exact limit or identity",
      rows: [{ given: { Re: 500, eD: 1e-3 }, printed: "0.1280000" }],
    },
  ],
});
