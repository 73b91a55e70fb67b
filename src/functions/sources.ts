/** Family sources: where a number comes from, how good it is, where it stops being valid, and what is wrong with a block of coefficients. */
import { recordsOf, type SetRecord, sourceOf } from "../data/library";
import { checkBlock } from "./block-check";
import { spreadRows } from "./broadcast";
import { Block, cells, plain } from "./cell";
import { readCoefficientBlock } from "./coefficient-block";
import { refuse } from "../core/refusal";
import { blockChoice, FIRST_CHOICE, setOf } from "./set";
import { noteOf } from "./source-note";
import { Substance, SubstancePart, substanceArgument, substanceOf } from "./substance";

/**
 * Where the numbers of a substance come from: citation, grade and note, side by side; a mixture names each of its species.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param set Set id such as "nasa-2002", or a coefficient block; the library's first choice if left out [-] value
 * @returns Three cells side by side: citation, grade, note [-]
 * @source nasa-2002
 * @example INDEX(STILL.SOURCE("N2"),1,2) -> "A"
 * @example LEFT(INDEX(STILL.SOURCE("N2","gri-1999"),1,1),12) -> "GRI-Mech 3.0"
 * @customfunction SOURCE
 */
export function source(substance: any[][], set?: any[][]): any[][] {
  return eachSubstance(substance, set, 3, ({ parts, compositionSource }) => [
    together(parts, citation),
    together(parts, gradeOf),
    [...(compositionSource ? [`composition: ${sourceOf(compositionSource).citation}`] : []), together(parts, note)].join("; "),
  ]);
}

/**
 * Temperature range in which a substance may be evaluated, lower and upper limit side by side; a mixture has the range common to its species.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions [-] value
 * @param set Set id such as "nasa-2002", or a coefficient block; the library's first choice if left out [-] value
 * @returns Two cells side by side: lower and upper limit [K]
 * @source nasa-2002
 * @example STILL.SOURCE.RANGE("CO2","gri-1999") -> {200,3500}
 * @example STILL.SOURCE.RANGE("0.5 N2 + 0.5 CH4") -> {200,6000}
 * @customfunction SOURCE.RANGE
 */
export function sourceRange(substance: any[][], set?: any[][]): any[][] {
  return eachSubstance(substance, set, 2, ({ capacity }) => [capacity.from, capacity.to]);
}

/**
 * Table of the coefficient sets of one species, the library's first choice on top.
 * @param substance One species such as "CH4" [-] value
 * @returns Heading row, then one row for each set: set, form, from, to, grade, printed reference, citation [-]
 * @source nasa-2002
 * @example INDEX(STILL.SOURCE.SETS("CH4"),2,1) -> "nasa-2002"
 * @example INDEX(STILL.SOURCE.SETS("Ar"),1,1) -> "set"
 * @customfunction SOURCE.SETS
 */
export function sourceSets(substance: any[][]): any[][] {
  return cells(() => {
    const argument = substanceArgument(substance);
    if (argument.composition || substance.length > 1 || substance[0]!.length > 1) refuse("SOURCE.SETS takes one species, not a range");
    const { parts } = substanceOf(argument, plain(substance[0]![0]), FIRST_CHOICE);
    if (parts.length > 1) refuse("SOURCE.SETS takes one species, not a mixture");
    const rows = recordsOf(parts[0]!.species).map((record) => setRow(record, rangeOf(parts[0]!.species, record.set)));
    return [["set", "form", "from [K]", "to [K]", "grade", "printed reference", "citation"], ...rows];
  });
}

function rangeOf(species: string, set: string): readonly [number, number] {
  const { capacity } = substanceOf({ texts: [[species]] }, species, setOf(set));
  return [capacity.from, capacity.to];
}

function setRow(record: SetRecord, [from, to]: readonly [number, number]): Block[number] {
  return [record.set, record.form, from, to, record.grade, record.reference, sourceOf(record.source).citation];
}

/**
 * Verdict on a coefficient block typed in cells: whether its numbers are continuous, plausible and in step with the library.
 * @param block Coefficient block: quantity, phase, formula, form, from, to, unit, R, formation enthalpy, entropy, constants [-] block
 * @returns Heading row, then one row for each check: species, check, verdict, detail [-]
 * @source thermodynamics
 * @example INDEX(STILL.SOURCE.CHECK({"Cp","g","N2","power 0",300,400,"J/(mol K)","","","",29.1}),1,3) -> "verdict"
 * @example STILL.SOURCE.CHECK("N2") -> #VALUE! Row 1 of the coefficient block: the quantity "N2" is not one of Cp, Cv
 * @customfunction SOURCE.CHECK
 */
export function sourceCheck(block: any[][]): any[][] {
  return cells(() => {
    const fits = readCoefficientBlock(block);
    return [
      ["species", "check", "verdict", "detail"],
      ...fits.flatMap((fit) => checkBlock(fit).map(({ check, verdict, detail }) => [fit.species, check, verdict, detail])),
    ];
  });
}

function eachSubstance(substance: Block, set: Block | undefined, width: number, each: (found: Substance) => Block[number]): Block {
  return cells(() => {
    const argument = substanceArgument(substance);
    const choice = blockChoice(set);
    const named = [
      ["substance", argument.texts],
      ["set", choice ? undefined : set],
    ] as const;
    return spreadRows(named, width, ([text, setCell]) => each(substanceOf(argument, text, choice ?? setOf(setCell))));
  });
}

/** One text for a species alone; for a mixture each different text once, with the species it belongs to before it. */
function together(parts: readonly SubstancePart[], of: (part: SubstancePart) => string): string {
  if (parts.length === 1) return of(parts[0]!);
  const species = new Map<string, string[]>();
  for (const part of parts) species.set(of(part), [...(species.get(of(part)) ?? []), part.species]);
  return [...species].map(([text, names]) => `${names.join(", ")}: ${text}`).join("; ");
}

/** The record of the library behind a part; undefined if its coefficients stand in cells. */
function recordOfPart({ fit }: SubstancePart): SetRecord | undefined {
  return "source" in fit ? (fit as SetRecord) : undefined;
}

function citation(part: SubstancePart): string {
  const record = recordOfPart(part);
  return record ? sourceOf(record.source).citation : "coefficients in cells of this workbook, not of the library";
}

function gradeOf(part: SubstancePart): string {
  return recordOfPart(part)?.grade ?? "not graded";
}

function note(part: SubstancePart): string {
  const record = recordOfPart(part);
  return record ? noteOf(record) : `${part.species}, form ${part.fit.form}: SOURCE.CHECK gives a verdict on the block`;
}
