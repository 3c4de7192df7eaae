export * from "./annulus-mean-velocity.js";
export * from "./churchill-1977.js";
export * from "./colebrook-white-1939.js";
export * from "./darcy-weisbach.js";
export * from "./haaland-1983.js";
export * from "./laminar-friction.js";
export * from "./mean-velocity.js";
export * from "./pipe-reynolds.js";
