/** Charts of a workbook: what the sample writer wrote, what another program wrote, and parts that are strange. */
import { readFileSync } from "node:fs";
import { join } from "node:path";
import type { BookChart, SheetCharts } from "../../../src/book/chart";
import { readPackage } from "../../../src/book/container/package";
import { readChart } from "../../../src/book/read/chart";
import { readCharts } from "../../../src/book/read/charts";
import { readWorkbook } from "../../../src/book/read/workbook";
import { chartBook } from "../chart-book";
import { packageBytes, type PartList } from "../packages";

const RELATIONS = "http://schemas.openxmlformats.org/package/2006/relationships";
const OFFICE = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
const DRAWING = "http://schemas.openxmlformats.org/drawingml/2006";
const CHART = `${DRAWING}/chart`;

describe("a written workbook", () => {
  const charts = readCharts(readPackage(chartBook()));

  test("gives the charts of each sheet that has any, with nothing left over", () => {
    expect(charts.map(({ sheet, charts: found, others }) => [sheet, found.length, others])).toEqual([
      ["Test series", 1, []],
      ["Comparison", 1, []],
    ]);
  });

  test("place, titles and fixed ends come back as given", () => {
    expect(charts[0]!.charts[0]).toMatchObject({
      anchor: "B11:H30",
      title: { text: "Peak pressure, measured & calculated" },
      x: { title: { text: "equivalence ratio" }, from: 0.4, to: 1.6 },
      y: { title: { text: "peak pressure, bar" }, from: undefined, to: undefined },
    });
  });

  test("series come back with references, kind and colour; one names another sheet", () => {
    const series = charts[0]!.charts[0]!.series;
    expect(series).toHaveLength(6);
    expect(series[0]).toEqual({
      name: { text: "", formula: "'Test series'!$B$3" },
      x: { formula: "'Test series'!$A$4:$A$8" },
      y: { formula: "'Test series'!$B$4:$B$8" },
      line: false,
      points: true,
      accent: 1,
    });
    expect(series[5]).toMatchObject({ y: { formula: "'Test series'!$G$4:$G$8" }, line: true, points: false, accent: 3 });
    expect(charts[1]!.charts[0]!.series).toEqual([
      {
        name: { text: "Fuel A" },
        x: { formula: "'Test series'!$C$4:$C$8" },
        y: { formula: "'Test series'!$B$4:$B$8" },
        line: false,
        points: true,
        accent: 4,
      },
    ]);
  });
});

test("the bar chart of another program is named and passed over", () => {
  const bytes = readFileSync(join(__dirname, "..", "fixtures", "libreoffice-made.xlsx"));
  expect(readCharts(readPackage(new Uint8Array(bytes)))).toMatchObject([{ sheet: "Vessel", charts: [], others: ["bar chart"] }]);
});

const axis = (side: string, inside = "") => `<c:valAx><c:scaling>${inside}</c:scaling><c:axPos val="${side}"/></c:valAx>`;
const AXES = axis("b") + axis("l");
const space = (inside: string) => `<c:chartSpace xmlns:c="${CHART}" xmlns:a="${DRAWING}/main"><c:chart>${inside}</c:chart></c:chartSpace>`;
const scatter = (series: string, axes = AXES, head = "") =>
  space(`${head}<c:plotArea><c:scatterChart>${series}</c:scatterChart>${axes}</c:plotArea>`);
const numbers = (tag: string, formula: string) => `<c:${tag}><c:numRef><c:f>${formula}</c:f></c:numRef></c:${tag}>`;
const read = (xml: string) => readChart(xml, "xl/charts/chart1.xml");

