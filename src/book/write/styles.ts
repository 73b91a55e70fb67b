/** Cell styles of a new workbook: number format, weight, fill, alignment. Each different style is written once. */
import { xmlAttribute } from "../xml/escape";

export interface CellStyle {
  /** Number format as Excel spells it: `0.00`, `0.0000E+00`, `@`. */
  readonly format?: string;
  readonly bold?: boolean;
  readonly italic?: boolean;
  /** Letter colour, RRGGBB. */
  readonly colour?: string;
  /** Background, RRGGBB. */
  readonly fill?: string;
  readonly wrap?: boolean;
  readonly align?: "left" | "center" | "right";
}

const PLAIN_FONT = '<font><sz val="11"/><name val="Calibri"/><family val="2"/></font>';
const FIRST_FORMAT = 164; // lower numbers are the built-in formats

/** Hands out style numbers and writes the style part. */
export class StyleBook {
  private readonly known = new Map<string, number>();
  private readonly formats: string[] = [];
  private readonly fonts: string[] = [PLAIN_FONT];
  private readonly fills: string[] = [
    '<fill><patternFill patternType="none"/></fill>',
    '<fill><patternFill patternType="gray125"/></fill>',
  ];
  private readonly cells: string[] = ['<xf numFmtId="0" fontId="0" fillId="0" borderId="0" xfId="0"/>'];

  /** Number of a style for the attribute `s`; 0 for none. */
  number(style: CellStyle | undefined): number {
    if (!style || Object.keys(style).length === 0) return 0;
    const key = JSON.stringify([style.format, style.bold, style.italic, style.colour, style.fill, style.wrap, style.align]);
    const known = this.known.get(key);
    if (known !== undefined) return known;
    const number = this.cells.push(this.cellFormat(style)) - 1;
    this.known.set(key, number);
    return number;
  }

  private cellFormat(style: CellStyle): string {
    const format = style.format === undefined || style.format === "General" ? 0 : FIRST_FORMAT + indexIn(this.formats, style.format);
    const font = indexIn(this.fonts, fontOf(style));
    const fill =
      style.fill === undefined
        ? 0
        : indexIn(
            this.fills,
            `<fill><patternFill patternType="solid"><fgColor rgb="FF${style.fill}"/><bgColor indexed="64"/></patternFill></fill>`,
          );
    const alignment =
      style.wrap || style.align
        ? `<alignment${style.align ? ` horizontal="${style.align}"` : ""} vertical="top"${style.wrap ? ' wrapText="1"' : ""}/>`
        : "";
    const applied = `${format ? ' applyNumberFormat="1"' : ""}${font ? ' applyFont="1"' : ""}${fill ? ' applyFill="1"' : ""}${alignment ? ' applyAlignment="1"' : ""}`;
    return `<xf numFmtId="${format}" fontId="${font}" fillId="${fill}" borderId="0" xfId="0"${applied}>${alignment}</xf>`;
  }

  part(): string {
    const formats = this.formats.map((code, index) => `<numFmt numFmtId="${FIRST_FORMAT + index}" formatCode="${xmlAttribute(code)}"/>`);
    return (
      `<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n<styleSheet xmlns="http://schemas.openxmlformats.org/spreadsheetml/2006/main">` +
      (formats.length ? counted("numFmts", formats) : "") +
      counted("fonts", this.fonts) +
      counted("fills", this.fills) +
      counted("borders", ["<border><left/><right/><top/><bottom/><diagonal/></border>"]) +
      counted("cellStyleXfs", ['<xf numFmtId="0" fontId="0" fillId="0" borderId="0"/>']) +
      counted("cellXfs", this.cells) +
      counted("cellStyles", ['<cellStyle name="Normal" xfId="0" builtinId="0"/>']) +
      `<dxfs count="0"/><tableStyles count="0"/></styleSheet>`
    );
  }
}

function fontOf({ bold, italic, colour }: CellStyle): string {
  const marks = `${bold ? "<b/>" : ""}${italic ? "<i/>" : ""}<sz val="11"/>${colour ? `<color rgb="FF${colour}"/>` : ""}`;
  return PLAIN_FONT.replace('<sz val="11"/>', marks);
}

function indexIn(list: string[], item: string): number {
  const index = list.indexOf(item);
  return index >= 0 ? index : list.push(item) - 1;
}

const counted = (name: string, items: readonly string[]) => `<${name} count="${items.length}">${items.join("")}</${name}>`;
