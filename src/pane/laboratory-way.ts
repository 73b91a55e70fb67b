/** The way of the laboratory: functions that start from masses, readings and ranges, each with its own draft and its sources. */
import { sourceOf } from "../data/library";
import type { HandbookEntry } from "../handbook";
import { element } from "./element";
import { InsertForm } from "./insert";
import { draftKey, functionsForLaboratory, laboratoryArguments, laboratoryFields } from "./laboratory";
import type { Outlet } from "./outlet";

/** The form, with the first function of the list chosen. */
export function laboratoryForm(handbook: readonly HandbookEntry[], outlet: Outlet): HTMLElement {
  const functions = functionsForLaboratory(handbook);
  const drafts = new Map(functions.map(({ id }) => [draftKey(id), new Map<string, string>()]));
  const form = new InsertForm(
    {
      functions,
      heading: element("h2", { class: "still-hidden" }, "Vessels and runs"),
      fieldsOf: laboratoryFields,
      argumentsOf: laboratoryArguments,
      draftOf: ({ id }) => drafts.get(draftKey(id)) ?? new Map<string, string>(),
      controlOf: () => undefined,
      factsOf,
    },
    outlet,
  );
  form.choose(functions[0]?.id ?? "");
  return form.section;
}

/** What the function gives, and the publications its figures come from. */
function factsOf({ result, sources }: HandbookEntry): HTMLElement[] {
  const given = result.unit === "-" ? result.description : `${result.description}, ${result.unit}`;
  const citations = sources.map((key) => element("li", {}, sourceOf(key).citation));
  return [
    element(
      "dl",
      { class: "still-facts" },
      element("dt", {}, "Result"),
      element("dd", {}, given),
      element("dt", {}, "Sources"),
      element("dd", {}, element("ul", { class: "still-citations" }, ...citations)),
    ),
  ];
}
