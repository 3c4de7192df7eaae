import { entity, list, oneOf, optional, profile, text } from "../../method/index.js";

export const passageVerdicts = oneOf("passes", "undecided", "stops", "does not fit");

/** What becomes of a body in one bore section. */
export const Passage = entity({
  id: "passage",
  revision: 1,
  title: "Passage of a body through a bore section",
  fields: {
    name: { kind: text, note: "section" },
    top: { kind: "measuredDepth", note: "top" },
    base: { kind: "measuredDepth", note: "base" },
    upflow: { kind: "velocity", note: "greatest upflow" },
    net: { kind: optional("velocity"), note: "least net, favourable" },
    netLow: { kind: optional("velocity"), note: "least net, unfavourable" },
    verdict: { kind: passageVerdicts, note: "verdict" },
  },
  build: (f) => f,
});

export const descentResults = {
  upflow: { kind: profile("velocity"), symbol: "U", note: "mean upward velocity of the flow" },
  slip: {
    kind: profile("velocity"),
    symbol: "v_s",
    note: "slip, favourable: in the mean flow, a long rod upright",
  },
  slipLow: {
    kind: profile("velocity"),
    note: "slip against the mean flow, unfavourable: leaning or turned, in the flow on the axis",
  },
  net: { kind: profile("velocity"), symbol: "v", note: "net downward velocity, favourable" },
  netLow: { kind: profile("velocity"), note: "net downward velocity, unfavourable" },
  verdict: {
    kind: oneOf("passes", "undecided", "stops"),
    note: "whether it reaches the base: on both sides, on one only, or on neither",
  },
  leastNet: { kind: "velocity", note: "least net velocity, favourable" },
  leastNetLow: { kind: "velocity", note: "least net velocity, unfavourable" },
  leastAt: { kind: "measuredDepth", note: "depth of the least net velocity, unfavourable" },
  standsAt: {
    kind: optional("measuredDepth"),
    note: "depth that it does not get below, favourable",
  },
  standsAtLow: {
    kind: optional("measuredDepth"),
    note: "depth that it does not get below, unfavourable",
  },
  time: { kind: optional("time"), note: "time from release to the base, favourable" },
  timeLow: { kind: optional("time"), note: "time from release to the base, unfavourable" },
  arrival: {
    kind: optional(profile("time")),
    note: "time to reach each depth, favourable, as far as it gets",
  },
  arrivalLow: {
    kind: optional(profile("time")),
    note: "time to reach each depth, unfavourable, as far as it gets",
  },
  passages: { kind: list(Passage), note: "Section by section" },
} as const;
