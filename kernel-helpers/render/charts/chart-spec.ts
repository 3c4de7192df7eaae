export type ChartValue =
  string | number | boolean | null | readonly ChartValue[] | { readonly [key: string]: ChartValue };

/** A vega-lite specification, as plain data. */
export interface ChartSpec {
  /** What the chart shows, in words, for readers who cannot see it. */
  readonly description: string;
  readonly [key: string]: ChartValue;
}
