/** Bytes of an XML part -> text, without losing a byte: what is decoded here is encoded again by a plain UTF-8 encoder. */
import { refuse } from "../../core/refusal";

/** Text of a UTF-8 part; a byte order mark stays in front. Other encodings are refused. */
export function decodeXml(bytes: Uint8Array, part: string): string {
  if ((bytes[0] === 0xff && bytes[1] === 0xfe) || (bytes[0] === 0xfe && bytes[1] === 0xff))
    refuse(`The part ${part} is in UTF-16; only UTF-8 is read`);
  const declared = /^<\?xml[^>]*?encoding\s*=\s*["']([^"']*)["']/.exec(
    String.fromCharCode(...bytes.subarray(0, 200)).replace(/^\xef\xbb\xbf/, ""),
  );
  const encoding = declared?.[1] ?? "UTF-8";
  if (!/^(utf-?8|us-ascii|ascii)$/i.test(encoding)) refuse(`The part ${part} is in ${encoding}; only UTF-8 is read`);
  try {
    return new TextDecoder("utf-8", { fatal: true, ignoreBOM: true }).decode(bytes);
  } catch {
    return refuse(`The part ${part} is not valid UTF-8`);
  }
}
