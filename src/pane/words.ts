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
    reaction: "Reactions",
    burn: "Combustion and equilibrium",
    calorimeter: "Oxygen calorimeter",
    fuel: "Fuel values",
  };
  return words[family] ?? family.charAt(0).toUpperCase() + family.slice(1);
}

/** What the short endings of laboratory arguments say; the last are units that stand beside the field. */
const ENDINGS: Readonly<Record<string, string>> = {
  d: ", dry",
  ad: ", as analysed",
  ar: ", as received",
  v: ", constant volume",
  percent: "",
  mol: "",
};
const BEGINNINGS: Readonly<Record<string, string>> = {
  H: "hydrogen",
  O: "oxygen",
  N: "nitrogen",
  gross: "gross value",
  beyond: "beyond limits",
  nitric: "nitric acid",
  sulfuric: "sulfuric acid",
};

/** `heat_capacity` as a label: `Heat capacity`; `H_d_percent`: `Hydrogen, dry`; `T1`, `to` stay readable. */
export function labelWord(name: string): string {
  const [first = "", ...rest] = name.split("_");
  const label = (BEGINNINGS[first] ?? first) + rest.map((part) => ENDINGS[part] ?? ` ${part}`).join("");
  return label.charAt(0).toUpperCase() + label.slice(1);
}

/** A word of a choice with what it stands for, where it is a letter or two. */
export function choiceWord(word: string): string {
  const meanings: Record<string, string> = { ad: "as analysed", d: "dry", ar: "as received", daf: "dry ash-free" };
  const meaning = meanings[word];
  return meaning === undefined ? word : `${word}, ${meaning}`;
}
