import fc from "fast-check";
import { attributesOf, closingTag, elements, nextTag, textOf, withAttributes } from "../../../src/book/xml/lexer";
import { walkXml } from "../../../src/book/xml/walk";
import { refusalOf } from "../packages";

const MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";

/** Text, comments, CDATA and instructions that look like tags but are none. */
const noise = fc.constantFrom("", " ", "text", "<!-- <c r='A1'> -->", "<![CDATA[</c><v>]]>", "<?go <c> ?>", "a &lt; b", ">", "'", '"');
const attributeText = fc.constantFrom("", ' r="A1"', " r='A1'", ' x="a>b"', " y = '/>'", '\n\tz="1"', ' q="&lt;"');
const element: fc.Arbitrary<string> = fc.letrec<{ node: string }>((tie) => ({
  node: fc.oneof(
    { maxDepth: 4 },
    fc.tuple(fc.constantFrom("c", "v", "f"), attributeText).map(([name, attributes]) => `<${name}${attributes}/>`),
    fc
      .tuple(fc.constantFrom("c", "v", "f"), attributeText, noise, fc.array(tie("node"), { maxLength: 3 }), noise)
      .map(([name, attributes, before, children, behind]) => `<${name}${attributes}>${before}${children.join(before)}${behind}</${name} >`),
  ),
})).node;

test("the cutter sees the same elements in the same order as the parser", () => {
  fc.assert(
    fc.property(fc.array(element, { maxLength: 5 }), (nodes) => {
      const text = `<root xmlns="${MAIN}">${nodes.join(" ")}</root>`;
      const parsed: string[] = [];
      walkXml(text, "part", { open: (name) => parsed.push(name), close: (name) => parsed.push(`/${name}`) });
      const cut: string[] = [];
      for (let tag = nextTag(text, 0); tag; tag = nextTag(text, tag.end)) {
        if (tag.kind !== "close") cut.push(tag.name);
        if (tag.kind !== "open") cut.push(`/${tag.name}`);
      }
      expect(cut).toEqual(parsed);
    }),
  );
});

test("child elements lie side by side and cover all of them", () => {
  fc.assert(
    fc.property(fc.array(element, { maxLength: 5 }), (nodes) => {
      const text = `<root>${nodes.join("<!-- <x> -->")}</root>`;
      const root = nextTag(text, 0)!;
      const found = Array.from(elements(text, root.end, closingTag(text, root).start), ({ tag, close }) =>
        text.slice(tag.start, close.end),
      );
      expect(found).toEqual(nodes);
    }),
  );
});

test("attributes: any order, quotes, blanks and references", () => {
  expect(attributesOf(`<c  b = 'x"y' a="1&#x41;&amp;&#66;"\n x:c="&unknown;">`).map(({ name, value }) => [name, value])).toEqual([
    ["b", 'x"y'],
    ["a", "1A&B"],
    ["x:c", "&unknown;"],
  ]);
});

test("setting attributes leaves the others as written", () => {
  expect(withAttributes("<c  r='A1' t = 's'  s=\"3\" />", { t: "str" })).toBe('<c  r=\'A1\' t="str"  s="3" />');
  expect(withAttributes("<c  r='A1' t = 's'  s=\"3\" />", { t: null, vm: null })).toBe("<c  r='A1'  s=\"3\" />");
  expect(withAttributes("<c r='A1'>", { t: "e", cm: "1" })).toBe('<c r=\'A1\' t="e" cm="1">');
  expect(withAttributes("<c r='A1'>", { r: "A1" })).toBe("<c r='A1'>");
});

test("text of an element", () => {
  expect(textOf("a &lt; <!-- no -->b<![CDATA[<c>&amp;]]>&#33;")).toBe("a < b<c>&amp;!");
});

test("text that breaks off is refused", () => {
  for (const text of ["<a", '<a b="', "<!-- x", "<a><b></a", "<a b='1' <c>"]) {
    expect(() => {
      for (let tag = nextTag(text, 0); tag; tag = nextTag(text, tag.end)) closingTag(text, tag);
    }).toThrow(expect.objectContaining({ kind: "input" }));
  }
  expect(refusalOf(() => closingTag("<a><b/>", nextTag("<a><b/>", 0)!))).toBe("The XML element <a> is not closed");
});
