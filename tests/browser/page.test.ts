/**
 * The local page as a user meets it: types formulas, reads values and refusals in the status line, inserts from the pane, saves, reopens.
 * Only what stands on the page is used; values are compared with a direct call of the function, bit for bit.
 */
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import type { AddressInfo, Server } from "node:net";
import { tmpdir } from "node:os";
import { basename, join } from "node:path";
import type { Browser, BrowserContext, Page } from "playwright-core";
import { readPackage, readWorkbook } from "../../src/book";
import { ADDRESS, pageServer } from "../../src/build/serve.mjs";
import { registry } from "../../src/functions";
import { chartBook } from "../book/chart-book";
import { launch, record, type Record } from "./chromium";

jest.setTimeout(120_000);

const FOLDER = join(__dirname, "..", "..", "dist", "page");
const CELL = "#cell-line";
const READY = "html[data-ready]";

let server: Server;
let browser: Browser;
let context: BrowserContext;
let page: Page;
let found: Record;
let address: string;
const downloads = mkdtempSync(join(tmpdir(), "stillwall-page-"));

beforeAll(async () => {
  server = pageServer(FOLDER);
  await new Promise<void>((done) => server.listen(0, ADDRESS, done));
  address = `http://${ADDRESS}:${(server.address() as AddressInfo).port}/`;
  browser = await launch();
  context = await browser.newContext({ acceptDownloads: true });
  page = await context.newPage();
  found = record(page);
  await page.goto(address);
  await page.waitForSelector(READY, { timeout: 60_000 });
});

afterAll(async () => {
  await browser?.close();
  await new Promise((done) => server.close(done));
  rmSync(downloads, { recursive: true, force: true });
});

/** Every test begins with the sample as it comes; the page itself is loaded once. */
beforeEach(async () => {
  await page.setViewportSize({ width: 1200, height: 800 });
  await page.getByRole("button", { name: "Samples" }).click();
  await page.locator("#samples button").first().click();
  const discard = page.getByRole("button", { name: "Discard the changes" });
  if (await discard.isVisible()) await discard.click();
  await page.waitForFunction(() => document.querySelector("#book")?.textContent === "sealed-vessel.xlsx");
  await page.waitForFunction((line) => document.querySelector(line)?.textContent === "B3 empty", CELL);
});

afterEach(() => {
  expect(found.strangers).toEqual([]);
  expect(found.complaints.splice(0)).toEqual([]);
});

/** Selects a cell through the name box and gives what the status line says of it, without the address. */
async function read(cell: string): Promise<string> {
  const box = page.locator(".o-named-range-selector input");
  await box.click();
  await box.fill(cell);
  await box.press("Enter");
  await page.waitForFunction(
    ([line, wanted]) =>
      document.querySelector(`${line} b`)?.textContent === wanted && !document.activeElement?.closest(".o-named-range-selector"),
    [CELL, cell] as const,
  );
  return ((await page.textContent(CELL)) ?? "").slice(cell.length + 1);
}

async function type(cell: string, content: string): Promise<string> {
  await read(cell);
  await page.keyboard.type(content);
  await page.keyboard.press("Enter");
  return read(cell);
}

async function save(name: string): Promise<string> {
  const [download] = await Promise.all([page.waitForEvent("download"), page.getByRole("button", { name: "Save as .xlsx" }).click()]);
  const path = join(downloads, name);
  await download.saveAs(path);
  return path;
}

async function open(path: string): Promise<void> {
  const [chooser] = await Promise.all([page.waitForEvent("filechooser"), page.getByRole("button", { name: "Open…" }).click()]);
  await chooser.setFiles(path);
  await page.waitForFunction((name) => document.querySelector("#book")?.textContent === name, basename(path));
}

const direct = (id: string, ...args: unknown[]) =>
  registry.get(id)?.(...args.map((arg) => (arg === undefined ? undefined : [[arg]])))[0]?.[0];

test("the page is ready, with the sample and the first cell selected, and asks nothing of the network", async () => {
  const ready = Number(await page.getAttribute("html", "data-ready"));
  console.info(`page ready after ${ready} ms`);
  expect(await page.textContent("#book")).toBe("sealed-vessel.xlsx");
  expect(await page.textContent(CELL)).toBe("B3 empty");
});

