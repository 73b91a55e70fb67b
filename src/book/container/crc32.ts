/** CRC-32 of the zip format (polynomial 0xEDB88320, reflected), by a table of one entry per byte value. Source: the zip application note, section 4.4.7. */
const table = Int32Array.from({ length: 256 }, (_, byte) => {
  let remainder = byte;
  for (let bit = 0; bit < 8; bit++) remainder = remainder & 1 ? (remainder >>> 1) ^ 0xedb88320 : remainder >>> 1;
  return remainder;
});

/** Check sum of all bytes, as an unsigned 32-bit number. */
export function crc32(bytes: Uint8Array): number {
  let sum = -1; // kept as a signed number, which the machine holds in one register
  for (let i = 0; i < bytes.length; i++) sum = (table[(sum ^ (bytes[i] as number)) & 255] as number) ^ (sum >>> 8);
  return (sum ^ 0xffffffff) >>> 0;
}
