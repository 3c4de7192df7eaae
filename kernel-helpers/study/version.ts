/** Kept equal to package.json by a test: reading a file here would need the disk. */
export const stillwellVersion = "0.1.0";
