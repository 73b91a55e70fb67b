/** The built add-in's pane in a real browser: with office.js served, blocked, silent, and with no host. */
import type { Server } from "node:http";
import { chromium, type Browser, type Page } from "playwright-core";
import "../../src/functions";
import { registry } from "../../src/functions/registry";
import { findBrowser, NO_BROWSER } from "../../src/build/browser.mjs";
import { ensureAddin, serveAddin } from "./addin-server";
import { fakeOffice, type FakeBook, type FakeOffice } from "./fake-office";

const FLAGS = [
  "--headless",
  "--no-sandbox",
  "--disable-gpu",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
  "--no-first-run",
];
const OFFICE = "https://appsforoffice.microsoft.com/**";

let browser: Browser;
let server: Server;
let address: string;
let complaints: string[];

jest.setTimeout(60000);

beforeAll(async () => {
  const executablePath = findBrowser();
  if (!executablePath) throw new Error(NO_BROWSER);
  ensureAddin();
  ({ address, server } = await serveAddin());
  browser = await chromium.launch({ executablePath, args: FLAGS });
}, 180000);

afterAll(async () => {
  await browser?.close();
  await new Promise((closed) => server?.close(closed));
});

afterEach(async () => {
  for (const context of browser.contexts()) await context.close();
});

/** Opens the pane; `office` undefined blocks office.js. Whatever the page complains about is collected. */
async function open(office?: FakeOffice, view: { width?: number; colorScheme?: "light" | "dark" } = {}): Promise<Page> {
  const context = await browser.newContext({
    viewport: { width: view.width ?? 380, height: 800 },
    colorScheme: view.colorScheme ?? "light",
  });
  const page = await context.newPage();
  complaints = [];
  page.on("pageerror", (error) => complaints.push(error.message));
  page.on("console", (message) => {
    if (message.type() === "error" && !message.text().includes("net::ERR_FAILED")) complaints.push(message.text());
  });
  await page.route(OFFICE, (route) =>
    office ? route.fulfill({ contentType: "text/javascript", body: fakeOffice(office) }) : route.abort(),
  );
  await page.goto(`${address}/taskpane.html`);
  await page.waitForSelector("[role=combobox]");
  return page;
}

const EXCEL: FakeOffice = { host: "Excel" };
const status = (page: Page) => page.locator(".still-status").textContent();
const formula = (page: Page) => page.locator(".still-formula").textContent();
const preview = (page: Page) => page.locator(".still-preview").textContent();
const search = (page: Page) => page.getByRole("combobox", { name: "Species or mixture" });
const insertButton = (page: Page) => page.getByRole("button", { name: /^Insert/ });

/** Reads from or acts on the fake workbook. */
const cellsOf = (page: Page) => page.evaluate(() => (window as unknown as { book: FakeBook }).book.cells);

describe("the search by keyboard", () => {
  test("types, walks down, takes with Enter; the count and the choice are announced", async () => {
    const page = await open();
    await search(page).focus();
    await page.keyboard.type("carbon dio");
    await expect(page.locator(".still-count").textContent()).resolves.toMatch(/^\d+ substances? found\.$/);
    expect(await search(page).getAttribute("aria-expanded")).toBe("true");
    await page.keyboard.press("ArrowDown");
    const active = await search(page).getAttribute("aria-activedescendant");
    expect(await page.locator(`[id="${active}"]`).getAttribute("aria-selected")).toBe("true");
    expect(await page.locator(`[id="${active}"]`).textContent()).toContain("carbon dioxide");
    await page.keyboard.press("Enter");
    expect(await page.locator(".still-identity h2").textContent()).toBe("carbon dioxide");
    expect(await search(page).getAttribute("aria-expanded")).toBe("false");
    expect(await page.locator(".still-count").textContent()).toMatch(/^carbon dioxide: \d sets, first choice nasa-2002\.$/);
    expect(complaints).toEqual([]);
  });

  test("Escape closes the list, then clears the field", async () => {
    const page = await open();
    await search(page).fill("eth");
    expect(await page.getByRole("listbox").isVisible()).toBe(true);
    await page.keyboard.press("Escape");
    expect(await page.getByRole("listbox").isVisible()).toBe(false);
    expect(await search(page).inputValue()).toBe("eth");
    await page.keyboard.press("Escape");
    expect(await search(page).inputValue()).toBe("");
  });

  test("what the library lacks is answered with its sentence", async () => {
    const page = await open();
    await search(page).fill("C");
    await page.keyboard.press("Escape");
    await page.keyboard.press("Enter");
    expect(await page.locator(".still-count").textContent()).toContain("C(gr)");
    expect(await page.locator(".still-identity h2").textContent()).toBe("nitrogen");
  });

  test("a click takes a species too, and a mixture shows its parts", async () => {
    const page = await open();
    await search(page).fill("air");
    await page.getByRole("option").first().click();
    expect(await page.locator(".still-identity h2").textContent()).toBe("air");
    expect(await page.locator(".still-identity tbody tr").count()).toBe(4);
    expect(await formula(page)).toBe('=STILL.CV.AT("air",298.15)');
  });
});

