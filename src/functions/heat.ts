/** Family heat: the heat a sealed amount takes up at constant volume, and the temperature a heat brings it to. Composition frozen. */
import { temperatureAtEnergy } from "../core/capacity/inverse";
import { printed, Refusal, refuse } from "../core/refusal";
import { readAmount } from "./amount";
import { FROM, HEAT, readQuantity, readTemperature, readText, TO } from "./arguments";
import type { Named } from "./broadcast";
import { Block, Cell, cells, isLeftOut } from "./cell";
import { isComposition } from "./composition";
import { valueAt } from "./property";
import { inUnit } from "./result-unit";
import { eachState } from "./states";
import type { Substance } from "./substance";

/**
 * Heat taken up by a sealed amount at constant volume between two temperatures, n (U2 - U1); positive into the contents. No change of composition.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions or moles [-] value
 * @param amount Amount, also as text such as "60 g"; left out if the range of the substance holds moles [mol] value
 * @param from First temperature, also as text such as "25 °C" [K] value
 * @param to Second temperature, also as text such as "800 °C" [K] value
 * @param unit Unit of the result, such as "kJ" [-] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", or a coefficient block [-] value
 * @returns Heat into the contents [J]
 * @source nasa-2002
 * @example STILL.HEAT("N2",1,298.15,1000,"kJ") -> ~ 15.627
 * @example STILL.HEAT({"N2",2;"O2",1},,300,400,"kJ") -> ~ 6.31
 * @customfunction HEAT
 */
export function heat(substance: any[][], amount: any[][], from: any[][], to: any[][], unit?: any[][], set?: any[][]): any[][] {
  return overAmounts(
    substance,
    amount,
    set,
    [
      ["from", from],
      ["to", to],
      ["unit", unit],
    ],
    (found, moles, [first, second, unitCell]) => {
      const { capacity } = found;
      const change = valueAt(capacity, readTemperature(second, TO), energyOf) - valueAt(capacity, readTemperature(first, FROM), energyOf);
      return inUnit(moles * change, readText(unitCell, "unit"), "J", 'an energy such as "kJ"');
    },
  );
}

/**
 * Temperature that a sealed amount reaches at constant volume when it takes up a heat (negative: gives it off). No change of composition, walls not counted.
 * @param substance Species such as "N2", mixture such as "0.79 N2 + 0.21 O2", "air", or a range of species and mole fractions or moles [-] value
 * @param amount Amount, also as text such as "60 g"; left out if the range of the substance holds moles [mol] value
 * @param from First temperature, also as text such as "25 °C" [K] value
 * @param heat Heat into the contents, also as text such as "12 kJ" [J] value
 * @param unit Unit of the result, such as "°C" [-] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", or a coefficient block [-] value
 * @returns Final temperature [K]
 * @source nasa-2002
 * @example STILL.HEAT.FINALTEMP("N2",2,300,"20 kJ") -> ~ 763.70
 * @example STILL.HEAT.FINALTEMP("N2",2,300,0) -> 300
 * @customfunction HEAT.FINALTEMP
 */
export function heatFinaltemp(substance: any[][], amount: any[][], from: any[][], heat: any[][], unit?: any[][], set?: any[][]): any[][] {
  return overAmounts(
    substance,
    amount,
    set,
    [
      ["from", from],
      ["heat", heat],
      ["unit", unit],
    ],
    (found, moles, [first, heatCell, unitCell]) => {
      const start = readTemperature(first, FROM);
      const joules = readQuantity(heatCell, HEAT);
      const end = finalTemperature(found, moles, start, joules);
      return inUnit(end, readText(unitCell, "unit"), "K", 'a temperature such as "°C"');
    },
  );
}

/** The temperature at which U of the amount has risen by a heat. No heat is no change, to the last bit. */
function finalTemperature({ capacity }: Substance, moles: number, start: number, heat: number): number {
  const initial = valueAt(capacity, start, energyOf);
  if (heat === 0) return start;
  const [least, most] = [moles * (capacity.energy(capacity.from) - initial), moles * (capacity.energy(capacity.to) - initial)];
  if (heat > most) throw beyond(heat, most, "at most", capacity.to, `the upper limit of ${capacity.toLabel}`);
  if (heat < least) throw beyond(heat, least, "at least", capacity.from, `the lower limit of ${capacity.fromLabel}`);
  return temperatureAtEnergy(capacity, initial + heat / moles, start);
}

function beyond(heat: number, limit: number, side: string, temperature: number, whose: string): Refusal {
  return new Refusal(
    "range",
    `A heat of ${printed(heat)} J leads beyond ${temperature} K, ${whose}; from this start it can be ${side} ${printed(limit)} J`,
  );
}

function energyOf(capacity: Substance["capacity"], temperature: number): number {
  return capacity.energy(temperature);
}

/** Hands each state its substance and its moles: the amount argument, or left out the moles that a composition range holds. */
function overAmounts(
  substance: Block,
  amount: Block | undefined,
  set: Block | undefined,
  others: readonly Named[],
  each: (found: Substance, moles: number, cells: (Cell | undefined)[]) => number,
): Block {
  return cells(() => {
    if (!isLeftOut(amount)) {
      return eachState(substance, set, [["amount", amount], ...others], (found, [amountCell, ...values]) =>
        each(found, readAmount(amountCell, found), values),
      );
    }
    if (!isComposition(substance)) {
      refuse(
        'The amount is missing: give moles as a number or a text such as "60 g"; it may be left out only if the substance is a range that holds moles',
      );
    }
    return eachState(substance, set, others, (found, values) => each(found, found.moles, values), true);
  });
}
