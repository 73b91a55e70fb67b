/** The reminder of °C in a refusal: a plain number of kelvin that is colder than any vessel was perhaps meant in degrees Celsius. */
import { CELSIUS_ZERO } from "../core/constants";
import { printed, Refusal } from "../core/refusal";
import type { Cell } from "./cell";

/** Plain temperatures from here on, K, are a day's temperature in kelvin: no reminder of the unit. */
const ORDINARY_FROM = CELSIUS_ZERO - 50;

/**
 * What `work` gives. A refusal that names one of the temperatures, given as a plain number below 223.15, ends with the text to write for
 * degrees Celsius; of several the one it names first. Not for 0, which older Excel sends for a blank cell.
 */
export function remindingOfCelsius<Value>(temperatures: readonly (Cell | undefined)[], work: () => Value): Value {
  try {
    return work();
  } catch (thrown) {
    throw thrown instanceof Refusal ? reminded(thrown, temperatures) : thrown;
  }
}

function reminded(refusal: Refusal, temperatures: readonly (Cell | undefined)[]): Refusal {
  const { kind, message } = refusal;
  const [first] = temperatures
    .filter((cell): cell is number => typeof cell === "number" && cell !== 0 && cell < ORDINARY_FROM)
    .map((value) => ({ value, place: placeOf(message, value) }))
    .filter(({ place }) => place >= 0)
    .sort((one, other) => one.place - other.place);
  if (first === undefined || message.includes("degrees Celsius")) return refusal;
  return new Refusal(kind, `${message}; for degrees Celsius write "${printed(first.value)} °C"`);
}

/** Where a sentence names a temperature in K; -1 if it does not. */
function placeOf(message: string, temperature: number): number {
  return ` ${message}`.indexOf(` ${printed(temperature)} K`);
}
