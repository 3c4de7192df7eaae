"use strict";
// Stands where danfojs-node expects tfjs: the frame code only touches it for tensor-based helpers.
const no = (name) => () => {
  throw new Error(`${name}: tensor features are not installed`);
};
class Tensor {}
module.exports = {
  Tensor,
  tensor1d: no("tensor1d"),
  tensor2d: no("tensor2d"),
  scalar: no("scalar"),
  moments: no("moments"),
  data: new Proxy({}, { get: (_, k) => no("data." + String(k)) }),
};
