/** Saving the open workbook: patched into the file it came from wherever possible, built anew where it must be, and asked before anything is lost. */
import { patch } from "../../book";
import type { FunctionNames } from "../../book/formula";
import { isArrayFormula } from "../grid/array-formula";
import { contentsOf } from "../grid/contents";
import { fileNames } from "../grid/sheet-names";
import type { OpenDocument } from "../document";
import { ask, sentences } from "../dialogs";
import { changesOf, type ChangeRules } from "./changes";
import { differs } from "./differ";
import { lossesOf } from "./losses";
import { rebuilt, type Rebuilt } from "./rebuild";

type Way = "patch" | "rebuild" | "cancel";

/** The bytes of the file to save, or undefined if the user would rather not. */
export async function bytesToSave(document: OpenDocument, functions: FunctionNames): Promise<Rebuilt | undefined> {
  const naming = fileNames(document.workbook);
  const rules: ChangeRules = { functions, naming, differs, isArray: (formula) => isArrayFormula(formula, functions) };
  const { changes, remarks, formats } = changesOf(contentsOf(document.model, naming), document.handed, document.workbook, rules);
  const way = await wayOf(document, formats);
  if (way === "cancel") return undefined;
  if (way === "rebuild") return rebuilt(document.model, document.workbook, { ...rules, naming: (name) => name });
  return { bytes: patch(document.package, changes), remarks };
}

async function wayOf(document: OpenDocument, formats: number): Promise<Way> {
  const { journal, fromFile } = document;
  const looks = journal.looks() || formats > 0;
  if (!looks && !journal.structure()) return "patch";
  const losses = lossesOf(document.package.names);
  if (!fromFile || (losses.length === 0 && document.workbook.notes.length === 0)) return "rebuild";
  return journal.structure() ? askStructure(document, losses) : askLooks(document, losses);
}

function askStructure(document: OpenDocument, losses: readonly string[]): Promise<Way> {
  return ask<Way>(
    "Build the file anew?",
    [
      "Rows, columns, sheets or names were inserted, removed or renamed. Such a change cannot be written into the file you opened, so a new file is built: contents, formulas and formats as they stand here. It will not hold:",
      sentences([...losses, ...document.workbook.notes]),
      "The file you opened stays as it is.",
    ],
    [
      { label: "Save the new file", value: "rebuild", strong: true },
      { label: "Cancel", value: "cancel" },
    ],
  );
}

function askLooks(document: OpenDocument, losses: readonly string[]): Promise<Way> {
  return ask<Way>(
    "Formats were changed",
    [
      "Contents and formulas go into a copy of the file you opened, and everything else in it stays as it was: also its formats, so the ones changed here would not be in it. A file built anew has the formats as they stand here, but will not hold:",
      sentences([...losses, ...document.workbook.notes]),
    ],
    [
      { label: "Save contents, keep the file's formats", value: "patch", strong: true },
      { label: "Build anew with these formats", value: "rebuild" },
      { label: "Cancel", value: "cancel" },
    ],
  );
}
