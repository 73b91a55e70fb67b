import type { PercentFigures } from "../core/calorimeter/standard-state/approximate";
import type { StandardStateConstants } from "../core/calorimeter/standard-state/constants";
import table from "./standard-state.json";

/** Figures of the reduction to the standard state at 25 °C, with the keys of their sources beside them in the table. */
export const standardState: StandardStateConstants = table;

/** Figures of the percent form. */
export const percentFigures: PercentFigures = table.percent;
