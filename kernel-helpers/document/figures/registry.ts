import type { Chart } from "./chart.js";
import { descentChart } from "./descent-chart.js";
import { cutChart, packChart } from "./pack-chart.js";

export const charts: readonly Chart[] = [descentChart, packChart, cutChart];