describe("one chart part", () => {
  test("texts in several runs and paragraphs are joined; a title from a cell keeps its reference", () => {
    const rich = "<a:p><a:r><a:t>Peak </a:t></a:r><a:r><a:t>pressure</a:t></a:r></a:p><a:p><a:r><a:t>of a series</a:t></a:r></a:p>";
    const title = `<c:title><c:tx><c:rich>${rich}</c:rich></c:tx></c:title>`;
    expect(read(scatter("", AXES, title))).toMatchObject({ title: { text: "Peak pressure of a series" } });
    const cell =
      '<c:title><c:tx><c:strRef><c:f>S!$A$1</c:f><c:strCache><c:pt idx="0"><c:v>old</c:v></c:pt></c:strCache></c:strRef></c:tx></c:title>';
    expect(read(scatter("", AXES, cell))).toMatchObject({ title: { text: "old", formula: "S!$A$1" } });
    expect(read(scatter("", AXES, '<c:title><c:overlay val="0"/></c:title>'))).toMatchObject({ title: undefined });
  });

  test("lines and symbols are on unless the file switches them off", () => {
    const look = (inside: string) => (read(scatter(`<c:ser>${inside}${numbers("yVal", "S!A1:A3")}</c:ser>`)) as BookChart).series[0];
    expect(look("")).toMatchObject({ line: true, points: true, x: undefined, name: undefined, accent: undefined });
    expect(look('<c:marker><c:symbol val="none"/></c:marker>')).toMatchObject({ line: true, points: false });
    expect(look("<c:spPr><a:ln><a:noFill/></a:ln></c:spPr>")).toMatchObject({ line: false, points: true });
    const marker = '<c:marker><c:spPr><a:solidFill><a:schemeClr val="accent5"/></a:solidFill></c:spPr></c:marker>';
    expect(look(marker)).toMatchObject({ accent: 5 });
  });

  test("values that stand in the chart itself are read, with gaps; absurd indices are not", () => {
    const points = '<c:pt idx="0"><c:v>1.5</c:v></c:pt><c:pt idx="2"><c:v>3E-1</c:v></c:pt><c:pt idx="4000000000"><c:v>1</c:v></c:pt>';
    const series = `<c:ser><c:xVal><c:numLit>${points}</c:numLit></c:xVal>${numbers("yVal", "=S!A1:A3")}</c:ser>`;
    expect(read(scatter(series))).toMatchObject({ series: [{ x: { values: [1.5, null, 0.3] }, y: { formula: "S!A1:A3" } }] });
  });

  test("a vertical axis written first is still the vertical one", () => {
    const named = (side: string, title: string) =>
      `<c:valAx><c:axPos val="${side}"/><c:title><c:tx><c:rich><a:p><a:r><a:t>${title}</a:t></a:r></a:p></c:rich></c:tx></c:title></c:valAx>`;
    const chart = read(scatter("", named("l", "pressure") + named("b", "time")));
    expect(chart).toMatchObject({ x: { title: { text: "time" } }, y: { title: { text: "pressure" } } });
  });

  test("a series without heights is left out, and so are series that a filter keeps aside", () => {
    const aside = `<c:extLst><c:ext xmlns:z="urn:z"><z:filtered><z:ser>${numbers("yVal", "S!B1:B3")}</z:ser></z:filtered></c:ext></c:extLst>`;
    expect(read(scatter(`<c:ser>${numbers("xVal", "S!A1:A3")}</c:ser>${aside}`))).toMatchObject({ series: [] });
  });

  test("the strict form of the format is read too", () => {
    const strict = scatter(`<c:ser>${numbers("yVal", "S!A1")}</c:ser>`).replaceAll(
      "http://schemas.openxmlformats.org/drawingml/2006",
      "http://purl.oclc.org/ooxml/drawingml",
    );
    expect(read(strict)).toMatchObject({ series: [{ y: { formula: "S!A1" } }] });
  });

  test.each([
    ["bar chart", space("<c:plotArea><c:bar3DChart/></c:plotArea>")],
    ["line chart", space("<c:plotArea><c:lineChart/><c:catAx/><c:valAx/></c:plotArea>")],
    ["pie chart", space("<c:plotArea><c:ofPieChart/></c:plotArea>")],
    ["chart of several kinds", space(`<c:plotArea><c:scatterChart/><c:barChart/>${AXES}</c:plotArea>`)],
    [
      "scatter chart with other than two axes of numbers",
      space(`<c:plotArea><c:scatterChart/><c:scatterChart/>${AXES}${AXES}</c:plotArea>`),
    ],
    ["scatter chart with a logarithmic axis", scatter("", axis("b", '<c:logBase val="10"/>') + axis("l"))],
    ["scatter chart with a reversed axis", scatter("", axis("b") + axis("l", '<c:orientation val="maxMin"/>'))],
    ["chart that could not be read", space("<c:plotArea/>")],
    ["chart that could not be read", space("")],
    ["chart that could not be read", "<other/>"],
  ])("%s", (kind, xml) => {
    expect(read(xml)).toBe(kind);
  });
});

