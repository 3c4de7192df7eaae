export * from "./benyahia-oneill-2005.js";
export * from "./dixon-cylinders-1988.js";
export * from "./dixon-spheres-1988.js";
export * from "./zou-yu-dense-1995.js";
export * from "./zou-yu-loose-1995.js";
