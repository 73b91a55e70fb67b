import { asResult, FunctionError, type Declarations } from "./declare";
import { isErrorCode } from "../errors";
import { first } from "./samples";
import { engineFunction, type EngineValue } from "../library";

/**
 * CONVERT for energy, power, pressure, mass, volume and length, with the factors by which the units are defined; the engine's own table
 * is rougher (BTU 1055.06 J, pound 453.592 g). Units not listed here are left to the engine.
 *
 * BIPM SI Brochure (9th ed.) and NIST SP 811: calorie and Btu of the International Table, thermochemical calorie, foot-pound, horsepower-hour,
 * standard atmosphere, conventional mmHg; the electronvolt is exact since 2019. Codes of units as in Excel: `c` thermochemical, `cal` IT calorie.
 */
const families: readonly Readonly<Record<string, number>>[] = [
  {
    J: 1, e: 1e-7, c: 4.184, cal: 4.1868, eV: 1.602176634e-19, ev: 1.602176634e-19, HPh: 2684519.5376961729, hh: 2684519.5376961729,
    Wh: 3600, wh: 3600, flb: 1.3558179483314004, BTU: 1055.05585262, btu: 1055.05585262,
  },
  { W: 1, w: 1, HP: 745.69987158227022, h: 745.69987158227022, PS: 735.49875 },
  { Pa: 1, p: 1, atm: 101325, at: 101325, mmHg: 133.322387415, psi: 6894.7572931683608, Torr: 101325 / 760 },
  { g: 1, lbm: 453.59237, ozm: 28.349523125, grain: 0.06479891, stone: 6350.29318, ton: 907184.74, u: 1.6605390666e-24 },
  { l: 1, L: 1, lt: 1, m3: 1000, gal: 3.785411784, uk_gal: 4.54609, ft3: 28.316846592, in3: 0.016387064, barrel: 158.987294928 },
  { m: 1, ft: 0.3048, in: 0.0254, yd: 0.9144, mi: 1609.344, Nmi: 1852, ang: 1e-10 },
]; // prettier-ignore

const prefixed = /^(J|e|c|cal|eV|ev|Wh|wh|W|w|Pa|p|atm|at|mmHg|PS|g|u|l|L|lt|m)$/;
const prefixes: Readonly<Record<string, number>> = {
  Y: 1e24,
  Z: 1e21,
  E: 1e18,
  P: 1e15,
  T: 1e12,
  G: 1e9,
  M: 1e6,
  k: 1e3,
  h: 1e2,
  e: 1e1,
  da: 1e1,
  d: 1e-1,
  c: 1e-2,
  m: 1e-3,
  u: 1e-6,
  n: 1e-9,
  p: 1e-12,
  f: 1e-15,
  a: 1e-18,
};

export function registerConvert(declare: Declarations): void {
  const engine = engineFunction(declare.library, "CONVERT")!.compute as unknown as (this: unknown, ...args: unknown[]) => EngineValue;
  declare.tables("CONVERT", "number, from_unit, to_unit", function (read, number, from, to) {
    const value = read.number(first(number));
    const units = [from, to].map((unit) => read.text(first(unit))) as [string, string];
    for (const family of families) {
      const [a, b] = units.map((unit) => factor(unit, family));
      if (a !== undefined && b !== undefined) return (value * a) / b;
    }
    const outcome = attempt(() => asResult(engine.call(this, { value }, { value: units[0] }, { value: units[1] })));
    if (outcome && !isErrorCode((outcome as EngineValue).value)) return outcome;
    throw new FunctionError("#N/A", `${units[0]} cannot be converted to ${units[1]}`);
  });
}

function attempt<T>(run: () => T): T | undefined {
  try {
    return run();
  } catch {
    return undefined;
  }
}

function factor(unit: string, family: Readonly<Record<string, number>>): number | undefined {
  if (Object.prototype.hasOwnProperty.call(family, unit)) return family[unit];
  for (const [prefix, scale] of Object.entries(prefixes)) {
    const rest = unit.slice(prefix.length);
    if (unit.startsWith(prefix) && prefixed.test(rest) && Object.prototype.hasOwnProperty.call(family, rest)) return scale * family[rest]!;
  }
  return undefined;
}
