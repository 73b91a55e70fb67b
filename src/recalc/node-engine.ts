import * as library from "@odoo/o-spreadsheet";
import { handbook } from "../handbook";
import { registry } from "../functions";
import { prepareEngine, type Engine } from "./engine";

/** The engine under Node, with every worksheet function. The library needs no DOM. */
export function nodeEngine(): Engine {
  return prepareEngine(library, registry, handbook);
}
