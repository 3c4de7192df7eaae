import { grainReynolds } from "./bed-inputs.js";

/** Coefficients of the equation for one class of grains. */
export interface WallCoefficients {
  readonly K1: number;
  readonly k1: number;
  readonly k2: number;
}
interface Bed {
  readonly u: number;
  readonly d: number;
  readonly eps: number;
  readonly rho: number;
  readonly mu: number;
  readonly D: number;
}

export const eisfeldTex = (K1: number, k1: number, k2: number): string =>
  String.raw`${K1}\,A_w^2\frac{(1-\varepsilon)^2}{\varepsilon^3}\frac{\mu u}{d^2}+\frac{A_w}{B_w}\frac{1-\varepsilon}{\varepsilon^3}\frac{\rho u\left|u\right|}{d},\quad A_w=1+\frac{2}{3(D/d)(1-\varepsilon)},\quad B_w=\left[${k1}\left(\frac{d}{D}\right)^2+${k2}\right]^2`;

/** The wall adds surface, which counts in creeping flow, and an open ring, which counts in fast flow. */
export function eisfeldGradient({ u, d, eps, rho, mu, D }: Bed, c: WallCoefficients): number {
  const A = 1 + (2 * d) / (3 * D * (1 - eps));
  const B = (c.k1 * (d / D) ** 2 + c.k2) ** 2;
  return (
    (c.K1 * A ** 2 * (1 - eps) ** 2 * mu * u) / (eps ** 3 * d ** 2) +
    ((A / B) * (1 - eps) * rho * u * Math.abs(u)) / (eps ** 3 * d)
  );
}

export const eisfeldRanges = {
  Re: {
    of: grainReynolds,
    range: [0.01, 17_635],
    stated: true,
    note: "grain Reynolds number ρud/µ (not divided by 1−ε)",
  },
  "D/d": {
    of: ({ d, D }: { readonly d: number; readonly D: number }) => D / d,
    range: [1.624, 250],
    stated: true,
    note: "bore to grain diameter",
  },
} as const;
