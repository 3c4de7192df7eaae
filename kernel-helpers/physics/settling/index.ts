export * from "./free-rod-hoelzer-sommerfeld.js";
export * from "./free-rod-newton.js";
export * from "./hindered-velocity.js";
export * from "./khan-richardson-1989.js";
export * from "./richardson-zaki-1954.js";
export * from "./rowe-1987.js";
export * from "./terminal-velocity-sphere.js";
export * from "./sphere-laws.js";
