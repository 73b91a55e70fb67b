import { strToU8, unzipSync, zipSync } from "fflate";
import { readZip, unpack } from "../../../src/book/container/zip";
import { writeZip } from "../../../src/book/container/zipwrite";
import { crc32 } from "../../../src/book/container/crc32";
import { refusalOf } from "../packages";

const long = "heat at constant volume ".repeat(500);
const sample = () => {
  const bytes = zipSync(
    {
      "b.xml": strToU8(long),
      "a.xml": [strToU8("kept"), { level: 0 }],
      "z/ä.bin": [new Uint8Array(3000).map((_, i) => i * 7), { comment: "a note" }],
    },
    { mtime: new Date(2031, 4, 17, 12, 30) },
  );
  bytes[bytes.length - 2] = "whole".length; // length of the comment of the whole file, which follows
  return new Uint8Array([...bytes, ...strToU8("whole")]);
};

/** Local header to end of data of each entry, by name. */
const stored = (bytes: Uint8Array) =>
  new Map(readZip(bytes).entries.map((entry) => [entry.name, Buffer.from(entry.local).toString("hex")]));

test('the check sum is that of the published check value: CRC-32 of "123456789" is CBF43926', () => {
  expect(crc32(strToU8("123456789"))).toBe(0xcbf43926);
  expect(crc32(new Uint8Array(0))).toBe(0);
});

test("a file without edits comes back to the byte", () => {
  const bytes = sample();
  expect(Buffer.compare(Buffer.from(writeZip(readZip(bytes), new Map())), Buffer.from(bytes))).toBe(0);
});

test("an edited entry changes alone, in its place, with its time; the others keep their stored bytes", () => {
  const bytes = sample();
  const out = writeZip(readZip(bytes), new Map([["b.xml", strToU8("short")]]));
  const [before, after] = [stored(bytes), stored(out)];
  expect([...after.keys()]).toEqual(["b.xml", "a.xml", "z/ä.bin"]);
  expect(after.get("a.xml")).toBe(before.get("a.xml"));
  expect(after.get("z/ä.bin")).toBe(before.get("z/ä.bin"));
  expect(after.get("b.xml")).not.toBe(before.get("b.xml"));
  const [entry] = readZip(out).entries;
  expect(Buffer.from(entry!.central.subarray(12, 16))).toEqual(Buffer.from(readZip(bytes).entries[0]!.central.subarray(12, 16)));
  expect(unzipSync(out)["b.xml"]).toEqual(strToU8("short"));
  expect(new TextDecoder().decode(readZip(out).comment)).toBe("whole");
});

test("entries are removed and added at the end", () => {
  const out = writeZip(
    readZip(sample()),
    new Map([
      ["a.xml", null],
      ["new.xml", strToU8("<n/>")],
    ]),
  );
  expect(Object.keys(unzipSync(out))).toEqual(["b.xml", "z/ä.bin", "new.xml"]);
});

test("sizes that follow the data are read and copied", () => {
  // One stored entry with bit 3 set: zeros in the local header, then a descriptor of 16 bytes behind the data.
  const data = strToU8("follows");
  const local = new Uint8Array(30 + 1 + data.length + 16);
  const view = new DataView(local.buffer);
  view.setUint32(0, 0x04034b50, true);
  view.setUint16(6, 8, true);
  view.setUint16(26, 1, true);
  local.set(strToU8("d"), 30);
  local.set(data, 31);
  view.setUint32(31 + data.length, 0x08074b50, true);
  view.setUint32(35 + data.length, crc32(data), true);
  view.setUint32(39 + data.length, data.length, true);
  view.setUint32(43 + data.length, data.length, true);
  const central = new Uint8Array(47);
  const inCentral = new DataView(central.buffer);
  inCentral.setUint32(0, 0x02014b50, true);
  inCentral.setUint16(8, 8, true);
  inCentral.setUint32(16, crc32(data), true);
  inCentral.setUint32(20, data.length, true);
  inCentral.setUint32(24, data.length, true);
  inCentral.setUint16(28, 1, true);
  central.set(strToU8("d"), 46);
  const end = new Uint8Array(22);
  const inEnd = new DataView(end.buffer);
  inEnd.setUint32(0, 0x06054b50, true);
  inEnd.setUint16(8, 1, true);
  inEnd.setUint16(10, 1, true);
  inEnd.setUint32(12, central.length, true);
  inEnd.setUint32(16, local.length, true);
  const bytes = new Uint8Array([...local, ...central, ...end]);
  const file = readZip(bytes);
  expect(new TextDecoder().decode(unpack(file.entries[0]!))).toBe("follows");
  expect(Buffer.from(writeZip(file, new Map()))).toEqual(Buffer.from(bytes));
  expect(unzipSync(writeZip(file, new Map([["d", strToU8("x")]])))["d"]).toEqual(strToU8("x"));
});

test("a damaged file is refused wherever it is cut", () => {
  const bytes = sample();
  for (let length = 0; length < bytes.length; length += 7) {
    expect(() => readZip(bytes.subarray(0, length)).entries.forEach(unpack)).toThrow(expect.objectContaining({ kind: "input" }));
  }
});

test("a flipped byte in the data is found", () => {
  const bytes = sample();
  const [entry] = readZip(bytes).entries;
  const at = entry!.data.byteOffset - bytes.byteOffset + 20;
  const bad = bytes.slice();
  bad[at] = (bad[at] as number) ^ 0x55;
  expect(refusalOf(() => unpack(readZip(bad).entries[0]!))).toMatch(/part b\.xml (does not match its check sum|cannot be unpacked)/);
});

test("an entry that unpacks to more than it declares is not unfolded", () => {
  const bytes = sample();
  const entry = readZip(bytes).entries[0]!;
  expect(refusalOf(() => unpack({ ...entry, size: 10 }))).toContain("b.xml");
});
