/** The plain words of the pane for things that data and types hold as short codes. */
import type { Form, Phase } from "../core/species/types";

export function phaseWord(phase: Phase): string {
  return { g: "gas", l: "liquid", cr: "solid" }[phase];
}

export function formWord(form: Form): string {
  return {
    "nine-term": "nine-term polynomial",
    "seven-term": "seven-term polynomial",
    shomate: "Shomate polynomial",
    power: "power polynomial",
    molecular: "molecular constants",
  }[form];
}

/** `CV.AT` family and the like as a heading of the function list. */
export function familyWord(family: string): string {
  const words: Record<string, string> = {
    properties: "Properties",
    heat: "Heat at constant volume",
    sources: "Sources",
    vessel: "Closed vessel",
    mixture: "Mixtures",
    water: "Water",
  };
  return words[family] ?? family.charAt(0).toUpperCase() + family.slice(1);
}

/** `heat_capacity` as a label: `Heat capacity`; `T1`, `to` stay readable. */
export function labelWord(name: string): string {
  const words = name.replaceAll("_", " ");
  return words.charAt(0).toUpperCase() + words.slice(1);
}
