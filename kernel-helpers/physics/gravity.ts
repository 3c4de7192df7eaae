/** Standard acceleration of free fall [m/s²], ISO 80000-3; the same everywhere, an input nowhere. */
export const gravity = 9.80665;

/** Given as `dimensional` by a method whose equation holds `gravity` as a number. */
export const holdsGravity = "standard gravity stands in the equation as a number";