test("a typed formula shows the value of the direct call, bit for bit", async () => {
  for (const [formula, value] of [
    ['=STILL.CV.AT("N2",500)', direct("CV.AT", "N2", 500)],
    ['=STILL.HEAT("0.79 N2 + 0.21 O2","60 g","25 °C",1500)', direct("HEAT", "0.79 N2 + 0.21 O2", "60 g", "25 °C", 1500)],
    ['=STILL.HEAT.FINALTEMP("CO2",2,300,"20 kJ")', direct("HEAT.FINALTEMP", "CO2", 2, 300, "20 kJ")],
  ] as const) {
    expect(typeof value).toBe("number");
    expect(await type("G5", formula)).toBe(String(value));
  }
});

test("a formula follows the cells it reads, and a range spills", async () => {
  await type("G5", "=STILL.CV.AT(B6,B13)");
  expect(await type("B6", "CO2")).toBe("CO2");
  expect(await read("G5")).toBe(String(direct("CV.AT", "CO2", 298.15)));
  await type("G7", "400");
  await type("G8", "800");
  await type("H7", '=STILL.CV.AT("Ar",G7:G8)');
  expect(await read("H8")).toBe(String(direct("CV.AT", "Ar", 800)));
});

test("typing over a cell replaces all of it, however fast the keys come", async () => {
  for (const content of ["Ar", "N2", "Ar", "N2", "Ar", "N2", "Ar", "N2"]) expect(await type("B6", content)).toBe(content);
});

test("Excel's own reading of a formula holds", async () => {
  expect(await type("G5", "=-2^2")).toBe("4");
  expect(await type("G5", "=LOG10(100)")).toBe("2");
  expect(await type("G5", '=IFERROR(STILL.CV.AT("N2",0),"caught")')).toBe("caught");
});

test.each([
  ['=STILL.CV.AT("CO2",5200,,"gri-1999")', "#VALUE! Temperature 5200 K is above 3500 K, the upper limit of gri-1999 for CO2"],
  ['=STILL.CV.AT("H2O(l)",300)', "#VALUE! H2O(l) is liquid"],
  ['=STILL.CV.AT("phlogiston",300)', "#N/A "],
  ["=STILL.NOSUCH(1)", "#NAME? The function STILL.NOSUCH is not known here"],
  ["=?1+1", '#BAD_EXPR "=?1+1" cannot be read as a formula'],
  ["=SUM(1,,*2)", '#BAD_EXPR "=SUM(1,,*2)" cannot be read as a formula'],
])("%s is refused in the status line: %s", async (formula, sentence) => {
  expect(await type("G5", formula)).toContain(sentence);
  expect(await page.getAttribute(CELL, "class")).toContain("refused");
  expect(await type("G6", "=G5+1")).toContain("(from G5)");
});

/** Types a function's beginning, takes the completion, types its first argument; false if a key was lost on the way. */
async function completes(): Promise<boolean> {
  const focused = page.locator(".o-formula-assistant-head .o-formula-assistant-focus");
  const shown = (text: string) => focused.getByText(text).waitFor({ timeout: 6000 });
  await read("G5");
  await page.keyboard.type("=STILL.HEAT.F");
  await page.locator(".o-autocomplete-value").getByText("STILL.HEAT.FINALTEMP").waitFor();
  await page.keyboard.press("Tab");
  try {
    await shown("substance");
    await page.keyboard.type('"N2",', { delay: 40 });
    await shown("amount");
    return true;
  } catch {
    return false;
  } finally {
    await page.keyboard.press("Escape");
    await page.keyboard.press("Escape");
  }
}

test("functions are completed and their arguments explained", async () => {
  // The grid writes a completion and sets the cursor behind it in two steps, and on a busy machine loses a key between them: as a person
  // would, the test types once more. If completion or argument help is broken, no try succeeds.
  let done = false;
  for (let tries = 0; !done && tries < 4; tries++) done = await completes();
  expect(done).toBe(true);
});

test("the pane inserts its formula into the selected cell by the road of typed ones", async () => {
  await read("G5");
  await page.getByRole("button", { name: "Insert into G5" }).click();
  await page.waitForFunction((line) => /G5 \d/.test(document.querySelector(line)?.textContent ?? ""), CELL);
  expect(await read("G5")).toBe(String(direct("CV.AT", "N2", 298.15)));
});

test("a saved workbook holds the formula as Excel stores it, and opens again with the formula live", async () => {
  const value = await type("G5", "=STILL.CV.AT(B6,700)");
  await type("G6", '=STILL.CV.AT("N2",0)');
  const path = await save("saved.xlsx");
  const saved = readWorkbook(readPackage(readFileSync(path))).sheets[0]?.cells.get("G5");
  expect(saved).toMatchObject({ formula: "_xldudf_STILL_CV_AT(B6,700)", value: Number(value) });
  expect(await page.textContent("#book")).toBe("sealed-vessel.xlsx");
  await open(path);
  expect(await read("G5")).toBe(value);
  expect(await read("G6")).toContain("#VALUE! Temperature 0 K");
  await type("B6", "Ar");
  expect(await read("G5")).toBe(String(direct("CV.AT", "Ar", 700)));
});

