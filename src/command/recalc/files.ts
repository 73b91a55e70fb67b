/** Reading and writing of files: whole or not at all, and never over the input by accident. */
import {
  constants,
  closeSync,
  chmodSync,
  existsSync,
  fsyncSync,
  openSync,
  readFileSync,
  realpathSync,
  renameSync,
  rmSync,
  statSync,
  writeSync,
} from "node:fs";
import { basename, dirname, extname, join, resolve } from "node:path";
import { refuse } from "../../core/refusal";

/** The largest file read: 1 GiB of packed bytes is far beyond any workbook. */
const LARGEST = 2 ** 30;

export function readInput(file: string): Uint8Array {
  const stat = guarded(`cannot read ${file}`, () => statSync(file));
  if (!stat.isFile()) refuse(`${file} is not a file`);
  if (stat.size > LARGEST) refuse(`${file} has ${stat.size} bytes, more than the ${LARGEST} bytes allowed`);
  return guarded(`cannot read ${file}`, () => new Uint8Array(readFileSync(file)));
}

/** Where the result goes: `-o`, the input itself with `--in-place`, or `IN.recalculated.xlsx` beside it. */
export function outputOf({ input, output, inPlace }: { input: string; output?: string; inPlace: boolean }): string {
  if (inPlace) {
    if (existsSync(join(dirname(realpathSync(input)), `~$${basename(input)}`)))
      refuse(`${input} is open in a spreadsheet program: close it first`);
    return input;
  }
  if (output !== undefined) {
    if (sameFile(input, output)) refuse(`${output} is the input itself: say --in-place to replace it`);
    return output;
  }
  const extension = extname(input);
  const beside = join(dirname(input), `${basename(input, extension)}.recalculated${extension}`);
  if (existsSync(beside)) refuse(`${beside} exists already: name the output with -o`);
  return beside;
}

export function sameFile(first: string, second: string): boolean {
  if (resolve(first) === resolve(second)) return true;
  if (!existsSync(first) || !existsSync(second)) return false;
  const [a, b] = [statSync(first, { bigint: true }), statSync(second, { bigint: true })];
  return a.ino !== 0n && a.ino === b.ino && a.dev === b.dev;
}

export interface Output {
  readonly file: string;
  readonly content: Uint8Array | string;
}

/**
 * Writes files whole: each into a new file beside its place, and only when all of them stand are they renamed. A link is
 * followed, and a file that is replaced keeps its permissions. If one cannot be written, none is.
 */
export function writeWhole(outputs: readonly Output[]): void {
  const staged: { fresh: string; target: string; file: string }[] = [];
  try {
    for (const { file, content } of outputs) {
      const target = existsSync(file) ? realpathSync(file) : resolve(file);
      const fresh = join(dirname(target), `.${basename(target)}.${process.pid}.part`);
      guarded(`cannot write ${file}`, () => stage(fresh, target, content, () => staged.push({ fresh, target, file })));
    }
    for (const { fresh, target, file } of staged) guarded(`cannot write ${file}`, () => renameSync(fresh, target));
  } finally {
    // What was renamed is no longer there; what was not must not stay behind.
    for (const { fresh } of staged) rmSync(fresh, { force: true });
  }
}

function stage(fresh: string, target: string, content: Uint8Array | string, opened: () => void): void {
  if (existsSync(target) && !statSync(target).isFile()) refuse(`${target} is not a file`);
  const handle = openSync(fresh, constants.O_WRONLY | constants.O_CREAT | constants.O_EXCL, 0o666);
  opened();
  try {
    writeAll(handle, typeof content === "string" ? Buffer.from(content) : content);
    fsyncSync(handle);
  } finally {
    closeSync(handle);
  }
  if (existsSync(target)) chmodSync(fresh, statSync(target).mode & 0o7777);
}

function writeAll(handle: number, bytes: Uint8Array): void {
  for (let at = 0; at < bytes.length;) at += writeSync(handle, bytes, at);
}

const REASONS: Readonly<Record<string, string>> = {
  ENOENT: "there is no such file or folder",
  EACCES: "permission is denied",
  EPERM: "it is protected or open in another program",
  EBUSY: "it is open in another program",
  EISDIR: "it is a folder",
  ENOTDIR: "a part of the path is not a folder",
  ENOSPC: "the disk is full",
  EROFS: "the disk is read-only",
  EEXIST: "another run is writing it",
};

function guarded<T>(what: string, action: () => T): T {
  try {
    return action();
  } catch (error) {
    const { code, message } = error as NodeJS.ErrnoException;
    if (code === undefined) throw error;
    return refuse(`${what[0]?.toUpperCase()}${what.slice(1)}: ${REASONS[code] ?? message}`);
  }
}
