import { brownLawler } from "../drag/brown-lawler-2003.js";
import { cliftGauvin } from "../drag/clift-gauvin-1970.js";
import { cliftGraceWeber } from "../drag/clift-grace-weber-1978.js";
import { haiderLevenspielSphere } from "../drag/haider-levenspiel-sphere-1989.js";
import { morrison } from "../drag/morrison-2013.js";
import { schillerNaumann } from "../drag/schiller-naumann-1933.js";
import { stokes } from "../drag/stokes-1851.js";

/** The sphere drag laws that a fall can be computed with, by id. */
export const sphereLaws = {
  "brown-lawler-2003": brownLawler,
  "clift-grace-weber-1978": cliftGraceWeber,
  "clift-gauvin-1970": cliftGauvin,
  "haider-levenspiel-sphere-1989": haiderLevenspielSphere,
  "morrison-2013": morrison,
  "schiller-naumann-1933": schillerNaumann,
  "stokes-1851": stokes,
} as const;

export type SphereLaw = keyof typeof sphereLaws;

/**
 * The Reynolds number at which the drag force, Cd·Re², first stops rising: the onset of the drag
 * crisis. Between it and the end of the crisis one weight is carried at three velocities.
 */
export const crisisOnset: { readonly [law in SphereLaw]: number } = {
  "brown-lawler-2003": Infinity,
  "clift-grace-weber-1978": 3.38e5 * (1 + 1e-12),
  "clift-gauvin-1970": Infinity,
  "haider-levenspiel-sphere-1989": Infinity,
  "morrison-2013": 239_171.5,
  "schiller-naumann-1933": Infinity,
  "stokes-1851": Infinity,
};
