/** Entry of the `stillwall` command: one verb, the rest is the verb's. */
import { endWithReader, writeOut } from "./write-out";

type Verb = (args: string[]) => Promise<number>;

/** Each verb is loaded when it is asked for. */
const verbs: ReadonlyMap<string, () => Promise<Verb>> = new Map([
  ["eval", async () => (await import("./eval")).evaluate],
  ["recalc", async () => recalcVerb],
]);

async function recalcVerb(args: string[]): Promise<number> {
  const [{ recalc }, { recalculateWorkbook }] = await Promise.all([import("./recalc"), import("../recalc/workbook")]);
  const line = (stream: NodeJS.WriteStream) => (text: string) => void stream.write(`${text}\n`);
  return recalc(args, { recalculate: recalculateWorkbook, print: line(process.stdout), complain: line(process.stderr) });
}

const help = `Usage: stillwall VERB ...

  eval     evaluates formulas            stillwall eval --help
  recalc   recalculates a workbook       stillwall recalc --help
`;

/** Runs the command. @returns the exit status: the verb's, or 2 for an unknown verb */
export async function run(args: readonly string[]): Promise<number> {
  const [name, ...rest] = args;
  const verb = verbs.get(name ?? "");
  if (verb) return (await verb())(rest);
  if (name === "--help" || name === "-h") {
    await writeOut(help);
    return 0;
  }
  process.stderr.write(name === undefined ? help : `stillwall: unknown verb "${name}"\n\n${help}`);
  return 2;
}

endWithReader();
run(process.argv.slice(2)).then(
  (status) => {
    process.exitCode = status;
  },
  (reason: unknown) => {
    process.stderr.write(`stillwall: ${reason instanceof Error ? (reason.stack ?? reason.message) : String(reason)}\n`);
    process.exitCode = 2;
  },
);
