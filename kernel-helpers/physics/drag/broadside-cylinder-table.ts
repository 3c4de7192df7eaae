import { method } from "../../method/index.js";
import { m } from "../../units/index.js";
import { cylinderInputs } from "./cylinder-inputs.js";
import { linearTable } from "./linear-table.js";

const LONGEST = 40;
const AT_LONGEST = 0.98;
const INFINITE = 1.2;
const at = linearTable([
  [1, 0.64],
  [2, 0.68],
  [5, 0.74],
  [10, 0.82],
  [20, 0.91],
  [LONGEST, AT_LONGEST],
]);

/**
 * Drag coefficient of a finite cylinder broadside to the flow, both ends free.
 *
 * Table against L/d: 1 0.64, 2 0.68, 5 0.74, 10 0.82, 20 0.91, 40 0.98, infinite 1.20; linear in L/d
 * up to 40, linear in d/L from there, held below 1. L length, d diameter [m]; Cd on L·d. For
 * 1e4 < Re = ρvd/µ < 2e5 (laminar separation), in an unbounded smooth stream; a body that falls
 * freely sways and may drag a quarter more. White, Fluid Mechanics, table of drag of
 * three-dimensional bodies; its row for L/d 3 is quoted as 0.72 and as 0.74 and is left out.
 */
export const broadsideCylinder = method({
  id: "broadside-cylinder-table",
  revision: 1,
  family: "drag coefficient of a cylinder broadside",
  title: "Drag coefficient of a finite cylinder broadside",
  tex: String.raw`C_d(L/d)\ \text{table}`,
  source: { cite: "white2011", where: "table 7.3, short cylinder in laminar flow" },
  inputs: cylinderInputs,
  within: {
    "L/d": {
      of: ({ L, d }) => L / d,
      range: [1, Infinity],
      stated: true,
      note: "length to diameter",
    },
  },
  output: { kind: "dimensionless", symbol: "C_d", note: "drag coefficient on L·d" },
  compute: ({ L, d }) =>
    L / d <= LONGEST ? at(L / d) : INFINITE + ((AT_LONGEST - INFINITE) * LONGEST * d) / L,
  checks: [
    {
      from: { cite: "matthews2002", where: "p. 95, cylinder across the flow" },
      basis: "published table",
      rows: [
        {
          given: { L: m(1), d: m(1) },
          printed: "0.63",
          within: 0.02,
          because: "two reprints of one set of measurements",
        },
        { given: { L: m(2), d: m(1) }, printed: "0.68" },
        { given: { L: m(5), d: m(1) }, printed: "0.74" },
        { given: { L: m(10), d: m(1) }, printed: "0.82" },
        { given: { L: m(40), d: m(1) }, printed: "0.98" },
        { given: { L: m(1e6), d: m(1) }, printed: "1.20" },
      ],
    },
    {
      from: { cite: "white2011", where: "row L/d 20" },
      basis: "from memory",
      rows: [{ given: { L: m(20), d: m(1) }, printed: "0.91" }],
    },
    {
      from: { cite: "white2011", where: "halfway between rows, and L/d 80 halfway in d/L" },
      basis: "from memory",
      rows: [
        { given: { L: m(3.5), d: m(1) }, printed: "0.710" },
        { given: { L: m(7.5), d: m(1) }, printed: "0.7800" },
        { given: { L: m(15), d: m(1) }, printed: "0.8650" },
        { given: { L: m(30), d: m(1) }, printed: "0.9450" },
        { given: { L: m(80), d: m(1) }, printed: "1.0900" },
      ],
    },
  ],
});
