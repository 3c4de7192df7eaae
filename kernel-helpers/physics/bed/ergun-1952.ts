import { method, positive, properFraction } from "../../method/index.js";
import { mm, mps, kgpm3, cP } from "../../units/index.js";

/**
 * Pressure gradient of a fluid through a packed bed of grains.
 *
 * Δp/L = 150 (1−ε)²/ε³ · µu/d² + 1.75 (1−ε)/ε³ · ρu²/d, with u the superficial velocity [m/s],
 * d the surface-volume grain diameter [m] and ε the voidage. Fitted for 1 < Re_m < 2300 with
 * Re_m = ρud/(µ(1−ε)), and for bores of more than 10 grain diameters. About twice too high for
 * smooth spheres far above its range. Ergun (1952).
 */
export const ergun = method({
  id: "ergun-1952",
  revision: 1,
  family: "packed-bed pressure gradient",
  title: "Pressure gradient through a packed bed (Ergun)",
  tex: String.raw`150\,\frac{(1-\varepsilon)^2}{\varepsilon^3}\frac{\mu u}{d^2}+1.75\,\frac{1-\varepsilon}{\varepsilon^3}\frac{\rho u^2}{d}`,
  source: { cite: "ergun1952", where: "eq. 11" },
  inputs: {
    u: { kind: "velocity", symbol: "u", note: "superficial velocity" },
    d: { kind: "length", symbol: "d", note: "grain diameter (surface-volume)", possible: positive },
    eps: {
      kind: "dimensionless",
      symbol: String.raw`\varepsilon`,
      note: "voidage",
      possible: properFraction,
    },
    rho: { kind: "density", symbol: String.raw`\rho`, note: "fluid density", possible: positive },
    mu: { kind: "viscosity", symbol: String.raw`\mu`, note: "fluid viscosity", possible: positive },
  },
  within: {
    Re_m: {
      of: ({ u, d, eps, rho, mu }) => (rho * Math.abs(u) * d) / (mu * (1 - eps)),
      range: [1, 2300],
      stated: true,
      note: "grain Reynolds number ρud/(µ(1−ε))",
    },
  },
  output: {
    kind: "pressureGradient",
    symbol: String.raw`\Delta p/L`,
    note: "dynamic pressure gradient",
  },
  compute: ({ u, d, eps, rho, mu }) =>
    (150 * (1 - eps) ** 2 * mu * u) / (eps ** 3 * d ** 2) +
    (1.75 * (1 - eps) * rho * u * Math.abs(u)) / (eps ** 3 * d),
  checks: [
    {
      from: { cite: "fluids", where: "packed_bed.Ergun, docstring example" },
      basis: "general reference library",
      rows: [
        {
          given: { u: mps(1e-3), d: mm(0.8), eps: 0.4, rho: kgpm3(1000), mu: cP(1) },
          printed: "1338.8671875",
        },
      ],
    },
  ],
});