test("a file with chart, picture and comments is saved with new values, every other part byte for byte", async () => {
  const original = join(__dirname, "..", "book", "fixtures", "libreoffice-made.xlsx");
  await open(original);
  await page.getByRole("status").getByText("Not shown here: pictures, drawings, comments").waitFor();
  await page
    .getByRole("region", { name: "Charts of this sheet" })
    .getByText("A bar chart on this sheet is kept in the file but not drawn here.")
    .waitFor();
  expect(await read("B10")).toBe(String(direct("HEAT.FINALTEMP", "N2", 2, 298.15, direct("HEAT", "N2", 2, 298.15, 600))));
  const once = await save("once.xlsx");
  const changed = differingParts(original, once);
  expect(changed).toEqual(["xl/worksheets/sheet1.xml", "xl/worksheets/sheet2.xml"]);
  await open(once);
  const twice = await save("twice.xlsx");
  expect(readFileSync(twice).equals(readFileSync(once))).toBe(true);
});

test("a workbook's scatter chart is drawn under the grid and follows its cells", async () => {
  const path = join(downloads, "charts.xlsx");
  writeFileSync(path, chartBook());
  await open(path);
  const panel = page.getByRole("region", { name: "Charts of this sheet" });
  const chart = panel.getByRole("img");
  await chart.waitFor();
  const label = async () => (await chart.getAttribute("aria-label")) ?? "";
  expect(await label()).toBe(
    "Peak pressure, measured & calculated. Across: equivalence ratio, 0.6 to 1.4. Up: peak pressure, bar, 5.1 to 9.149. 6 series, 29 points; the figures stand in the table below.",
  );
  expect(await panel.locator(".chart-legend li").allTextContents()).toEqual(
    ["A", "B", "C"].flatMap((fuel) => [`Fuel ${fuel}, measured`, `Fuel ${fuel}, calculated`]),
  );
  const symbols = () => panel.locator(".chart-drawing .chart-symbol").first().getAttribute("d");
  const line = () => panel.locator(".chart-drawing .chart-line").first().getAttribute("d");
  const before = [await symbols(), await line()];
  await type("B4", "lost");
  await panel.getByText("Fuel A, measured has gaps where its cells hold 1 text.").waitFor();
  expect((await symbols())?.match(/M/g)).toHaveLength(4);
  expect(await line()).toBe(before[1]);
  await type("B4", "5.9");
  await page.waitForFunction((d) => document.querySelector(".chart-symbol")?.getAttribute("d") === d, before[0]);
  await type("A6", "1.08"); // the calculated pressure of this row is a formula of the ratio
  await page.waitForFunction((d) => document.querySelector(".chart-line")?.getAttribute("d") !== d, before[1]);
  await panel.getByText("Figures as a table").click();
  const rows = await panel.getByRole("row").allTextContents();
  expect(rows).toHaveLength(6);
  expect(rows[3]).toMatch(/^1\.088\.19\.2–/); // ratio, measured and calculated pressure of the first fuel, the second's lost run
});

test("the charts open and close by keyboard, and change with the sheet", async () => {
  const path = join(downloads, "charts.xlsx");
  writeFileSync(path, chartBook());
  await open(path);
  const panel = page.getByRole("region", { name: "Charts of this sheet" });
  const toggle = panel.getByRole("button");
  await panel.getByRole("img").waitFor();
  await toggle.focus();
  await page.keyboard.press("Enter");
  expect(await toggle.getAttribute("aria-expanded")).toBe("false");
  expect(await panel.getByRole("img").count()).toBe(0);
  await page.keyboard.press("Enter");
  await panel.getByRole("img").waitFor();
  await panel.locator("summary").focus();
  await page.keyboard.press("Escape");
  expect(await toggle.evaluate((button) => button === document.activeElement)).toBe(true);
  expect(await toggle.getAttribute("aria-expanded")).toBe("false");
  await page.keyboard.press("Enter");
  await page.locator(".o-sheet", { hasText: "Comparison" }).click();
  await panel.getByRole("img", { name: /^Measured against calculated/ }).waitFor();
  const pane = page.getByRole("button", { name: "Pane", exact: true });
  await pane.click(); // on a narrow page the open pane takes the charts' place
  for (const width of [320, 380]) {
    await page.setViewportSize({ width, height: 700 });
    await panel.getByRole("img").waitFor();
    const widths = await page.evaluate(() =>
      [document.documentElement, document.querySelector("#charts-body")].map((box) => box!.scrollWidth),
    );
    expect(Math.max(...widths)).toBeLessThanOrEqual(width);
  }
  await page.setViewportSize({ width: 1200, height: 800 });
  await pane.click();
  await page.locator(".o-sheet", { hasText: "Remarks" }).click();
  await page.waitForFunction(() => document.querySelector<HTMLElement>("#charts")?.hidden);
});

