// @ts-check
/**
 * Draws the icons: a closed, rounded vessel with a warm mark rising inside it. `node src/build/icons.mjs` writes assets/icons.
 * The shapes are signed distances in a square of side 1, y downwards; each pixel is the mean of a grid of samples.
 */
import { mkdirSync, writeFileSync } from "node:fs";
import { dirname, join, resolve } from "node:path";
import { fileURLToPath } from "node:url";
import { crc32, deflateSync } from "node:zlib";

export const ICON_SIZES = [16, 20, 24, 32, 40, 48, 64, 80];

/** @typedef {readonly [red: number, green: number, blue: number]} Colour */
/** @type {Colour} */ const WALL = [122, 56, 20];
/** @type {Colour} */ const INSIDE = [250, 244, 236];
/** @type {Colour} */ const WARM = [222, 122, 38];

/** Samples along each side of a pixel. */
const SAMPLES = 4;

/** Distance to a rectangle with round corners. @param {number} x @param {number} y @param {[number, number, number, number, number]} box centre, half sides, radius */
function roundBox(x, y, [cx, cy, halfWidth, halfHeight, radius]) {
  const dx = Math.abs(x - cx) - halfWidth + radius;
  const dy = Math.abs(y - cy) - halfHeight + radius;
  return Math.hypot(Math.max(dx, 0), Math.max(dy, 0)) + Math.min(Math.max(dx, dy), 0) - radius;
}

/** Distance to a rising wave: a vertical stroke whose middle line is one period of a sine. @param {number} x @param {number} y @param {number} middle */
function wave(x, y, middle) {
  const along = Math.min(Math.max(y, 0.42), 0.74);
  const line = middle + 0.045 * Math.sin(((along - 0.42) / 0.32) * 2 * Math.PI);
  return Math.hypot(x - line, y - along) - 0.042;
}

/** Colour at a point, or undefined outside. @param {number} x @param {number} y @returns {Colour | undefined} */
function colourAt(x, y) {
  const lid = roundBox(x, y, [0.5, 0.15, 0.2, 0.085, 0.05]);
  const body = roundBox(x, y, [0.5, 0.58, 0.4, 0.38, 0.22]);
  const hollow = roundBox(x, y, [0.5, 0.58, 0.3, 0.28, 0.13]);
  if (hollow < 0) return Math.min(wave(x, y, 0.38), wave(x, y, 0.62)) < 0 ? WARM : INSIDE;
  return Math.min(lid, body) < 0 ? WALL : undefined;
}

/** Red, green, blue and opacity of one pixel. @param {number} column @param {number} row @param {number} size */
function pixel(column, row, size) {
  const sum = [0, 0, 0];
  let hits = 0;
  for (let i = 0; i < SAMPLES * SAMPLES; i++) {
    const x = (column + ((i % SAMPLES) + 0.5) / SAMPLES) / size;
    const y = (row + (Math.floor(i / SAMPLES) + 0.5) / SAMPLES) / size;
    const colour = colourAt(x, y);
    if (!colour) continue;
    hits++;
    colour.forEach((part, at) => (sum[at] = (sum[at] ?? 0) + part));
  }
  const mean = sum.map((part) => (hits ? Math.round(part / hits) : 0));
  return [...mean, Math.round((255 * hits) / (SAMPLES * SAMPLES))];
}

/** One chunk of a PNG file. @param {string} type @param {Buffer} data */
function chunk(type, data) {
  const body = Buffer.concat([Buffer.from(type, "latin1"), data]);
  const frame = Buffer.alloc(8);
  frame.writeUInt32BE(data.length, 0);
  frame.writeUInt32BE(crc32(body), 4);
  return Buffer.concat([frame.subarray(0, 4), body, frame.subarray(4)]);
}

/** The icon as a PNG file (8 bits, colour with opacity). @param {number} size @returns {Buffer} */
export function icon(size) {
  const rows = Array.from({ length: size }, (_, row) => [
    0,
    ...Array.from({ length: size }, (_, column) => pixel(column, row, size)).flat(),
  ]);
  const header = Buffer.from([0, 0, 0, 0, 0, 0, 0, 0, 8, 6, 0, 0, 0]);
  header.writeUInt32BE(size, 0);
  header.writeUInt32BE(size, 4);
  const signature = Buffer.from([137, 80, 78, 71, 13, 10, 26, 10]);
  return Buffer.concat([
    signature,
    chunk("IHDR", header),
    chunk("IDAT", deflateSync(Buffer.from(rows.flat()), { level: 9 })),
    chunk("IEND", Buffer.alloc(0)),
  ]);
}

if (process.argv[1] && resolve(process.argv[1]) === fileURLToPath(import.meta.url)) {
  const folder = join(dirname(fileURLToPath(import.meta.url)), "..", "..", "assets", "icons");
  mkdirSync(folder, { recursive: true });
  for (const size of ICON_SIZES) writeFileSync(join(folder, `icon-${size}.png`), icon(size));
}
