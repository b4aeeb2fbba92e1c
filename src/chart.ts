// The door to pictures: results as SVG, Vega-Lite, HTML, Markdown and text; needs no package.
export type { GivenUnit } from "./branches/diagram.ts";
export { type CouplingGraph, couplingGraph } from "./chart/couplingGraph.ts";
export { type DiagramChartOptions, diagramChart } from "./chart/diagramChart.ts";
export { feedbackBars } from "./chart/feedbackBars.ts";
export { type LedgerDrawing, ledgerDrawing } from "./chart/ledgerDrawing.ts";
export {
  type LimitLine,
  type LimitsChartOptions,
  limitsChart,
  type PlacedPlanet,
} from "./chart/limitsChart.ts";
export type { Colour, Theme } from "./chart/palette.ts";
export { type PlanetsChartOptions, planetsChart } from "./chart/planetsChart.ts";
export type { Axis, Item, Layer, Look, Plot, Shape } from "./chart/plot.ts";
export type { Picture } from "./chart/report.ts";
export {
  type Shown,
  type ShowOptions,
  show,
  toHTML,
  toMarkdown,
  toSVG,
  toText,
  toVegaLite,
} from "./chart/show.ts";
export { type BudgetChartOptions, budgetChart, statesChart } from "./chart/statesChart.ts";
export type { Json } from "./chart/vegaPlot.ts";