describe("the chosen species", () => {
  test("shows its sets in order with grade, reference, citation; the first choice is marked", async () => {
    const page = await open();
    const sets = page.locator(".still-set");
    expect(await sets.first().textContent()).toContain("first choice");
    expect(await page.locator(".still-first").count()).toBe(1);
    expect(await sets.first().textContent()).toMatch(/grade [ABC].*Reference.*Source.*NASA\/TP-2002-211556/s);
    expect(await sets.count()).toBeGreaterThan(1);
  });

  test("has a chart with one curve a set, named axes and the two classical limits", async () => {
    const page = await open();
    await page.waitForSelector(".still-drawing");
    const sets = await page.locator(".still-set-id").allTextContents();
    expect(
      await page.locator(".still-drawing polyline").evaluateAll((lines) => lines.map((line) => (line as SVGElement).dataset.set)),
    ).toEqual(sets);
    const words = await page.locator(".still-drawing text").allTextContents();
    for (const word of ["Cv, J/(mol K)", "temperature, K", "vibrations frozen 20.79", "fully excited 29.1"]) expect(words).toContain(word);
  });

  test("the reading follows field and slider, and says what lies outside", async () => {
    const page = await open();
    await page.getByLabel("Read at").fill("500");
    expect(await page.locator(".still-legend tbody tr").first().textContent()).toMatch(/nasa-2002\s*21\.26\d\d/);
    await page.getByRole("slider").focus();
    await page.keyboard.press("ArrowRight");
    expect(await page.getByLabel("Read at").inputValue()).toBe("501");
    await page.getByLabel("Read at").fill("50");
    expect(await page.locator(".still-legend tbody tr").first().textContent()).toContain("outside 200 to");
  });

  test("differences of the sets can be drawn, and all values read as a table", async () => {
    const page = await open();
    await page.getByLabel("What the chart shows").selectOption("differences");
    expect(await page.locator(".still-axis-name").first().textContent()).toBe("difference from nasa-2002, %");
    await page.getByText("Values as a table").click();
    expect(await page.locator(".still-values tbody tr").count()).toBeGreaterThan(3);
    expect(await page.locator(".still-values tbody th").first().textContent()).toBe("298.15");
  });
});

