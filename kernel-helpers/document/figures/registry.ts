import type { Chart } from "./chart.js";
import { descentChart } from "./descent-chart.js";
import { cutChart, packChart } from "./pack-chart.js";

export const charts = [descentChart, packChart, cutChart] as unknown as readonly Chart[];
