import { Refusal } from "../core/refusal";

/** An error in a cell, in or out, on the page and in the command. Excel's own class takes its place inside Excel. */
export class CellError {
  constructor(
    /** As Excel writes it: `#VALUE!`, `#N/A`, `#DIV/0!`, … */
    readonly code: string,
    /** The sentence for the user; empty for an error that came in from another cell. */
    readonly message: string = "",
  ) {}
}
void Refusal;
