/** The pane's host inside Excel. The only pane file that names Office. Needs ExcelApi 1.7 (active cell). */
import { themeOf } from "./colour";
import type { Host, Selection } from "./host";
import { systemTheme } from "./theme";

type Theme = "light" | "dark";

/** The host once Office says that it is Excel; null in a plain browser or where office.js could not be loaded. Never rejects. */
export async function excelHost(): Promise<Host | null> {
  if (typeof Office === "undefined" || typeof Office.onReady !== "function") return null;
  try {
    const info = await Office.onReady();
    return info.host === Office.HostType.Excel ? host() : null;
  } catch {
    return null;
  }
}

function host(): Host {
  const system = systemTheme();
  return {
    kind: "excel",
    insertFormula,
    selection,
    onSelectionChange: (listener) => void listenToSelection(listener),
    theme: () => wornTheme() ?? system.theme(),
    onThemeChange(listener) {
      system.onThemeChange(() => listener(wornTheme() ?? system.theme()));
      listenToTheme(() => listener(wornTheme() ?? system.theme()));
    },
  };
}

async function insertFormula(formula: string): Promise<void> {
  try {
    await Excel.run(async (context) => {
      context.workbook.getActiveCell().formulas = [[formula]];
      await context.sync();
    });
  } catch (thrown) {
    throw new Error(sentenceOf(thrown));
  }
}

async function selection(): Promise<Selection | null> {
  try {
    return await Excel.run(async (context) => {
      const cell = context.workbook.getActiveCell();
      cell.load({ address: true, formulas: true });
      await context.sync();
      const content: unknown = cell.formulas[0]?.[0];
      return { address: cell.address, formula: content === "" || content === null || content === undefined ? null : String(content) };
    });
  } catch {
    return null; // no cell is selected: a chart or a shape is
  }
}

async function listenToSelection(listener: (selection: Selection) => void): Promise<void> {
  let latest = 0;
  const tell = async () => {
    const mine = (latest += 1);
    const now = await selection();
    if (now && mine === latest) listener(now);
  };
  try {
    await Excel.run(async (context) => {
      context.workbook.onSelectionChanged.add(tell);
      await context.sync();
    });
  } catch {
    // without the event the button simply does not name the cell; inserting still works
  }
}

/** What a person can do about the refusals of Excel that happen in practice. */
function sentenceOf(thrown: unknown): string {
  const { code, message } = (thrown ?? {}) as { code?: string; message?: string };
  if (code === "InvalidOperationInCellEditMode") return "A cell is being edited: finish with Enter or Escape, then insert again.";
  if (code === "AccessDenied") return "The sheet is protected: unprotect it or select another cell.";
  if (code === "InvalidSelection" || code === "ItemNotFound") return "No cell is selected: select one, then insert again.";
  return `Excel did not take the formula: ${message ?? String(thrown)}`;
}

/** Theme by Excel's own background, which the pane wears if its texts stay readable on it; undefined where Excel does not tell. */
function wornTheme(): Theme | undefined {
  const office = Office.context?.officeTheme as Office.OfficeTheme | undefined;
  const background = office?.bodyBackgroundColor;
  const found = background ? themeOf(background) : undefined;
  const { style } = document.documentElement;
  if (background && found?.wearable) style.setProperty("--still-surround", background);
  else style.removeProperty("--still-surround");
  return found?.theme;
}

function listenToTheme(listener: () => void): void {
  try {
    Office.context.document.addHandlerAsync(Office.EventType.OfficeThemeChanged, listener);
  } catch {
    // hosts without the event keep the theme they started with
  }
}
