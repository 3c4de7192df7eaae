export * from "./leaning-rod-cross-flow.js";
export * from "./leaning-rod-projected-area.js";
export { rodLaminarStall } from "./rod-laminar-stall.js";
export { rodLaminarVelocity } from "./rod-laminar-velocity.js";
export * from "./rod-lean-limit.js";
export * from "./rod-turbulent-stall.js";
export * from "./rod-turbulent-velocity.js";
