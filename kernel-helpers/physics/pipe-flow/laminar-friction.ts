import { method } from "../../method/index.js";
import { frictionFactor, frictionFamily, frictionInputs } from "./friction-inputs.js";

/**
 * Darcy friction factor of laminar flow in a round pipe.
 *
 * f = 64/Re (Darcy; Fanning's is 16/Re), Re = ρvD/µ below about 2100. Exact for developed flow; the
 * roughness takes no part. Hagen (1839), Poiseuille (1840).
 */
export const laminarFriction = method({
  id: "laminar-friction",
  revision: 1,
  family: frictionFamily,
  title: "Darcy friction factor, laminar",
  tex: String.raw`\frac{64}{\mathrm{Re}}`,
  source: { cite: "derivation", where: "parabolic profile in a round pipe" },
  inputs: { ...frictionInputs, Re: { ...frictionInputs.Re, range: [0, 2100] } },
  output: frictionFactor,
  compute: ({ Re }) => 64 / Re,
  checks: [
    {
      from: { cite: "fluids", where: "friction.friction_factor, laminar" },
      basis: "general reference library",
      rows: [{ given: { Re: 1000, eD: 1e-4 }, printed: "0.064" }],
    },
  ],
});
