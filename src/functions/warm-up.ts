/** What VESSEL.WARMUP and VESSEL.WARMTEMP share: the contents with the other arguments spread over their ranges, and power and loss. */
import type { HeatStore } from "../core/vessel/types";
import type { Warming } from "../core/vessel/warm-up";
import { type Expected, readQuantity, readTemperature } from "./arguments";
import { type Named, spread } from "./broadcast";
import { Block, Cell, cells, finite } from "./cell";
import { remindingOfCelsius } from "./celsius";
import { blockChoice, setOf } from "./set";
import { contentsArgument, readContents } from "./vessel-wall";

const POWER: Expected = { name: "Power", unit: "W", example: '"2 kW"' };
const LOSS: Expected = { name: "Loss", unit: "W/K", example: '"2 W/K"' };
const AMBIENT: Expected = { name: "Ambient temperature", unit: "K", example: '"25 °C"' };

/** Names of the arguments that are temperatures. */
const TEMPERATURES = new Set(["ambient", "from", "to", "temperature"]);

/** A number for each state of contents, set and others. */
export function overContents(
  contents: Block,
  set: Block | undefined,
  others: readonly Named[],
  each: (contents: HeatStore, cells: (Cell | undefined)[]) => number,
): Block {
  return cells(() => {
    const argument = contentsArgument(contents);
    const whole = blockChoice(set);
    return spread([["contents", argument.texts], ["set", whole ? undefined : set], ...others], ([text, setCell, ...values]) => {
      const store = readContents(argument, text, whole ?? setOf(setCell));
      const temperatures = values.filter((_, i) => TEMPERATURES.has(others[i]![0]));
      return finite(remindingOfCelsius(temperatures, () => each(store, values)));
    });
  });
}

/** Power, loss and ambient temperature of three cells. */
export function readWarming(power: Cell | undefined, loss: Cell | undefined, ambient: Cell | undefined): Warming {
  return { power: readQuantity(power, POWER), loss: readQuantity(loss, LOSS), ambient: readTemperature(ambient, AMBIENT) };
}
