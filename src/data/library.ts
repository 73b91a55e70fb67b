/**
 * The library: species, sets, sources, named mixtures and atomic weights, as printed, with where they come from.
 * One door; behind it one file for each idea.
 */
export { atomicWeights, type Element, elementOf, elements } from "./elements";
export { ACCURACY } from "./accuracy";
export { exceptionFor } from "./first-choice";
export { allMixtures, namedMixture, type NamedMixture } from "./mixtures";
export { findSpecies } from "./names";
export type { SetRecord } from "./records";
export { searchSpecies } from "./search";
export { allSets, recordOf, recordsOf, type SetEntry, setOfId } from "./sets";
export { allSources, type Grade, grades, type Source, sourceOf } from "./sources";
export { allSpecies, type SpeciesEntry } from "./species";
