/** Collects replacements by place and applies them in one go; what lies between is copied as it is. */
export class Splice {
  private readonly pieces: { start: number; end: number; text: string }[] = [];

  constructor(private readonly source: string) {}

  /** Replaces the text from `start` to `end`; with `start === end` inserts. */
  replace(start: number, end: number, text: string): void {
    this.pieces.push({ start, end, text });
  }

  result(): string {
    if (this.pieces.length === 0) return this.source;
    // Sorting is stable: what is inserted at one place stays in the order of the calls.
    this.pieces.sort((a, b) => a.start - b.start || a.end - b.end);
    const out: string[] = [];
    let at = 0;
    for (const { start, end, text } of this.pieces) {
      out.push(this.source.slice(at, start), text);
      at = end;
    }
    out.push(this.source.slice(at));
    return out.join("");
  }
}
