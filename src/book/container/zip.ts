/**
 * The zip container read entry by entry, without unpacking: each entry keeps the bytes it has in the file, so that an
 * entry nobody changed can be copied as it is. Layout from the zip application note: local headers with data, then the
 * central directory, then its end record; zip64 sizes are read where a writer used them.
 */
import { inflateSync } from "fflate";
import { refuse } from "../../core/refusal";
import { crc32 } from "./crc32";

export interface ZipEntry {
  /** Name as stored: `xl/workbook.xml`. */
  readonly name: string;
  /** 0 stored, 8 deflated; other methods are copied but cannot be read. */
  readonly method: number;
  readonly encrypted: boolean;
  readonly crc: number;
  readonly size: number;
  /** Local header, name, extra field, data and data descriptor, as in the file. */
  readonly local: Uint8Array;
  /** The compressed data within `local`. */
  readonly data: Uint8Array;
  /** Record of the central directory, as in the file. */
  readonly central: Uint8Array;
}

export interface ZipFile {
  readonly entries: readonly ZipEntry[];
  readonly comment: Uint8Array;
}

const END = 0x06054b50;
const CENTRAL = 0x02014b50;
const LOCAL = 0x04034b50;
const END64 = 0x06064b50;
const LOCATOR64 = 0x07064b50;
const damaged = (what: string): never => refuse(`The file is not a complete workbook package: ${what}`);

const viewOf = (bytes: Uint8Array) => new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);

/** Reads the directory of a zip file; refuses what is cut off or contradicts itself. */
export function readZip(bytes: Uint8Array): ZipFile {
  const view = viewOf(bytes);
  const end = endRecord(view);
  const { count, start } = directory(view, end);
  const records: CentralRecord[] = [];
  for (let at = start, i = 0; i < count; i++) {
    const record = centralRecord(bytes, view, at);
    records.push(record);
    at += record.bytes.length;
  }
  const stops = records
    .map((record) => record.offset)
    .concat(start)
    .sort((a, b) => a - b);
  return {
    entries: records.map((record) => entryOf(bytes, view, record, stops)),
    comment: bytes.slice(end + 22, end + 22 + view.getUint16(end + 20, true)),
  };
}

function endRecord(view: DataView): number {
  const last = view.byteLength - 22;
  for (let at = last; at >= 0 && at > last - 65536; at--) {
    if (view.getUint32(at, true) === END && at + 22 + view.getUint16(at + 20, true) <= view.byteLength) return at;
  }
  return damaged("its zip directory is missing, so the file is cut off or not a zip file");
}

function directory(view: DataView, end: number): { count: number; start: number } {
  let count = view.getUint16(end + 10, true);
  let start = view.getUint32(end + 16, true);
  const locator = end - 20;
  if (locator >= 0 && view.getUint32(locator, true) === LOCATOR64) {
    const end64 = number64(view, locator + 8);
    if (end64 + 56 > view.byteLength || view.getUint32(end64, true) !== END64) return damaged("its zip64 directory is damaged");
    count = number64(view, end64 + 32);
    start = number64(view, end64 + 48);
  }
  if (start > end) return damaged("its zip directory points behind its own end");
  return { count, start };
}

const number64 = (view: DataView, at: number): number => {
  if (at + 8 > view.byteLength) return damaged("a zip64 field is cut off");
  return Number(view.getBigUint64(at, true));
};

interface CentralRecord {
  readonly bytes: Uint8Array;
  readonly name: string;
  readonly flags: number;
  readonly packed: number;
  readonly size: number;
  readonly offset: number;
}

function centralRecord(bytes: Uint8Array, view: DataView, at: number): CentralRecord {
  if (at + 46 > bytes.length || view.getUint32(at, true) !== CENTRAL) return damaged("its zip directory is damaged");
  const nameLength = view.getUint16(at + 28, true);
  const extraLength = view.getUint16(at + 30, true);
  const length = 46 + nameLength + extraLength + view.getUint16(at + 32, true);
  if (at + length > bytes.length) return damaged("its zip directory is cut off");
  const record = bytes.subarray(at, at + length);
  const [size, packed, offset] = widened(record.subarray(46 + nameLength, 46 + nameLength + extraLength), [
    view.getUint32(at + 24, true),
    view.getUint32(at + 20, true),
    view.getUint32(at + 42, true),
  ]);
  const name = new TextDecoder().decode(record.subarray(46, 46 + nameLength));
  return { bytes: record, name, flags: view.getUint16(at + 8, true), packed, size, offset };
}

/** Replaces 32-bit sizes that are full by their zip64 values, which follow in the same order in extra field 1. */
function widened(extra: Uint8Array, values: [number, number, number]): [number, number, number] {
  const view = viewOf(extra);
  for (let at = 0; at + 4 <= extra.length; at += 4 + view.getUint16(at + 2, true)) {
    if (view.getUint16(at, true) !== 1) continue;
    let from = at + 4;
    return values.map((value) => {
      if (value !== 0xffffffff) return value;
      from += 8;
      return number64(view, from - 8);
    }) as [number, number, number];
  }
  return values;
}

function entryOf(bytes: Uint8Array, view: DataView, record: CentralRecord, stops: readonly number[]): ZipEntry {
  const { name, offset, packed, size, flags } = record;
  if (offset + 30 > bytes.length || view.getUint32(offset, true) !== LOCAL)
    return damaged(`the entry ${name} is not where the directory says`);
  const start = offset + 30 + view.getUint16(offset + 26, true) + view.getUint16(offset + 28, true);
  // What follows the data up to the next entry is its data descriptor, of 12 to 24 bytes; padding beyond that is dropped.
  const stop = firstFrom(stops, start + packed);
  if (stop === undefined) return damaged(`the entry ${name} overlaps another or is cut off`);
  const descriptor = flags & 8 ? Math.min(stop - start - packed, 24) : 0;
  const central = viewOf(record.bytes);
  return {
    name,
    size,
    method: central.getUint16(10, true),
    encrypted: (flags & 1) !== 0,
    crc: central.getUint32(16, true),
    local: bytes.subarray(offset, start + packed + descriptor),
    data: bytes.subarray(start, start + packed),
    central: record.bytes,
  };
}

/** The first of the sorted places at or behind `place`. */
function firstFrom(places: readonly number[], place: number): number | undefined {
  let low = 0;
  let high = places.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((places[middle] as number) < place) low = middle + 1;
    else high = middle;
  }
  return places[low];
}

/** The unpacked bytes of an entry, checked against its check sum. */
export function unpack(entry: ZipEntry): Uint8Array {
  if (entry.encrypted) refuse(`The part ${entry.name} is encrypted: save the workbook without a password first`);
  if (entry.method !== 0 && entry.method !== 8)
    refuse(`The part ${entry.name} is packed by method ${entry.method}; only stored and deflated parts can be read`);
  const bytes = entry.method === 0 ? entry.data : inflated(entry);
  if (bytes.length !== entry.size || crc32(bytes) !== entry.crc) return damaged(`the part ${entry.name} does not match its check sum`);
  return bytes;
}

function inflated(entry: ZipEntry): Uint8Array {
  try {
    // The output is as long as the directory declares, so that a part cannot unpack to more than was counted.
    return inflateSync(entry.data, { out: new Uint8Array(entry.size) });
  } catch {
    return damaged(`the part ${entry.name} cannot be unpacked`);
  }
}
