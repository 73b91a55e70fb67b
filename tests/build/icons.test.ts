import { readFileSync } from "node:fs";
import { join } from "node:path";
import { inflateSync } from "node:zlib";
import { icon, ICON_SIZES } from "../../src/build/icons.mjs";
import { ROOT } from "./folders";

/** Rows of red, green, blue, opacity, without the filter byte. */
function pixels(png: Buffer): number[][][] {
  const size = png.readUInt32BE(16);
  const length = png.readUInt32BE(33);
  const bytes = [...inflateSync(png.subarray(41, 41 + length))];
  const width = 4 * size + 1;
  return Array.from({ length: size }, (_, row) =>
    Array.from({ length: size }, (_, column) => bytes.slice(row * width + 1 + 4 * column, row * width + 5 + 4 * column)),
  );
}

test.each(ICON_SIZES)("icon of %i px: drawn as committed", (size) => {
  const committed = readFileSync(join(ROOT, "assets", "icons", `icon-${size}.png`));
  expect([committed.readUInt32BE(16), committed.readUInt32BE(20)]).toEqual([size, size]);
  // The packed bytes may differ with the zlib of another Node; the pixels may not.
  expect(JSON.stringify(pixels(committed))).toBe(JSON.stringify(pixels(icon(size))));
});

test("the corners are empty, the wall is closed, and the warm mark is inside", () => {
  const rows = pixels(icon(80));
  for (const [row, column] of [
    [0, 0],
    [0, 79],
    [79, 0],
    [79, 79],
  ] as const)
    expect(rows[row]?.[column]?.[3]).toBe(0);
  for (const place of [10, 40, 70]) expect(rows[74]?.[place === 10 ? 20 : place === 70 ? 59 : place]?.[3]).toBe(255);
  const middle = rows[46] ?? [];
  const wall = middle.findIndex((pixel) => (pixel[3] ?? 0) === 255);
  expect(middle[wall + 2]).toEqual([122, 56, 20, 255]);
  expect(middle.some(([red = 0, , blue = 0]) => red > 200 && blue < 80)).toBe(true);
});