const anchored = (cells: string, graphic: string) =>
  `<d:twoCellAnchor>${cells}<d:graphicFrame><a:graphic>${graphic}</a:graphic></d:graphicFrame></d:twoCellAnchor>`;
const corner = (name: string, column: number, row: number, into = 0) =>
  `<d:${name}><d:col>${column}</d:col><d:colOff>${into}</d:colOff><d:row>${row}</d:row><d:rowOff>${into}</d:rowOff></d:${name}>`;
const graphic = (id: string, uri = CHART) => `<a:graphicData uri="${uri}"><c:chart xmlns:r="${OFFICE}" r:id="${id}"/></a:graphicData>`;

/** A workbook with one sheet, a drawing with these anchors, and these parts. */
function drawn(anchors: string, parts: PartList = {}, targets: Record<string, string> = {}): SheetCharts[] {
  const links = Object.entries(targets).map(([id, target]) => `<Relationship Id="${id}" Type="${OFFICE}/chart" Target="${target}"/>`);
  const bytes = packageBytes({
    parts: {
      "xl/worksheets/_rels/sheet1.xml.rels": `<Relationships xmlns="${RELATIONS}"><Relationship Id="d" Type="${OFFICE}/drawing" Target="../drawings/drawing1.xml"/></Relationships>`,
      "xl/drawings/drawing1.xml": `<d:wsDr xmlns:d="${DRAWING}/spreadsheetDrawing" xmlns:a="${DRAWING}/main" xmlns:c="${CHART}">${anchors}</d:wsDr>`,
      "xl/drawings/_rels/drawing1.xml.rels": `<Relationships xmlns="${RELATIONS}">${links.join("")}</Relationships>`,
      ...parts,
    },
  });
  const pkg = readPackage(bytes);
  expect(readWorkbook(pkg).sheets).toHaveLength(1); // whatever the charts are like
  return readCharts(pkg);
}

const GOOD = scatter(`<c:ser>${numbers("yVal", "Sheet1!A1:A3")}</c:ser>`);

