import { entity, list, oneOf, profile, text } from "../../method/index.js";

/** A pack in one bore section. */
export const PackPart = entity({
  id: "pack-part",
  revision: 1,
  title: "Part of a pack in one bore section",
  fields: {
    name: { kind: text, note: "section" },
    top: { kind: "measuredDepth", note: "top" },
    base: { kind: "measuredDepth", note: "base" },
    voidage: { kind: "dimensionless", note: "voidage" },
    velocity: { kind: "velocity", note: "superficial velocity" },
    gradient: { kind: "pressureGradient", note: "mean flow gradient" },
    weight: { kind: "pressureGradient", note: "mean weight gradient" },
  },
  build: (f) => f,
});

export const packResults = {
  top: { kind: "measuredDepth", note: "top of the pack" },
  height: { kind: "length", symbol: "H", note: "height of the pack along the hole" },
  rate: {
    kind: "flowRate",
    symbol: "q",
    note: "flow that remains: through the resting pack, or past the part of it that is lifted",
  },
  share: { kind: "dimensionless", symbol: "q/q_0", note: "flow that remains over the clear flow" },
  restingRate: { kind: "flowRate", note: "flow if the pack rests" },
  liftedRate: {
    kind: "flowRate",
    note: "flow if all the grains are carried by it, each in the bore where it lay",
  },
  drop: {
    kind: "pressureDifference",
    symbol: String.raw`\Delta p`,
    note: "pressure that the pack takes from the flow if it rests",
  },
  weight: {
    kind: "pressureDifference",
    note: "the most the pack can take: its buoyant weight along the hole over the bore",
  },
  state: { kind: oneOf("rests", "lifts"), note: "state of the pack at the flow if it rests" },
  margin: {
    kind: "dimensionless",
    note: "least share of the weight above that the flow leaves on the grains; negative where it lifts",
  },
  weakest: { kind: "measuredDepth", note: "depth of the least margin" },
  liftRate: { kind: "flowRate", note: "flow at which the pack begins to lift" },
  mass: { kind: "mass", symbol: "m_s", note: "mass of solids" },
  count: { kind: "dimensionless", symbol: "N", note: "number of grains" },
  parts: { kind: list(PackPart), note: "The pack by bore section" },
  gradient: { kind: profile("pressureGradient"), note: "flow gradient along the pack" },
  weightGradient: {
    kind: profile("pressureGradient"),
    note: "gradient that the buoyant weight can hold",
  },
} as const;
