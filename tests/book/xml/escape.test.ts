import fc from "fast-check";
import { cellText, fromCellText, needsSpace, xmlAttribute } from "../../../src/book/xml/escape";
import { attributesOf } from "../../../src/book/xml/lexer";
import { walkXml } from "../../../src/book/xml/walk";

const MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";

test("every text of a cell comes back from the file, control characters and broken pairs included", () => {
  const pieces = fc.constantFrom(
    "_x0041_",
    "_x",
    "_",
    "x0041_",
    "\r",
    "\n",
    "\t",
    "\u0000",
    "\u001f",
    "\uffff",
    "\ud800",
    "\udc00",
    "😀",
    "<",
    "&amp;",
    "]]>",
    " ",
    "é",
  );
  fc.assert(
    fc.property(
      fc.oneof(
        fc.string({ unit: "binary" }),
        fc.array(pieces).map((list) => list.join("")),
      ),
      (text) => {
        let read = "";
        walkXml(`<t xmlns="${MAIN}">${cellText(text)}</t>`, "part", { text: (piece) => (read += piece) });
        expect(fromCellText(read)).toBe(text);
      },
    ),
  );
});

// Spelling by ISO/IEC 29500-1, 22.9.2.19: _xHHHH_, and an underscore in front of what looks like one as _x005F_.
test.each([
  ["\r", "_x000D_"],
  ["_x0041_", "_x005F_x0041_"],
  ["_x41_", "_x41_"],
  ["a\u0007b", "a_x0007_b"],
  ["\ud83d", "_xD83D_"],
  ["a<b>&", "a&lt;b&gt;&amp;"],
])("%j is written %s", (text, written) => {
  expect(cellText(text)).toBe(written);
});

test("attribute values come back, line ends and quotes included", () => {
  fc.assert(
    fc.property(fc.string(), (text) => {
      expect(attributesOf(`<a b="${xmlAttribute(text)}"/>`)[0]!.value).toBe(text);
    }),
  );
});

test("which texts need their blanks kept", () => {
  expect([" a", "a ", "a\nb", "a  b", "\ta"].map(needsSpace)).toEqual([true, true, true, true, true]);
  expect(["", "a b", "a"].map(needsSpace)).toEqual([false, false, false]);
});
