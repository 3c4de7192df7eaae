import { kgpm3 } from "../units/index.js";
import { SolidMaterial } from "./solid-material.js";

const material = (name: string, density: number, source: string) =>
  SolidMaterial({ name, density: kgpm3(density), source });

// Round handbook densities near room temperature. A delivery can differ by a per cent or two (porous
// castings, alloyed shot by more): weigh a sample where the margin is thin.
const HANDBOOK = "handbook value near 20 °C, from memory";
const ASTM_B777 = "ASTM B777, nominal density of the class, from memory";

export const carbonSteel = material("carbon steel", 7850, HANDBOOK);
export const lead = material("lead, pure", 11340, HANDBOOK);
/** Hardened shot is alloyed with antimony and lighter than pure lead. */
export const antimonialLead = material("lead with 4 % antimony", 11000, HANDBOOK);
export const tungstenAlloyClass1 = material("tungsten heavy alloy, class 1", 17000, ASTM_B777);
export const tungstenAlloyClass4 = material("tungsten heavy alloy, class 4", 18500, ASTM_B777);
export const tungstenCarbide = material("tungsten carbide, 6 % cobalt", 14950, HANDBOOK);
export const copper = material("copper", 8960, HANDBOOK);
export const zinc = material("zinc", 7140, HANDBOOK);
export const aluminium = material("aluminium", 2700, HANDBOOK);
export const barite = material("barite, weighting grade", 4200, "ISO 13500, least density");
export const quartzSand = material("quartz sand", 2650, HANDBOOK);

export const solidMaterials = [
  carbonSteel,
  lead,
  antimonialLead,
  tungstenAlloyClass1,
  tungstenAlloyClass4,
  tungstenCarbide,
  copper,
  zinc,
  aluminium,
  barite,
  quartzSand,
] as const;
