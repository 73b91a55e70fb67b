/** The host where there is none: the pane in a bare browser window. A formula can only be copied. */
import { copyText } from "./clipboard";
import type { Host } from "./host";
import { systemTheme } from "./theme";

export function noHost(): Host {
  return {
    kind: "none",
    async insertFormula(formula) {
      if (!(await copyText(formula))) throw new Error(`There is no workbook here; copy the formula by hand: ${formula}`);
    },
    selection: () => Promise.resolve(null),
    onSelectionChange: () => undefined,
    ...systemTheme(),
  };
}
