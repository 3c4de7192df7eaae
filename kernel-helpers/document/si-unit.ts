/** `kg/m3` → kg/m³, `Pa s` → Pa·s. */
export const siUnit = (si: string): string =>
  si
    .replace(/([a-z])([23])/g, (_, m: string, n: string) => m + (n === "2" ? "²" : "³"))
    .replace(/ /g, "·");
