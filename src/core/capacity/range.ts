import { printed, Refusal } from "../refusal";
import type { Capacity } from "./capacity";

/**
 * Why a capacity has no value at this temperature, K:
 * "Temperature 5200 K is above 3500 K, the upper limit of gri-1999 for CO2".
 */
export function explainTemperature(capacity: Capacity, temperature: number): Refusal {
  if (typeof temperature !== "number" || Number.isNaN(temperature)) return new Refusal("input", "The temperature is not a number");
  if (temperature <= 0) return new Refusal("input", `Temperature ${printed(temperature)} K is not above absolute zero (0 K)`);
  if (temperature < capacity.from)
    return new Refusal("range", beyond(temperature, "below", capacity.from, `the lower limit of ${capacity.fromLabel}`));
  if (temperature > capacity.to)
    return new Refusal("range", beyond(temperature, "above", capacity.to, `the upper limit of ${capacity.toLabel}`));
  return new Refusal("input", `There is no value at ${printed(temperature)} K in ${capacity.toLabel}`);
}

/** All digits where six would print the value and its limit alike. */
function beyond(value: number, side: "above" | "below", limit: number, whose: string): string {
  const print = printed(value) === printed(limit) ? String : printed;
  return `Temperature ${print(value)} K is ${side} ${print(limit)} K, ${whose}`;
}

export { extrapolated } from "./extrapolate";