describe("the formula", () => {
  test("a temperature outside the range shows the refusal of the cell and cannot be inserted", async () => {
    const page = await open(EXCEL);
    await page.getByLabel("Temperature").first().fill("-5");
    expect(await preview(page)).toMatch(/-5 K/);
    expect(await page.locator(".still-preview").getAttribute("data-kind")).toBe("refused");
    expect(await insertButton(page).isDisabled()).toBe(true);
    await page.locator("[data-field=set]").selectOption("gri-1999");
    await page.locator("[data-field=temperature]").fill("5200");
    expect(await preview(page)).toBe("Temperature 5200 K is above 5000 K, the upper limit of gri-1999 for N2");
  });

  test("is inserted into the selected cell of Excel, with the set the user chose", async () => {
    const page = await open(EXCEL);
    await page.locator("[data-field=temperature]").fill("500");
    await page.locator(".still-set summary").nth(1).click();
    await page.locator(".still-set").nth(1).getByRole("button", { name: "Use in the formula" }).click();
    const set = await page.locator(".still-set-id").nth(1).textContent();
    expect(await preview(page)).toMatch(/^= 21\.26\d+ J\/\(mol K\)$/);
    await insertButton(page).click();
    await page.waitForFunction(() => document.querySelector(".still-status")?.textContent?.includes("inserted"));
    const expected = `=STILL.CV.AT("N2",500,,"${set}")`;
    expect((await cellsOf(page))["Sheet1!A1"]).toBe(expected);
    expect(await status(page)).toBe(`${expected} inserted into Sheet1!A1.`);
    expect(complaints).toEqual([]);
  });

  test("the button follows the selection and warns of a full cell and of a formula that feeds on itself", async () => {
    const page = await open(EXCEL);
    await page.evaluate(() => (window as unknown as { book: FakeBook }).book.select("Sheet1!B4"));
    expect(await insertButton(page).textContent()).toBe("Insert into Sheet1!B4");
    expect(await page.locator(".still-advice").textContent()).toBe("Sheet1!B4 is not empty; its content will be replaced.");
    await page.locator("[data-field=temperature]").fill("A1:B9");
    expect(await formula(page)).toBe('=STILL.CV.AT("N2",A1:B9)');
    expect(await page.locator(".still-advice").textContent()).toContain("would refer to Sheet1!B4");
  });

  test("what Excel refuses is said in a sentence", async () => {
    const page = await open(EXCEL);
    await page.evaluate(() => ((window as unknown as { book: FakeBook }).book.failWith = "AccessDenied"));
    await insertButton(page).click();
    await page.waitForFunction(() => document.querySelector(".still-status")?.textContent !== "");
    expect(await status(page)).toBe("The sheet is protected: unprotect it or select another cell.");
    expect((await cellsOf(page))["Sheet1!A1"]).toBe("");
  });

  test("what was typed outlives a change of function; heat shows its caution", async () => {
    const page = await open(EXCEL);
    await page.locator("[data-field=temperature]").fill("25 °C");
    await page.getByLabel("Function").selectOption("ENERGY");
    expect(await formula(page)).toBe('=STILL.ENERGY("N2","25 °C")');
    expect(await page.locator(".still-caution").isVisible()).toBe(false);
    await page.getByLabel("Function").selectOption("HEAT");
    expect(await page.locator(".still-caution").textContent()).toContain("licensed practice govern");
  });

  test("a liquid starts with Cp", async () => {
    const page = await open();
    await search(page).fill("H2O(l)");
    await page.keyboard.press("Enter");
    expect(await formula(page)).toMatch(/^=STILL\.CP\.AT\("H2O\(l\)",298\.15\)$/);
    expect(await page.locator(".still-axis-name").first().textContent()).toBe("Cp, J/(mol K)");
  });
});

