/** Charts that the sample writer puts into a workbook: parts, their order and what leads from one to the next. */
import { readPackage } from "../../src/book";
import { bookBytes } from "../../src/build/sample-writer.mjs";
import { below, child, parseXml, type XmlElement } from "../../src/build/xml.mjs";
import { CHART_SHEETS, chartBook } from "../book/chart-book";

const pkg = readPackage(chartBook());
const part = (name: string): XmlElement => parseXml(pkg.text(name));

test("every part is reached by a relationship from the sheet on and has a content type of its own", () => {
  const sheet = pkg.relations("xl/worksheets/sheet1.xml");
  expect(sheet.map(({ role, target }) => [role, target])).toEqual([["drawing", "xl/drawings/drawing1.xml"]]);
  expect(pkg.relations("xl/drawings/drawing2.xml").map(({ role, target }) => [role, target])).toEqual([["chart", "xl/charts/chart2.xml"]]);
  expect(pkg.relations("xl/workbook.xml").find(({ role }) => role === "theme")?.target).toBe("xl/theme/theme1.xml");
  const types = ["drawings/drawing1", "charts/chart2", "theme/theme1"].map((name) => pkg.contentType(`xl/${name}.xml`)?.split(".").pop());
  expect(types).toEqual(["drawing+xml", "chart+xml", "theme+xml"]);
  expect(pkg.find("xl/worksheets/_rels/sheet3.xml.rels")).toBeUndefined();
});

test("the drawing stands last in the sheet and covers the cells of its anchor", () => {
  expect(part("xl/worksheets/sheet1.xml").children.at(-1)).toMatchObject({ name: "drawing", attributes: { "r:id": "rId1" } });
  const anchor = below(part("xl/drawings/drawing1.xml"), "xdr:twoCellAnchor")[0]!;
  const corner = (name: string) => child(anchor, name)!.children.map(({ text }) => Number(text));
  expect([corner("xdr:from"), corner("xdr:to")]).toEqual([
    [1, 0, 10, 0],
    [8, 0, 30, 0],
  ]);
});

// Order of the elements: ECMA-376-1, A.5.1 (CT_ScatterSer, CT_ValAx, CT_PlotArea); readers are strict about it.
test("the elements of series and axes stand in the order that the format demands", () => {
  const chart = part("xl/charts/chart1.xml");
  const names = (element: XmlElement) => element.children.map(({ name }) => name.slice(2)).join(" ");
  for (const series of below(chart, "c:ser")) expect(names(series)).toBe("idx order tx spPr marker xVal yVal smooth");
  expect(names(below(chart, "c:valAx")[0]!)).toBe(
    "axId scaling delete axPos majorGridlines title numFmt majorTickMark minorTickMark tickLblPos spPr crossAx crosses crossBetween",
  );
  expect(names(below(chart, "c:scaling")[0]!)).toBe("orientation max min");
  expect(names(below(chart, "c:plotArea")[0]!)).toBe("layout scatterChart valAx valAx");
});

test("series of one kind differ in symbol or dashes", () => {
  const chart = part("xl/charts/chart1.xml");
  const values = (name: string) => below(chart, name).map(({ attributes }) => attributes.val);
  expect(values("c:symbol")).toEqual(["circle", "none", "square", "none", "triangle", "none"]);
  expect(values("a:prstDash")).toEqual(["solid", "dash", "sysDot"]);
});

test("numbers stay in the cells: no values are cached in the chart", () => {
  expect(below(part("xl/charts/chart1.xml"), "c:numCache")).toEqual([]);
});

test("an anchor that names no cells is a fault of the sample", () => {
  const [sheet] = CHART_SHEETS;
  const charts = [{ ...sheet!.charts![0]!, anchor: "somewhere" }];
  expect(() => bookBytes([{ ...sheet!, charts }])).toThrow('"somewhere" is no cell for a chart to stand on');
});

test("a workbook without charts has neither theme nor drawings", () => {
  const plain = readPackage(bookBytes(CHART_SHEETS.map((sheet) => ({ ...sheet, charts: [] }))));
  expect(plain.names.filter((name) => /theme|drawing|chart|sheet\d.xml.rels/.test(name))).toEqual([]);
  expect(plain.text("xl/worksheets/sheet1.xml")).not.toContain("drawing");
});