describe("drawings", () => {
  test("charts come from the top to the bottom, with the cells they cover", () => {
    const anchors =
      anchored(corner("from", 2, 30) + corner("to", 4, 40, 900), graphic("low")) +
      anchored(corner("from", 0, 1) + corner("to", 3, 9), graphic("high"));
    const parts = { "xl/charts/chart1.xml": GOOD, "xl/charts/chart2.xml": GOOD };
    const found = drawn(anchors, parts, { low: "../charts/chart1.xml", high: "/xl/charts/chart2.xml" });
    expect(found[0]!.charts.map(({ anchor }) => anchor)).toEqual(["A2:C9", "C31:E41"]);
  });

  test("one anchored by a single cell has that cell, one that stands free has none and comes last", () => {
    const one = `<d:oneCellAnchor>${corner("from", 1, 4)}<d:ext cx="1" cy="1"/><a:graphic>${graphic("a")}</a:graphic></d:oneCellAnchor>`;
    const free = `<d:absoluteAnchor><a:graphic>${graphic("a")}</a:graphic></d:absoluteAnchor>`;
    const found = drawn(free + one, { "xl/charts/chart1.xml": GOOD }, { a: "../charts/chart1.xml" });
    expect(found[0]!.charts.map(({ anchor }) => anchor)).toEqual(["B5", undefined]);
  });

  const here = corner("from", 0, 0) + corner("to", 1, 1);
  test.each<[string, string, PartList, string[]]>([
    ["a chart part that is missing", graphic("a"), {}, ["chart that could not be read"]],
    ["a chart part that is no XML", graphic("a"), { "xl/charts/chart1.xml": "<c:chart" }, ["chart that could not be read"]],
    [
      "a chart part with a document type",
      graphic("a"),
      { "xl/charts/chart1.xml": `<!DOCTYPE x>${GOOD}` },
      ["chart that could not be read"],
    ],
    ["a relationship that is missing", graphic("b"), { "xl/charts/chart1.xml": GOOD }, ["chart that could not be read"]],
    [
      "a chart of a newer kind",
      '<a:graphicData uri="http://schemas.microsoft.com/office/drawing/2014/chartex"/>',
      {},
      ["chart of a newer kind"],
    ],
  ])("%s is counted", (_what, inside, parts, others) => {
    expect(drawn(anchored(here, inside), parts, { a: "../charts/chart1.xml" })).toMatchObject([{ sheet: "Sheet1", charts: [], others }]);
  });

  test("a drawing that holds charts alone is theirs, with their looks; one with a picture or a shape is not", () => {
    const link = (role: string) => `<Relationship Id="l" Type="urn:x/${role}" Target="look.xml"/>`;
    const parts = { "xl/charts/chart1.xml": GOOD, "xl/charts/look.xml": "<x/>" };
    const looks = `<Relationships xmlns="${RELATIONS}">${link("chartStyle")}</Relationships>`;
    const shapes = `<Relationships xmlns="${RELATIONS}">${link("chartUserShapes")}</Relationships>`;
    const partsWith = (relations: string, more = "") => {
      const all = { ...parts, "xl/charts/_rels/chart1.xml.rels": relations };
      return drawn(anchored(here, graphic("a")) + more, all, { a: "../charts/chart1.xml" })[0]!.parts;
    };
    const chart = ["xl/charts/chart1.xml", "xl/charts/_rels/chart1.xml.rels"];
    const drawing = ["xl/drawings/drawing1.xml", "xl/drawings/_rels/drawing1.xml.rels"];
    expect(partsWith(looks)).toEqual([...drawing, ...chart, "xl/charts/look.xml"]);
    expect(partsWith(shapes)).toEqual([...drawing, ...chart]);
    expect(partsWith(looks, `<d:twoCellAnchor>${here}<d:pic/></d:twoCellAnchor>`)).toEqual([...chart, "xl/charts/look.xml"]);
  });

  test("pictures, damaged drawings and sheets without drawings hold no charts", () => {
    expect(drawn(anchored(here, '<a:graphicData uri="http://schemas.openxmlformats.org/drawingml/2006/picture"/>'))).toEqual([]);
    expect(drawn("", { "xl/drawings/drawing1.xml": "<not" })).toEqual([]);
    expect(drawn("", { "xl/drawings/drawing1.xml": null })).toEqual([]);
    expect(readCharts(readPackage(packageBytes()))).toEqual([]);
  });

  test("a chart whose elements are nested without end is counted, in no time", () => {
    const deep = `${"<a:x>".repeat(100_000)}${"</a:x>".repeat(100_000)}`;
    const parts = { "xl/charts/chart1.xml": scatter(`<c:ser>${deep}${numbers("yVal", "S!A1")}</c:ser>`) };
    const start = performance.now();
    const [found] = drawn(anchored(here, graphic("a")), parts, { a: "../charts/chart1.xml" });
    expect(found).toMatchObject({ sheet: "Sheet1", charts: [], others: ["chart that could not be read"] });
    expect(performance.now() - start).toBeLessThan(5000); // without the limit it takes far longer
  });
});
