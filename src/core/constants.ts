/** Exact constants of the SI (2019) and the reference state. Measured constants arrive as arguments, from src/data. */

/** Avogadro constant, 1/mol; exact in the SI of 2019. */
export const AVOGADRO = 6.02214076e23;

/** Boltzmann constant, J/K; exact in the SI of 2019. */
export const BOLTZMANN = 1.380649e-23;

/** Molar gas constant, J/(mol K); exact: AVOGADRO × BOLTZMANN. */
export const GAS_CONSTANT = 8.31446261815324;

/** Reference temperature of formation values, K (25 °C). */
export const REFERENCE_TEMPERATURE = 298.15;

/** Standard-state pressure, Pa (1 bar). */
export const STANDARD_PRESSURE = 100000;

/** Zero of the Celsius scale, K; exact by definition. */
export const CELSIUS_ZERO = 273.15;

/** Planck constant, J s; exact in the SI of 2019. */
export const PLANCK = 6.62607015e-34;

/** Speed of light in vacuum, m/s; exact. */
export const SPEED_OF_LIGHT = 299792458;

/** Second radiation constant hc/k in cm K: an energy of 1/cm as a temperature; exact: 100 × PLANCK × SPEED_OF_LIGHT / BOLTZMANN. */
export const KELVIN_PER_WAVENUMBER = (100 * PLANCK * SPEED_OF_LIGHT) / BOLTZMANN;
