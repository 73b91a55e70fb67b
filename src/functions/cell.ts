/**
 * Cells in, cells out: what a host hands to a worksheet function, and how a refusal becomes the host's error.
 * The only file besides host.ts that knows Excel's error class.
 */
import { Refusal } from "../core/refusal";

/** An error in a cell, in or out, on the page and in the command. Inside Excel the host's own class takes its place. */
export class CellError {
  constructor(
    /** As Excel writes it: `#VALUE!`, `#N/A`, `#DIV/0!`, … */
    readonly code: string,
    /** The sentence for the user; empty for an error that came in from another cell. */
    readonly message: string = "",
  ) {}
}

/** A cell as the functions see it: blank is null. */
export type Cell = number | string | boolean | null | CellError;

/** A rectangle of cells, row by row. */
export type Block = any[][];

/** One cell of a host made plain: rich values give their basic value, undefined and empty text are blank, errors become CellError. */
export function plain(cell: unknown): Cell {
  if (typeof cell === "number" || typeof cell === "boolean") return cell;
  if (typeof cell === "string") return cell === "" ? null : cell;
  if (cell === null || cell === undefined) return null;
  if (cell instanceof CellError) return cell;
  return plainObject(cell as Record<string, unknown>);
}

function plainObject(cell: Record<string, unknown>): Cell {
  if (typeof cell.code === "string" && cell.code.startsWith("#")) return new CellError(cell.code, "");
  if ("basicValue" in cell) return plain(cell.basicValue);
  return new CellError("#VALUE!", "A cell holds a value of a kind that cannot be read");
}

/** True for an argument that was left out: undefined, null, "" or a single blank cell. */
export function isLeftOut(block: unknown): boolean {
  if (block === undefined || block === null || block === "") return true;
  if (!Array.isArray(block)) return false;
  return block.length === 0 || (block.length === 1 && block[0].length === 1 && plain(block[0][0]) === null);
}

/** As `isLeftOut`, for arguments that are texts: 0 counts as left out, because older Excel sends 0 for a blank cell. */
export function isTextLeftOut(block: unknown): boolean {
  return isLeftOut(block) || (Array.isArray(block) && block.length === 1 && block[0].length === 1 && block[0][0] === 0);
}

interface HostErrorClass {
  new (code: string, message?: string): CellError;
}

/** Excel's error class, once the runtime is there (never while modules load); elsewhere our own. */
function errorClass(): HostErrorClass {
  const host = (globalThis as { CustomFunctions?: { Error?: HostErrorClass } }).CustomFunctions;
  return host?.Error ?? CellError;
}

/** Error of the host with its sentence. Hosts show the sentence of #VALUE! and #N/A only. */
export function hostError(code: string, message: string): CellError {
  return new (errorClass())(code, message);
}

/** The host's error for anything thrown inside a function: #N/A for what the library lacks, #VALUE! for everything else. */
export function errorOf(thrown: unknown): CellError {
  if (thrown instanceof CellError) return hostError(thrown.code, thrown.message);
  if (thrown instanceof Refusal) return hostError(thrown.kind === "absent" ? "#N/A" : "#VALUE!", thrown.message);
  const detail = thrown instanceof Error ? thrown.message : String(thrown);
  return hostError("#VALUE!", `The function could not finish: ${detail}`);
}

/** Runs the body of a function; whatever is thrown becomes one error cell. */
export function cells(body: () => Block): Block {
  try {
    return body();
  } catch (thrown) {
    return [[errorOf(thrown)]];
  }
}

/** A computed number as a cell. Anything but a finite number is a fault of ours and is never shown as a value. */
export function finite(value: number): number {
  if (!Number.isFinite(value)) throw new Refusal("input", "The result is not a finite number for these arguments");
  return value;
}
