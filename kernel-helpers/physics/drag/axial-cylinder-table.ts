import { method } from "../../method/index.js";
import { m } from "../../units/index.js";
import { cylinderInputs } from "./cylinder-inputs.js";
import { linearTable } from "./linear-table.js";

const at = linearTable([
  [0.5, 1.15],
  [1, 0.9],
  [2, 0.85],
  [4, 0.87],
  [8, 0.99],
]);

/**
 * Drag coefficient of a flat-faced cylinder with its axis along the flow.
 *
 * Table against L/d: 0.5 1.15, 1 0.90, 2 0.85, 4 0.87, 8 0.99; linear in L/d between, held at the ends.
 * L length, d diameter [m]; Cd on πd²/4. For Re = ρvd/µ above about 1e4, where the sharp edge fixes
 * the separation, in an unbounded stream of smooth flow; skin friction of longer cylinders comes on
 * top. White, Fluid Mechanics, table of drag of bodies of revolution.
 */
export const axialCylinder = method({
  id: "axial-cylinder-table",
  revision: 1,
  family: "drag coefficient of a cylinder end-on",
  title: "Drag coefficient of a flat-faced cylinder end-on",
  tex: String.raw`C_d(L/d)\ \text{table}`,
  source: { cite: "white2011", where: "table 7.3, flat-faced cylinder" },
  inputs: cylinderInputs,
  within: {
    "L/d": {
      of: ({ L, d }) => L / d,
      range: [0.5, 8],
      stated: true,
      note: "length to diameter",
    },
  },
  output: { kind: "dimensionless", symbol: "C_d", note: "drag coefficient on πd²/4" },
  compute: ({ L, d }) => at(L / d),
  checks: [
    {
      from: { cite: "matthews2002", where: "p. 95, cylinder parallel to the flow" },
      basis: "published table",
      rows: [
        {
          given: { L: m(1), d: m(1) },
          printed: "0.91",
          within: 0.02,
          because: "two reprints of one set of measurements",
        },
        { given: { L: m(2), d: m(1) }, printed: "0.85" },
        { given: { L: m(4), d: m(1) }, printed: "0.87" },
        {
          given: { L: m(7), d: m(1) },
          printed: "0.99",
          within: 0.04,
          because: "the reprints give 0.99 at 7 and at 8",
        },
      ],
    },
    {
      from: { cite: "hoerner1965", where: "thick disc L/d 0.5" },
      basis: "from memory",
      rows: [
        {
          given: { L: m(0.5), d: m(1) },
          printed: "1.15",
        },
      ],
    },
    {
      from: { cite: "white2011", where: "rows, and halfway between them" },
      basis: "from memory",
      rows: [
        { given: { L: m(1), d: m(1) }, printed: "0.900" },
        { given: { L: m(8), d: m(1) }, printed: "0.990" },
        { given: { L: m(0.75), d: m(1) }, printed: "1.025" },
        { given: { L: m(0.502), d: m(1) }, printed: "1.149" },
        { given: { L: m(3), d: m(1) }, printed: "0.860" },
        { given: { L: m(6), d: m(1) }, printed: "0.930" },
      ],
    },
  ],
});
