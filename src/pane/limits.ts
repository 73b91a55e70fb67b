/** The two classical limits of Cv as lines of the chart, from the worksheet function itself, so that chart and cell agree. */
import { registry } from "../functions/registry";
import type { Limit } from "./points";
import type { Subject } from "./subject";

/** Vibrations frozen and fully excited, J/(mol K); one line where they are the same (atoms), none for condensed species. */
export function limitsOf(subject: Subject): Limit[] {
  const cells = registry.get("CV.LIMITS")?.([[subject.text]])[0] ?? [];
  const [frozen, excited] = cells;
  if (typeof frozen !== "number" || typeof excited !== "number") return [];
  if (frozen === excited) return [{ label: "classical", value: frozen }];
  return [
    { label: "vibrations frozen", value: frozen },
    { label: "fully excited", value: excited },
  ];
}
