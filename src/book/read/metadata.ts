/** Cell metadata: which values of the attribute `cm` mark a dynamic array (metadata type XLDAPR with fDynamic). */
import { isTrue, walkXml } from "../xml/walk";

/** Name of the metadata type of dynamic arrays. */
export const DYNAMIC = "XLDAPR";

export interface CellMetadata {
  /** Values of `cm` that mean a dynamic array, as they stand in the attribute; counted from 1. */
  readonly dynamic: ReadonlySet<string>;
}

/** Reads the metadata part. `fDynamic` stands in an extension of a newer namespace, so it is read from the text of the type's own list. */
export function readMetadata(text: string, part: string): CellMetadata {
  const types: string[] = [];
  const dynamic = new Set<string>();
  let inCells = false;
  let block = 0;
  walkXml(text, part, {
    open(name, attributes) {
      if (name === "metadataType") types.push(attributes.name ?? "");
      else if (name === "cellMetadata") inCells = true;
      else if (inCells && name === "bk") block++;
      else if (inCells && name === "rc" && types[Number(attributes.t) - 1] === DYNAMIC && !isOff(text)) dynamic.add(String(block));
    },
    close(name) {
      if (name === "cellMetadata") inCells = false;
    },
  });
  return { dynamic };
}

/** True if the only dynamic-array properties of the file say that the array is not dynamic. */
const isOff = (text: string): boolean => {
  const flags = [...text.matchAll(/fDynamic\s*=\s*["'](\w+)["']/g)].map((match) => isTrue(match[1]));
  return flags.length > 0 && !flags.some(Boolean);
};