describe("the laboratory", () => {
  const tab = (page: Page, name: string) => page.getByRole("tab", { name });
  const laboratory = (page: Page) => page.getByRole("tabpanel", { name: "Vessels and runs" });
  const field = (page: Page, name: string) => laboratory(page).locator(`[data-field=${name}]`);
  const valueOf = (page: Page) => laboratory(page).locator(".still-preview").textContent();
  const formulaOf = (page: Page) => laboratory(page).locator(".still-formula").textContent();

  /** Opens the pane with a function of the laboratory and fills its fields. */
  async function openLaboratory(id: string, typed: Record<string, string> = {}, view: { width?: number } = {}): Promise<Page> {
    const page = await open(EXCEL, view);
    await tab(page, "Vessels and runs").click();
    await laboratory(page).getByLabel("Function").selectOption(id);
    for (const [name, value] of Object.entries(typed)) await field(page, name).fill(value);
    return page;
  }

  const RUN = { equivalent: "10200", rise: "2.75", mass: "1", heats: "{50,30,42}", sulfur_heat: "112.9" };

  test("is reached by keyboard through the tabs; what was chosen before stays as it was", async () => {
    const page = await open(EXCEL);
    await page.locator("[data-field=temperature]").fill("500");
    expect(await laboratory(page).count()).toBe(0);
    await tab(page, "Substance").focus();
    await page.keyboard.press("ArrowRight");
    expect(await page.evaluate(() => document.activeElement?.textContent)).toBe("Vessels and runs");
    expect(await tab(page, "Vessels and runs").getAttribute("aria-selected")).toBe("true");
    expect(await tab(page, "Substance").getAttribute("tabindex")).toBe("-1");
    expect(await search(page).count()).toBe(0);
    await page.keyboard.press("Tab");
    expect(await page.evaluate(() => document.activeElement?.className)).toBe("still-function");
    await page.keyboard.press("Shift+Tab");
    await page.keyboard.press("ArrowRight");
    expect(await laboratory(page).count()).toBe(0);
    expect(await page.locator("[data-field=temperature]:visible").inputValue()).toBe("500");
    await page.keyboard.press("End");
    expect(await laboratory(page).isVisible()).toBe(true);
    await page.keyboard.press("Home");
    expect(await search(page).isVisible()).toBe(true);
    expect(complaints).toEqual([]);
  });

  test("the gross value of a run is the function's own number, and its formula goes into the selected cell", async () => {
    const page = await openLaboratory("CAL.GROSS", RUN);
    const value = registry.get("CAL.GROSS")?.([[10200]], [[2.75]], [[1]], [[50, 30, 42]], [[112.9]])[0]?.[0] as number;
    expect(await valueOf(page)).toBe(`= ${Number(value.toPrecision(12))} J/g`);
    const expected = "=STILL.CAL.GROSS(10200,2.75,1,{50,30,42},112.9)";
    expect(await formulaOf(page)).toBe(expected);
    await laboratory(page).getByRole("button", { name: "Insert into Sheet1!A1" }).click();
    await laboratory(page).locator(".still-status", { hasText: "inserted" }).waitFor();
    expect((await cellsOf(page))["Sheet1!A1"]).toBe(expected);
    expect(await laboratory(page).locator(".still-status").textContent()).toBe(`${expected} inserted into Sheet1!A1.`);
    expect(complaints).toEqual([]);
  });

  test("the refusal of the cell is shown and cannot be inserted; nor can what still lacks an argument", async () => {
    const page = await openLaboratory("CAL.GROSS", { ...RUN, equivalent: "10.2" });
    const insert = laboratory(page).getByRole("button", { name: /^Insert/ });
    expect(await valueOf(page)).toBe('Energy equivalent 10.2 J/K is below 50 J/K: say "10.2 kJ/K"');
    expect(await laboratory(page).locator(".still-preview").getAttribute("data-kind")).toBe("refused");
    expect(await insert.isDisabled()).toBe(true);
    await field(page, "equivalent").fill("");
    expect(await valueOf(page)).toBe("Equivalent is needed, in J/K or with its unit.");
    expect(await insert.isDisabled()).toBe(true);
  });

  test("ranges are left to the sheet, and a formula that would feed on itself is pointed out", async () => {
    const page = await openLaboratory("CAL.RISE", { times: "B2:B40", temperatures: "C2:C40", fire: "5" });
    expect(await formulaOf(page)).toBe("=STILL.CAL.RISE(B2:B40,C2:C40,5)");
    expect(await valueOf(page)).toBe("An argument is a cell: the sheet works out the value.");
    await page.evaluate(() => (window as unknown as { book: FakeBook }).book.select("Sheet1!B4"));
    expect(await laboratory(page).locator(".still-advice").textContent()).toContain("would refer to Sheet1!B4");
    await field(page, "time_unit").fill("s");
    expect(
      await laboratory(page)
        .locator(".still-field", { has: page.locator("[data-field=times]") })
        .locator(".still-unit")
        .textContent(),
    ).toBe("s");
  });

  test("words are chosen from a list; a table shows its lines; sources and caution stand below", async () => {
    const page = await openLaboratory("CAL.ACIDS", { total_acid: "11.737", concentration: "0.1", sulfur_percent: "1.2", mass: "0.9" });
    expect(await valueOf(page)).toBe("Convention is needed.");
    await field(page, "convention").selectOption("separated");
    const rows = laboratory(page).locator(".still-preview tr");
    const block = registry.get("CAL.ACIDS")?.([[11.737]], [[0.1]], [[1.2]], [[0.9]], [["separated"]]) ?? [];
    expect(await rows.count()).toBeGreaterThanOrEqual(8);
    expect(await rows.first().textContent()).toBe(`${block[0]?.[0]}${Number((block[0]?.[1] as number).toPrecision(8))} ${block[0]?.[2]}`);
    expect(await laboratory(page).locator(".still-citations li").allTextContents()).toHaveLength(2);
    expect(await laboratory(page).locator(".still-citations").textContent()).toContain("ISO 1928");
    expect(await laboratory(page).locator(".still-caution").textContent()).toContain("licensed practice govern");
  });

  test("many optional fields are folded; a value in one of them is not hidden by a change of function", async () => {
    const page = await openLaboratory("CAL.STANDARD");
    expect(await field(page, "density").isVisible()).toBe(false);
    await page.getByText("More: 5 optional").click();
    await field(page, "density").fill("1.32");
    await laboratory(page).getByLabel("Function").selectOption("CAL.BUOYANCY");
    expect(await field(page, "density").inputValue()).toBe("");
    await laboratory(page).getByLabel("Function").selectOption("CAL.STANDARD");
    expect(await field(page, "density").isVisible()).toBe(true);
    expect(await field(page, "density").inputValue()).toBe("1.32");
  });

  test.each([320, 380, 1200])("nothing runs out of a pane %i px wide, and every control has a name", async (width) => {
    const page = await openLaboratory("CAL.STANDARD", {}, { width });
    await page.getByText("More: 5 optional").click();
    const ids = await laboratory(page)
      .locator(".still-function option")
      .evaluateAll((options) => options.map((option) => (option as HTMLOptionElement).value));
    expect(ids.length).toBeGreaterThan(20);
    for (const id of ids) {
      await laboratory(page).getByLabel("Function").selectOption(id);
      expect([id, await page.evaluate(() => document.documentElement.scrollWidth)]).toEqual([id, width]);
      const nameless = await laboratory(page)
        .locator("input, select, button")
        .evaluateAll((controls) => controls.filter((one) => !(one as HTMLInputElement).labels?.length && !one.textContent?.trim()).length);
      expect([id, nameless]).toEqual([id, 0]);
    }
    expect(await page.locator("#pane [style]").count()).toBe(0);
  });
});

