import { descent } from "./descent.js";
import { packToCut } from "./pack-to-cut.js";
import { restingPack } from "./resting-pack.js";

export const models = [descent, restingPack, packToCut] as const;
