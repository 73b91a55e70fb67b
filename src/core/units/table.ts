/**
 * The units a user may type, with their definitions as printed. Exact unless a row says otherwise.
 *
 * Sources: SI brochure, 9th edition (BIPM 2019), tables 4, 8 and chapter 3 (prefixes);
 * NIST SP 811 (2008), appendix B.8 (pound, foot, gallon, Btu, conventional columns of mercury and water, calories).
 * Not listed on purpose: mPa (a slip of MPa by a factor of a milliard), bare cal, Btu, gal and ton (see ambiguous.ts).
 */
export interface UnitRow {
  /** Name inside the unit part of mathjs: letters and digits only. */
  readonly inside: string;
  /** Size in units of rows above: a decimal number or a ratio, then the unit. Left out for the base units. */
  readonly size?: readonly [ratio: string, unit: string];
  /** Spellings; the first is the one recommended in refusals. */
  readonly spellings: readonly string[];
  /** Prefixes that may stand before every spelling; the bare unit is always allowed. */
  readonly prefixes?: string;
}

export const unitRows: readonly UnitRow[] = [
  // Base units. mathjs keeps mass in grams and prefixes it.
  { inside: "m", spellings: ["m"], prefixes: "k d c m μ n" },
  { inside: "g", spellings: ["g"], prefixes: "k m μ" },
  { inside: "s", spellings: ["s"], prefixes: "m μ" },
  { inside: "K", spellings: ["K"], prefixes: "m" },
  { inside: "mol", spellings: ["mol"], prefixes: "k m μ" },

  // Temperature scales: sizes of their degrees. The zeros are in parse.ts.
  { inside: "degC", size: ["1", "K"], spellings: ["°C", "degC", "C", "celsius"] },
  { inside: "degF", size: ["5/9", "K"], spellings: ["°F", "degF", "F", "fahrenheit"] },
  { inside: "degR", size: ["5/9", "K"], spellings: ["°R", "degR", "R", "rankine"] },
  { inside: "kelvin", size: ["1", "K"], spellings: ["kelvin", "degK", "°K"] },

  // Time
  { inside: "min", size: ["60", "s"], spellings: ["min", "minute", "minutes"] },
  { inside: "h", size: ["3600", "s"], spellings: ["h", "hr", "hrs", "hour", "hours"] },
  { inside: "d", size: ["86400", "s"], spellings: ["d", "day", "days"] },
  { inside: "second", size: ["1", "s"], spellings: ["sec", "second", "seconds"] },

  // Length and volume
  { inside: "in", size: ["0.0254", "m"], spellings: ["in", "inch"] },
  { inside: "ft", size: ["0.3048", "m"], spellings: ["ft", "foot", "feet"] },
  { inside: "L", size: ["0.001", "m^3"], spellings: ["L", "l"], prefixes: "k h d c m μ" },
  { inside: "litre", size: ["0.001", "m^3"], spellings: ["litre", "litres", "liter", "liters"] },
  { inside: "cc", size: ["0.000001", "m^3"], spellings: ["cc", "ccm"] },
  { inside: "galUS", size: ["231", "in^3"], spellings: ["gal_US"] },
  { inside: "galUK", size: ["4.54609", "L"], spellings: ["gal_UK"] },

  // Mass and amount
  { inside: "gram", size: ["1", "g"], spellings: ["gram", "grams"] },
  { inside: "kilogram", size: ["1", "kg"], spellings: ["kilogram", "kilograms"] },
  { inside: "t", size: ["1000", "kg"], spellings: ["t", "tonne", "tonnes"] },
  { inside: "lb", size: ["0.45359237", "kg"], spellings: ["lb", "lbs", "lbm"] },
  { inside: "oz", size: ["1/16", "lb"], spellings: ["oz"] },
  { inside: "tonUS", size: ["2000", "lb"], spellings: ["ton_US"] },
  { inside: "tonUK", size: ["2240", "lb"], spellings: ["ton_UK"] },
  { inside: "mole", size: ["1", "mol"], spellings: ["mole", "moles"] },
  { inside: "kgmol", size: ["1", "kmol"], spellings: ["kgmol"] },
  { inside: "gmol", size: ["1", "mol"], spellings: ["gmol"] },
  { inside: "lbmol", size: ["453.59237", "mol"], spellings: ["lbmol"] },

  // Force
  { inside: "N", size: ["1", "kg m s^-2"], spellings: ["N"], prefixes: "k M m" },
  { inside: "dyn", size: ["0.00001", "N"], spellings: ["dyn"] },
  { inside: "kgf", size: ["9.80665", "N"], spellings: ["kgf", "kp"] },
  { inside: "lbf", size: ["4.4482216152605", "N"], spellings: ["lbf"] },

  // Pressure, always absolute
  { inside: "Pa", size: ["1", "N m^-2"], spellings: ["Pa"], prefixes: "G M k h" },
  { inside: "pascal", size: ["1", "Pa"], spellings: ["pascal"] },
  { inside: "bar", size: ["100000", "Pa"], spellings: ["bar"], prefixes: "k m" },
  { inside: "atm", size: ["101325", "Pa"], spellings: ["atm"] },
  { inside: "at", size: ["98066.5", "Pa"], spellings: ["at"] },
  { inside: "psi", size: ["1", "lbf in^-2"], spellings: ["psi"], prefixes: "k" },
  { inside: "ksi", size: ["1000", "psi"], spellings: ["ksi"] },
  { inside: "torr", size: ["101325/760", "Pa"], spellings: ["torr", "Torr"], prefixes: "m" },
  { inside: "mmHg", size: ["133.322387415", "Pa"], spellings: ["mmHg"] }, // conventional: 13595.1 kg/m3 × 9.80665 m/s2 × 1 mm
  { inside: "cmHg", size: ["10", "mmHg"], spellings: ["cmHg"] },
  { inside: "inHg", size: ["25.4", "mmHg"], spellings: ["inHg"] },
  { inside: "mmH2O", size: ["9.80665", "Pa"], spellings: ["mmH2O"] }, // conventional: water of 1000 kg/m3
  { inside: "cmH2O", size: ["10", "mmH2O"], spellings: ["cmH2O"] },
  { inside: "inH2O", size: ["25.4", "mmH2O"], spellings: ["inH2O"] },

  // Energy: the calories and the two Btu are kept apart
  { inside: "J", size: ["1", "N m"], spellings: ["J"], prefixes: "T G M k m μ" },
  { inside: "joule", size: ["1", "J"], spellings: ["joule", "joules"] },
  { inside: "kilojoule", size: ["1000", "J"], spellings: ["kilojoule", "kilojoules"] },
  { inside: "Wh", size: ["3600", "J"], spellings: ["Wh"], prefixes: "G M k" },
  { inside: "calth", size: ["4.184", "J"], spellings: ["cal_th"], prefixes: "G M k" },
  { inside: "calIT", size: ["4.1868", "J"], spellings: ["cal_IT"], prefixes: "G M k" },
  { inside: "cal15", size: ["4.1858", "J"], spellings: ["cal_15"], prefixes: "k" }, // measured value adopted in 1950 (CIPM); used as exact
  { inside: "cal20", size: ["4.1819", "J"], spellings: ["cal_20"], prefixes: "k" }, // measured; NIST SP 811 prints 4.18190
  { inside: "BtuIT", size: ["1055.05585262", "J"], spellings: ["Btu_IT"], prefixes: "MM" }, // 1 Btu_IT/lb = 2326 J/kg exactly
  { inside: "Btuth", size: ["5/9", "lb K calth g^-1 K^-1"], spellings: ["Btu_th"], prefixes: "MM" }, // 1 cal_th/(g °C) = 1 Btu_th/(lb °F)
  { inside: "kiloBtuIT", size: ["1000", "BtuIT"], spellings: ["kBtu_IT"] },
  { inside: "kiloBtuth", size: ["1000", "Btuth"], spellings: ["kBtu_th"] },
  { inside: "erg", size: ["0.0000001", "J"], spellings: ["erg"] },
  { inside: "eV", size: ["801088317/5000000000000000000000000000", "J"], spellings: ["eV"], prefixes: "k M" },

  // Power
  { inside: "W", size: ["1", "J s^-1"], spellings: ["W"], prefixes: "G M k m μ" },
  { inside: "watt", size: ["1", "W"], spellings: ["watt", "watts"] },

  // Pure numbers
  { inside: "percent", size: ["1/100", ""], spellings: ["%", "percent"] },
  { inside: "permille", size: ["1/1000", ""], spellings: ["‰"] },
  { inside: "ppm", size: ["1/1000000", ""], spellings: ["ppm"] },
  { inside: "ppb", size: ["1/1000000000", ""], spellings: ["ppb"] },
];