describe("the host", () => {
  test.each([
    ["office.js blocked", undefined],
    ["office.js without a host", { host: "none" } as const],
  ])("%s: the pane works and offers to copy", async (_name, office) => {
    const page = await open(office);
    expect(await insertButton(page).count()).toBe(0);
    expect(await page.getByRole("button", { name: "Copy" }).isVisible()).toBe(true);
    expect(await page.locator(".still-advice").textContent()).toContain("No workbook here");
    expect(await preview(page)).toMatch(/^= 20\.8\d+ J\/\(mol K\)$/);
    expect(complaints).toEqual([]);
  });

  test("the formula reaches the clipboard", async () => {
    const page = await open();
    await page.context().grantPermissions(["clipboard-read", "clipboard-write"]);
    await page.getByRole("button", { name: "Copy" }).click();
    await page.waitForFunction(() => document.querySelector(".still-status")?.textContent?.includes("copied"));
    expect(await page.evaluate(() => navigator.clipboard.readText())).toBe('=STILL.CV.AT("N2",298.15)');
  });

  test("an Office that does not answer leaves the pane usable, and is taken when it does", async () => {
    const page = await open({ host: "silent" });
    expect(await insertButton(page).count()).toBe(0);
    await page.evaluate(() => (window as unknown as { book: FakeBook }).book.answer());
    await insertButton(page).waitFor();
    expect(await page.locator(".still-search").count()).toBe(1);
  });

  test("wears the host's theme, and the system's where there is no host", async () => {
    const theme = (page: Page) => page.locator("#pane").getAttribute("data-theme");
    expect(await theme(await open({ host: "Excel", background: "#262626" }))).toBe("dark");
    expect(await theme(await open({ host: "Excel", background: "#FFFFFF" }, { colorScheme: "dark" }))).toBe("light");
    expect(await theme(await open(undefined, { colorScheme: "dark" }))).toBe("dark");
  });
});

describe("the layout", () => {
  test.each([320, 380, 1200])("nothing runs out of a pane %i px wide", async (width) => {
    const page = await open(undefined, { width });
    await page.waitForSelector(".still-drawing");
    await page.locator(".still-values summary").click();
    for (const id of ["CV.AT", "HEAT.FINALTEMP", "SOURCE.SETS"]) {
      await page.getByLabel("Function").selectOption(id);
      expect([id, await page.evaluate(() => document.documentElement.scrollWidth)]).toEqual([id, width]);
    }
  });

  test("the host's corner stays free: nothing of the pane lies in the upper right 34 × 32 px", async () => {
    const page = await open(EXCEL, { width: 320 });
    const inCorner = await page.evaluate(() => {
      const ranges = [...document.querySelectorAll(".still-pane *")].filter(
        (part) => part.childElementCount === 0 && part.textContent !== "",
      );
      return ranges
        .filter((part) => {
          const range = document.createRange();
          range.selectNodeContents(part);
          return [...range.getClientRects()].some((box) => box.right > innerWidth - 34 && box.top < 32);
        })
        .map((part) => part.textContent);
    });
    expect(inCorner).toEqual([]);
  });

  test("no element carries an inline style, every control has a name", async () => {
    const page = await open(EXCEL);
    expect(await page.locator("#pane [style]").count()).toBe(0);
    const nameless = await page.evaluate(() =>
      [...document.querySelectorAll<HTMLInputElement>("#pane :is(input, select, button)")]
        .filter((control) => !control.labels?.length && !control.getAttribute("aria-label") && !control.textContent?.trim())
        .map((control) => control.outerHTML),
    );
    expect(nameless).toEqual([]);
  });
});
