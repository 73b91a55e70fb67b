/** The pane of the add-in: in Excel once Office answers, otherwise in a plain browser, where it works without a workbook. */
import { excelHost } from "./excel";
import { mountPane } from "./index";
import { noHost } from "./none";

/** How long an Office that does not answer may keep the pane empty, ms. */
const PATIENCE = 3000;

/** Fills the pane; if Excel answers late, fills it again with Excel behind it. */
export async function startPane(root: HTMLElement): Promise<void> {
  const excel = excelHost();
  const early = await Promise.race([excel, new Promise<undefined>((resolve) => setTimeout(() => resolve(undefined), PATIENCE))]);
  mountPane(root, early ?? noHost());
  if (early !== undefined) return;
  const late = await excel;
  if (late) mountPane(root, late);
}

const root = document.getElementById("pane");
if (root) void startPane(root);
