import { stillwellVersion } from "./version.js";

/** What computed a record. */
export const softwareVersions = (): { readonly [name: string]: string } => ({
  stillwell: stillwellVersion,
  node: process.versions.node,
  v8: process.versions.v8,
  platform: `${process.platform} ${process.arch}`,
});
