/** Relationships between the parts of a package (Open Packaging Conventions): which part plays which role for which other. */
import { walkXml } from "../xml/walk";

export interface Relation {
  readonly id: string;
  /** Last word of the type, the same in the transitional and the strict form: `worksheet`, `sharedStrings`, `calcChain`. */
  readonly role: string;
  readonly type: string;
  /** Part name without a leading slash; the address itself when external. */
  readonly target: string;
  readonly external: boolean;
}

/** `xl/workbook.xml` -> `xl/_rels/workbook.xml.rels`; the empty name stands for the package itself. */
export function relationsPartOf(part: string): string {
  const slash = part.lastIndexOf("/") + 1;
  return `${part.slice(0, slash)}_rels/${part.slice(slash)}.rels`;
}

/** Relationships of one part from the text of its relationship part. */
export function readRelations(text: string, source: string): Relation[] {
  const relations: Relation[] = [];
  walkXml(text, relationsPartOf(source), {
    open(name, { Id, Type, Target, TargetMode }) {
      if (name !== "Relationship" || Type === undefined || Target === undefined) return;
      const external = TargetMode === "External";
      const role = Type.slice(Type.lastIndexOf("/") + 1);
      relations.push({ id: Id ?? "", role, type: Type, external, target: external ? Target : resolved(Target, source) });
    },
  });
  return relations;
}

function resolved(target: string, source: string): string {
  const path = decoded(target.replace(/\\/g, "/").split("#")[0] ?? "");
  const steps = path.startsWith("/") ? [] : source.split("/").slice(0, -1);
  for (const step of path.split("/")) {
    if (step === "..") steps.pop();
    else if (step !== "." && step !== "") steps.push(step);
  }
  return steps.join("/");
}

function decoded(path: string): string {
  try {
    return decodeURIComponent(path);
  } catch {
    return path;
  }
}
