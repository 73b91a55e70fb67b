/** The table of shared strings: plain texts, and rich texts whose runs are joined; phonetic guides are left out. */
import { fromCellText } from "../xml/escape";
import { walkXml, type XmlHandler } from "../xml/walk";

/** Texts by index, from the text of the shared string part. */
export function readSharedStrings(text: string, part: string): string[] {
  const strings: string[] = [];
  const item = new RichText();
  walkXml(text, part, {
    open(name) {
      if (name === "si") item.clear();
      else item.open(name);
    },
    text: (piece) => item.text(piece),
    close(name) {
      if (name === "si") strings.push(item.content());
      else item.close(name);
    },
  });
  return strings;
}

/** Collects the text of one string item (`si`) or inline string (`is`) from the events inside it. */
export class RichText implements Required<Pick<XmlHandler, "text" | "close">> {
  private pieces = "";
  private inText = false;
  private phonetic = 0;

  clear(): void {
    this.pieces = "";
  }

  open(name: string): void {
    if (name === "rPh") this.phonetic++;
    else if (name === "t") this.inText = this.phonetic === 0;
  }

  text(piece: string): void {
    if (this.inText) this.pieces += piece;
  }

  close(name: string): void {
    if (name === "rPh") this.phonetic--;
    else if (name === "t") this.inText = false;
  }

  content(): string {
    return fromCellText(this.pieces);
  }
}
