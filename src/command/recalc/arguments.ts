/** Arguments of `stillwall recalc`. */
import { refuse } from "../../core/refusal";

export interface RecalcArguments {
  readonly input: string;
  readonly output?: string;
  readonly report?: string;
  readonly inPlace: boolean;
  readonly now: boolean;
}

export const RECALC_USAGE = `stillwall recalc IN.xlsx [-o OUT.xlsx] [--report FILE.json] [--in-place] [--now]

Recalculates a workbook and writes a copy in which only the values that changed are new.

  -o, --output FILE  the copy; replaces a file of that name, never the input. Left out: IN.recalculated.xlsx
                     beside the input, which must not exist yet
  --report FILE      everything that changed, failed or could not be evaluated, as JSON
  --in-place         put the result in the place of the input
  --now              let NOW, TODAY and the random functions give new values; else they keep those of the file

Exit status: 0 every formula calculated; 1 cells failed or could not be evaluated; 2 refused, nothing written.`;

/** Reads the arguments after the word `recalc`; refuses what is unknown, missing or contradictory. */
export function readArguments(args: readonly string[]): RecalcArguments {
  const files: string[] = [];
  const found: { output?: string; report?: string; inPlace: boolean; now: boolean } = { inPlace: false, now: false };
  let literal = false;
  for (let i = 0; i < args.length; i++) {
    const [name, joined] = literal ? ["", undefined] : optionOf(args[i] as string);
    const value = () => joined ?? args[++i] ?? refuse(`The option ${name} needs a file name`);
    if (name === "--") literal = true;
    else if (name === "") files.push(args[i] as string);
    else if (name === "-o" || name === "--output") found.output = value();
    else if (name === "--report") found.report = value();
    else if (name === "--in-place") found.inPlace = true;
    else if (name === "--now") found.now = true;
    else refuse(`recalc has no option ${name}`);
  }
  const [input, second] = files;
  if (input === undefined) return refuse("recalc needs the name of a workbook");
  if (second !== undefined) refuse(`recalc takes one workbook, but "${second}" follows "${input}"`);
  if (found.inPlace && found.output !== undefined) refuse("--in-place and -o exclude each other");
  return { input, ...found };
}

/** `--report=x` -> `["--report", "x"]`; a plain word has the empty name. */
function optionOf(arg: string): [string, string | undefined] {
  if (!arg.startsWith("-") || arg === "-") return ["", undefined];
  const equals = arg.indexOf("=");
  return equals < 0 || !arg.startsWith("--") ? [arg, undefined] : [arg.slice(0, equals), arg.slice(equals + 1)];
}