test("the laboratory's workbook opens from the list of samples, every sheet live", async () => {
  await page.getByRole("button", { name: "Samples" }).click();
  await page.locator("#samples button").nth(1).click();
  await page.waitForFunction((line) => document.querySelector(line)?.textContent === "B3 empty", CELL);
  await page.waitForFunction(() => document.querySelector("#book")?.textContent === "fuel-laboratory.xlsx");
  await page.locator(".o-sheet", { hasText: "Results" }).click();
  const gross = Number(await read("B27"));
  const [hydrogen, oxygen, nitrogen] = [Number(await read("B11")), Number(await read("C11")), Number(await read("D11"))];
  await type("C6", "12");
  expect(await read("F27")).toBe(String(direct("FUEL.NET", gross, hydrogen, oxygen, nitrogen, 12, "constant-pressure", "iso-1928-2009")));
  await page.locator(".o-sheet", { hasText: "Certificate" }).click();
  expect(await read("B11")).toBe("12");
});

test("leaving a changed workbook asks first", async () => {
  await type("G5", "1");
  await page.getByRole("button", { name: "New", exact: true }).click();
  await page.getByRole("button", { name: "Keep working" }).click();
  expect(await read("G5")).toBe("1");
  await page.getByRole("button", { name: "New", exact: true }).click();
  await page.getByRole("button", { name: "Discard the changes" }).click();
  await page.waitForFunction(() => document.querySelector("#book")?.textContent === "workbook.xlsx");
  expect(await read("G5")).toBe("empty");
});

test("a new workbook with an inserted row and a format is saved anew and opens again", async () => {
  await page.getByRole("button", { name: "New", exact: true }).click();
  await type("A1", "3");
  await type("A2", '=A1*STILL.MOLARMASS("N2")');
  await type("B1", "25%");
  await page.getByText("Insert", { exact: true }).click();
  await page.locator("[data-name=insert_row]").hover();
  await page.locator("[data-name=insert_row_before]").click();
  const value = await read("A3");
  const path = await save("rebuilt.xlsx");
  await open(path);
  expect(await read("A3")).toBe(value);
  expect(await read("B2")).toBe("0.25");
});

test("a workbook dropped on the page is opened", async () => {
  const bytes = [...readFileSync(join(__dirname, "..", "book", "fixtures", "libreoffice-made.xlsx"))];
  const dropped = await page.evaluateHandle((content) => {
    const data = new DataTransfer();
    data.items.add(new File([new Uint8Array(content)], "dropped.xlsx"));
    return data;
  }, bytes);
  await page.dispatchEvent("#sheet", "dragenter", { dataTransfer: dropped });
  expect(await page.isVisible("#drop-hint")).toBe(true);
  await page.dispatchEvent("#sheet", "drop", { dataTransfer: dropped });
  await page.waitForFunction(() => document.querySelector("#book")?.textContent === "dropped.xlsx");
  expect(await page.isVisible("#drop-hint")).toBe(false);
});

test("a file that is no workbook is refused in one sentence", async () => {
  const [chooser] = await Promise.all([page.waitForEvent("filechooser"), page.getByRole("button", { name: "Open…" }).click()]);
  await chooser.setFiles({ name: "notes.xlsx", mimeType: "text/plain", buffer: Buffer.from("not a workbook") });
  await page.getByRole("alert").getByText("notes.xlsx could not be opened: ").waitFor();
});

test.each([320, 380, 1200])("nothing is wider than a window of %i px, light or dark", async (width) => {
  await page.setViewportSize({ width, height: 700 });
  for (const name of ["Switch to dark", "Switch to light"]) {
    await page.getByRole("button", { name }).click();
    const widths = await page.evaluate(() => [document.documentElement.scrollWidth, window.innerWidth]);
    expect(widths[0]).toBeLessThanOrEqual(widths[1] as number);
  }
});

function differingParts(one: string, other: string): string[] {
  const [before, after] = [readPackage(readFileSync(one)), readPackage(readFileSync(other))] as const;
  expect(after.names).toEqual(before.names);
  return before.names.filter((name) => !Buffer.from(before.bytes(name)).equals(Buffer.from(after.bytes(name))));
}
