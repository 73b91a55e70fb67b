/** The colours of the page's charts: readable in both themes, and in the light those of the samples' theme. */
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { ACCENTS } from "../../../src/build/sample-theme.mjs";
import { contrast, luminance } from "../../../src/pane/colour";

const read = (name: string) => readFileSync(join(__dirname, "../../../src/tryout", name), "utf8");
const charts = read("charts.css");
const page = read("page.css");

function rule(css: string, selector: string): string {
  const start = css.indexOf(`${selector} {`);
  expect(start).toBeGreaterThanOrEqual(0);
  return css.slice(start, css.indexOf("}", start));
}

const colour = (css: string, name: string) => new RegExp(`--${name}: (#\\w+);`).exec(css)?.[1] ?? "";
const light = (css: string, name: string) => luminance(colour(css, name)) ?? NaN;

describe.each([":root", ':root[data-theme="dark"]'])("%s", (selector) => {
  const [own, around] = [rule(charts, selector), rule(page, selector)];

  test("lines and symbols stand out from the panel with 4.5 : 1 (WCAG 2, 1.4.11 asks for 3 : 1)", () => {
    for (const number of [1, 2, 3, 4, 5, 6]) {
      expect(contrast(light(own, `chart-${number}`), light(around, "panel"))).toBeGreaterThanOrEqual(4.5);
    }
  });

  test("words and ticks read with 4.5 : 1 (WCAG 2, 1.4.3)", () => {
    for (const name of ["ink", "soft-ink"]) expect(contrast(light(around, name), light(around, "panel"))).toBeGreaterThanOrEqual(4.5);
  });
});

test("the accents of the samples' theme are the colours of the page in the light", () => {
  expect(ACCENTS.map((_, i) => colour(rule(charts, ":root"), `chart-${i + 1}`))).toEqual(ACCENTS.map((hex) => `#${hex.toLowerCase()}`));
});
