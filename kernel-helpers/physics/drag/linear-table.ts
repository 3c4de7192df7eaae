type Row = readonly [x: number, y: number];

/** Linear between the rows of a short printed table (x rising), held at the ends. */
export function linearTable(rows: readonly [Row, ...Row[]]): (x: number) => number {
  return (x) => {
    let [x0, y0] = rows[0];
    if (x <= x0) return y0;
    for (const [x1, y1] of rows) {
      if (x <= x1) return y0 + ((y1 - y0) * (x - x0)) / (x1 - x0);
      x0 = x1;
      y0 = y1;
    }
    return y0;
  };
}
