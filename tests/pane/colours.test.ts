import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { contrast, DARKEST_ALLOWED, luminance, PALEST_ALLOWED, themeOf } from "../../src/pane/colour";

const PANE = join(__dirname, "../../src/pane");
const sheets = readdirSync(PANE).filter((name) => name.endsWith(".css"));
const css = sheets.map((name) => readFileSync(join(PANE, name), "utf8")).join("\n");

/** The colour variables of the rule that starts with `selector`. */
function palette(selector: string): Map<string, number> {
  const rule = css.slice(css.indexOf(`${selector} {`), css.indexOf("}", css.indexOf(`${selector} {`)));
  return new Map(
    [...rule.matchAll(/--still-([\w-]+): (#[0-9a-f]+);/g)].map(([, name = "", colour = ""]) => [name, luminance(colour) ?? NaN]),
  );
}

const TEXTS = ["ink", "muted", "accent", "refusal", "caution"];
const CURVES = [0, 1, 2, 3, 4].map((index) => `curve-${index}`);

describe.each([
  ["light", ".still-pane", PALEST_ALLOWED],
  ["dark", '.still-pane[data-theme="dark"]', DARKEST_ALLOWED],
])("%s", (_theme, selector, surround) => {
  const colours = palette(selector);
  const of = (name: string) => colours.get(name) ?? NaN;
  const tooFaint = (names: readonly string[], ground: number) => names.filter((name) => !(contrast(of(name), ground) >= 4.5));

  test.each(["paper", "panel", "wash"])("every text reads on %s with 4.5 : 1 (WCAG 2, 1.4.3)", (ground) => {
    expect(tooFaint(["ink", "muted", "accent"], of(ground))).toEqual([]);
  });

  test("texts and curves read on the most extreme background taken over from the host", () => {
    expect(tooFaint([...TEXTS, ...CURVES], surround)).toEqual([]);
  });

  test("refusal on its panel, caution on its paper and in a table, button text on its button", () => {
    expect(contrast(of("refusal"), of("panel"))).toBeGreaterThanOrEqual(4.5);
    expect(contrast(of("caution"), of("caution-paper"))).toBeGreaterThanOrEqual(4.5);
    expect(contrast(of("caution"), of("panel"))).toBeGreaterThanOrEqual(4.5);
    expect(contrast(of("on-accent"), of("accent"))).toBeGreaterThanOrEqual(4.5);
  });

  test("edges of controls stand out with 3 : 1 (WCAG 2, 1.4.11)", () => {
    expect(contrast(of("edge"), of("paper"))).toBeGreaterThanOrEqual(3);
  });
});

test("luminance and contrast by the definition", () => {
  expect(luminance("#fff")).toBeCloseTo(1, 12);
  expect(luminance("#000000")).toBe(0);
  expect(contrast(1, 0)).toBe(21);
  // #767676 is the lightest grey with 4.5 : 1 on white: 4.54 (WCAG 2 technique G18 gives the formula).
  expect(contrast(1, luminance("#767676") ?? NaN)).toBeCloseTo(4.54, 2);
  expect(luminance("rgb(0,0,0)")).toBeUndefined();
});

test("the host's background decides the theme and is worn only where texts stay readable", () => {
  expect(themeOf("#FFFFFF")).toEqual({ theme: "light", wearable: true });
  expect(themeOf("#262626")).toEqual({ theme: "dark", wearable: true });
  expect(themeOf("#6a6a6a")).toEqual({ theme: "dark", wearable: false });
  expect(themeOf("#c8c8c8")).toEqual({ theme: "light", wearable: false });
  expect(themeOf("window")).toBeUndefined();
});

test("pane.css brings in every other style sheet of the pane", () => {
  const brought = [...readFileSync(join(PANE, "pane.css"), "utf8").matchAll(/@import url\("(.+)"\);/g)].map(([, name]) => name);
  expect([...brought, "pane.css"].sort()).toEqual(sheets.sort());
});

test("no rule reaches outside the pane", () => {
  const rules = css.replace(/\/\*[^]*?\*\//g, "").match(/^\s*[^@{}\s][^{}]*(?=\{)/gm) ?? [];
  expect(rules.length).toBeGreaterThan(50);
  for (const rule of rules)
    for (const selector of rule.split(/,(?![^(]*\))/)) expect(selector.trim()).toMatch(/^(textarea)?\.still-|^\S+:\s/);
});
