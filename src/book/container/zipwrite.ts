/**
 * Writes a zip container: entries that stay are copied as stored bytes, with their time, flags and extra fields;
 * a changed entry is packed anew in its old place; an entry that is new follows at the end.
 */
import { deflateSync } from "fflate";
import { refuse } from "../../core/refusal";
import { crc32 } from "./crc32";
import type { ZipEntry, ZipFile } from "./zip";

/** New bytes by entry name; null removes the entry. */
export type ZipEdits = ReadonlyMap<string, Uint8Array | null>;

interface Piece {
  readonly local: Uint8Array;
  readonly central: Uint8Array;
}

/** The bytes of the container with the edits applied. The same input gives the same bytes: no clock is read. */
export function writeZip(file: ZipFile, edits: ZipEdits): Uint8Array {
  const pieces: Piece[] = [];
  const old = new Set<string>();
  for (const entry of file.entries) {
    old.add(entry.name);
    const edit = edits.get(entry.name);
    if (edit === null) continue;
    pieces.push(edit === undefined ? copied(entry) : repacked(entry, edit));
  }
  for (const [name, bytes] of edits) if (bytes !== null && !old.has(name)) pieces.push(fresh(name, bytes));
  return assembled(pieces, file.comment);
}

const copied = (entry: ZipEntry): Piece => ({ local: entry.local, central: entry.central.slice() });

const viewOf = (bytes: Uint8Array) => new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);

function repacked(entry: ZipEntry, bytes: Uint8Array): Piece {
  const nameLength = viewOf(entry.central).getUint16(28, true);
  const extraLength = viewOf(entry.central).getUint16(30, true);
  const header = {
    ...viewFields(entry),
    name: entry.central.subarray(46, 46 + nameLength),
    tail: entry.central.subarray(46 + nameLength + extraLength),
  };
  return packed(header, bytes);
}

interface Header {
  readonly made: number;
  readonly flags: number;
  readonly time: number;
  readonly attributes: Uint8Array;
  readonly name: Uint8Array;
  /** Comment of the entry. */
  readonly tail: Uint8Array;
}

function viewFields(entry: ZipEntry): Pick<Header, "made" | "flags" | "time" | "attributes"> {
  const view = viewOf(entry.central);
  // Bit 3 (sizes follow the data) no longer holds; bits 1 and 2 only tell the packer's effort.
  return {
    made: view.getUint16(4, true),
    flags: view.getUint16(8, true) & 0x0800,
    time: view.getUint32(12, true),
    attributes: entry.central.subarray(36, 42),
  };
}

/** The earliest time the format can hold, 1980-01-01 00:00, as the usual spreadsheet program writes. */
const EPOCH = 0x00210000;

const fresh = (name: string, bytes: Uint8Array): Piece =>
  packed(
    { made: 20, flags: 0, time: EPOCH, attributes: new Uint8Array(6), name: new TextEncoder().encode(name), tail: new Uint8Array(0) },
    bytes,
  );

/** Effort of packing: 6 is the usual one; the largest sheets take 4, which costs a tenth in size and saves half the time. */
const effort = (bytes: Uint8Array) => (bytes.length > 4_000_000 ? 4 : 6);

function packed(header: Header, bytes: Uint8Array): Piece {
  const data = deflateSync(bytes, { level: effort(bytes) });
  const local = new Uint8Array(30 + header.name.length + data.length);
  const central = new Uint8Array(46 + header.name.length + header.tail.length);
  const inLocal = viewOf(local);
  const inCentral = viewOf(central);
  inLocal.setUint32(0, 0x04034b50, true);
  inCentral.setUint32(0, 0x02014b50, true);
  inCentral.setUint16(4, header.made, true);
  sharedFields(inLocal, 4, header, bytes, data.length);
  sharedFields(inCentral, 6, header, bytes, data.length);
  inCentral.setUint16(32, header.tail.length, true);
  central.set(header.attributes, 36);
  local.set(header.name, 30);
  local.set(data, 30 + header.name.length);
  central.set(header.name, 46);
  central.set(header.tail, 46 + header.name.length);
  return { local, central };
}

/** Version needed, flags, method, time, check sum, sizes and name length stand in the same order in both records. */
function sharedFields(view: DataView, at: number, header: Header, bytes: Uint8Array, packedLength: number): void {
  view.setUint16(at, 20, true);
  view.setUint16(at + 2, header.flags, true);
  view.setUint16(at + 4, 8, true);
  view.setUint32(at + 6, header.time, true);
  view.setUint32(at + 10, crc32(bytes), true);
  view.setUint32(at + 14, packedLength, true);
  view.setUint32(at + 18, bytes.length, true);
  view.setUint16(at + 22, header.name.length, true);
}

function assembled(pieces: readonly Piece[], comment: Uint8Array): Uint8Array {
  const locals = pieces.reduce((sum, piece) => sum + piece.local.length, 0);
  const centrals = pieces.reduce((sum, piece) => sum + piece.central.length, 0);
  const total = locals + centrals + 22 + comment.length;
  if (total > 0xfffffffe || pieces.length > 65534)
    refuse(`The package would hold ${pieces.length} parts in ${total} bytes, more than a plain zip file can`);
  const out = new Uint8Array(total);
  let at = 0;
  let directory = locals;
  for (const { local, central } of pieces) {
    placeOffset(central, at);
    out.set(local, at);
    out.set(central, directory);
    at += local.length;
    directory += central.length;
  }
  const end = viewOf(out.subarray(locals + centrals));
  end.setUint32(0, 0x06054b50, true);
  end.setUint16(8, pieces.length, true);
  end.setUint16(10, pieces.length, true);
  end.setUint32(12, centrals, true);
  end.setUint32(16, locals, true);
  end.setUint16(20, comment.length, true);
  out.set(comment, locals + centrals + 22);
  return out;
}

/** Sets the place of the local header. A zip64 place is left behind in the extra field and no longer asked for once the 32-bit field is not full. */
function placeOffset(central: Uint8Array, offset: number): void {
  viewOf(central).setUint32(42, offset, true);
}
