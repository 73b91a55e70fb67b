/** The function book: names and orders are for ever. Optional arguments stand in brackets, and may only be appended. */
export const FUNCTION_BOOK: Readonly<Record<string, readonly string[]>> = {
  properties: [
    "CV.AT(substance, temperature, [unit], [set])",
    "CP.AT(substance, temperature, [unit], [set])",
    "GAMMA(substance, temperature, [set])",
    "CV.MEAN(substance, from, to, [unit], [set])",
    "CV.INTEGRAL(substance, from, to, [unit], [set])",
    "CV.LIMITS(substance, [unit])",
    "ENERGY(substance, temperature, [unit], [set])",
    "ENTHALPY(substance, temperature, [unit], [set])",
    "ENTROPY(substance, temperature, [pressure], [unit], [set])",
    "MOLARMASS(substance_or_formula, [unit])",
  ],
  heat: ["HEAT(substance, amount, from, to, [unit], [set])", "HEAT.FINALTEMP(substance, amount, from, heat, [unit], [set])"],
  mixture: [
    "MIX(species, amounts, [basis], [normalise])",
    "MIX.TABLE(substance)",
    "MIX.HUMIDAIR(temperature, pressure, relative_humidity)",
  ],
  units: ["UNITS(value, from, to, [substance])", "UNITS.ABSOLUTE(gauge, from, [to], [atmosphere])"],
  sources: ["SOURCE(substance, [set])", "SOURCE.RANGE(substance, [set])", "SOURCE.SETS(substance)", "SOURCE.CHECK(block)"],
};
