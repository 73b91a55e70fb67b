import type { SpeciesFit } from "../../../src/core/species/types";

/** Gas constant of the NASA fits, J/(mol K) (CODATA 1986, printed in NASA/TP-2002-211556). */
export const R_NASA = 8.31451;

const common = {
  quantity: "Cp",
  unitFactor: 1,
  standardPressure: 100000,
  entropy298: null,
} as const;

/** Nitrogen, NASA/TP-2002-211556, as printed: tpis78, Gurvich 1978. */
export const nitrogenNine: SpeciesFit = {
  ...common,
  species: "N2",
  formula: "N2",
  phase: "g",
  set: "nasa-2002",
  form: "nine-term",
  gasConstant: R_NASA,
  molarMass: 28.0134,
  formationEnthalpy: 0,
  intervals: [
    {
      from: 200,
      to: 1000,
      coefficients: [
        22103.71497, -381.846182, 6.08273836, -0.00853091441, 1.384646189e-5, -9.62579362e-9, 2.519705809e-12, 710.846086, -10.76003744,
      ],
    },
    {
      from: 1000,
      to: 6000,
      coefficients: [
        587712.406, -2239.249073, 6.06694922, -0.00061396855, 1.491806679e-7, -1.923105485e-11, 1.061954386e-15, 12832.10415, -15.86640027,
      ],
    },
    {
      from: 6000,
      to: 20000,
      coefficients: [
        831013916.0, -642073.354, 202.0264635, -0.03065092046, 2.486903333e-6, -9.70595411e-11, 1.437538881e-15, 4938707.04, -1672.09974,
      ],
    },
  ],
};

/** Methane, NASA/TP-2002-211556, as printed: g 8/99. */
export const methaneNine: SpeciesFit = {
  ...nitrogenNine,
  species: "CH4",
  formula: "CH4",
  molarMass: 16.04246,
  formationEnthalpy: -74600,
  intervals: [
    {
      from: 200,
      to: 1000,
      coefficients: [
        -176685.0998, 2786.18102, -12.0257785, 0.0391761929, -3.61905443e-5, 2.026853043e-8, -4.97670549e-12, -23313.1436, 89.0432275,
      ],
    },
    {
      from: 1000,
      to: 6000,
      coefficients: [
        3730042.76, -13835.01485, 20.49107091, -0.001961974759, 4.72731304e-7, -3.72881469e-11, 1.623737207e-15, 75320.6691, -121.9124889,
      ],
    },
  ],
};

/** Methane, GRI-Mech 3.0 thermodynamic listing (7/30/99), as printed: L 8/88. */
export const methaneSeven: SpeciesFit = {
  ...common,
  species: "CH4",
  formula: "CH4",
  phase: "g",
  set: "gri-1999",
  form: "seven-term",
  gasConstant: R_NASA,
  standardPressure: 101325,
  molarMass: 16.04246,
  formationEnthalpy: -74600,
  intervals: [
    {
      from: 200,
      to: 1000,
      coefficients: [5.14987613, -0.0136709788, 4.91800599e-5, -4.84743026e-8, 1.66693956e-11, -10246.6476, -4.64130376],
    },
    {
      from: 1000,
      to: 3500,
      coefficients: [0.074851495, 0.0133909467, -5.73285809e-6, 1.22292535e-9, -1.0181523e-13, -9468.34459, 18.437318],
    },
  ],
};

/** Nitrogen, NIST SRD 69 Shomate fit to Chase 1998, as printed. */
export const nitrogenShomate: SpeciesFit = {
  ...common,
  species: "N2",
  formula: "N2",
  phase: "g",
  set: "srd69-shomate",
  form: "shomate",
  gasConstant: 8.31446261815324,
  molarMass: 28.0134,
  formationEnthalpy: 0,
  intervals: [
    { from: 100, to: 500, coefficients: [28.98641, 1.853978, -9.647459, 16.63537, 0.000117, -8.671914, 226.4168, 0] },
    { from: 500, to: 2000, coefficients: [19.50583, 19.88705, -8.598535, 1.369784, 0.527601, -4.935202, 212.39, 0] },
    { from: 2000, to: 6000, coefficients: [35.51872, 1.128728, -0.196103, 0.014662, -4.55376, -18.97091, 224.981, 0] },
  ],
};

/** Carbon dioxide, NIST SRD 69 Shomate fit, printed in thermochemical calories. */
export const carbonDioxideShomate: SpeciesFit = {
  ...nitrogenShomate,
  species: "CO2",
  formula: "CO2",
  unitFactor: 4.184,
  molarMass: 44.0095,
  formationEnthalpy: -393522.4,
  intervals: [
    { from: 298, to: 1200, coefficients: [5.974511, 13.19, -8.052431, 1.899711, -0.032657, -96.46451, 54.55141, -94.05411] },
    { from: 1200, to: 6000, coefficients: [13.9021, 0.650113, -0.11766, 0.009284, -1.540941, -101.797, 63.0049, -94.05411] },
  ],
};

/** Iron, NIST SRD 69 Shomate fit: four intervals that do not meet (alpha to delta phase). */
export const ironShomate: SpeciesFit = {
  ...nitrogenShomate,
  species: "Fe(cr)",
  formula: "Fe",
  phase: "cr",
  molarMass: 55.845,
  intervals: [
    { from: 298, to: 700, coefficients: [18.42868, 24.64301, -8.91372, 9.664706, -0.012643, -6.573022, 42.51488, 0] },
    { from: 700, to: 1042, coefficients: [-57767.65, 137919.7, -122773.2, 38682.42, 3993.08, 24078.67, -87364.01, 0] },
    { from: 1042, to: 1100, coefficients: [-325.8859, 28.92876, 0, 0, 411.9629, 745.8231, 241.8766, 0] },
    { from: 1100, to: 1809, coefficients: [-776.7387, 919.4005, -383.7184, 57.08148, 242.1369, 697.6234, -558.3674, 0] },
  ],
};

/** Graphite, textbook power form a + bT + cT⁻² (Felder and Rousseau, table B.2), J/(mol K). */
export const graphitePower: SpeciesFit = {
  ...common,
  species: "C(gr)",
  formula: "C",
  phase: "cr",
  set: "textbook",
  form: "power",
  gasConstant: 8.31446261815324,
  molarMass: 12.011,
  formationEnthalpy: 0,
  entropy298: 5.74,
  exponents: [0, 1, -2],
  intervals: [{ from: 273, to: 1373, coefficients: [11.18, 0.01095, -489100] }],
};

/** Benzene vapour, the same table, cubic in °C. */
export const benzenePower: SpeciesFit = {
  ...graphitePower,
  species: "Benzene",
  formula: "C6H6",
  phase: "g",
  molarMass: 78.114,
  celsius: true,
  formationEnthalpy: 82930,
  entropy298: null,
  exponents: [0, 1, 2, 3],
  intervals: [{ from: 273.15, to: 1473.15, coefficients: [74.06, 0.3295, -0.000252, 7.757e-8] }],
};

/** Nitrogen from molecular constants: Huber and Herzberg 1979, fundamental and ground-level rotation. */
export const nitrogenMolecular: SpeciesFit = {
  ...common,
  species: "N2",
  formula: "N2",
  phase: "g",
  set: "molecular",
  form: "molecular",
  gasConstant: 8.31446261815324,
  molarMass: 28.0134,
  formationEnthalpy: 0,
  intervals: [],
  range: [100, 3000],
  molecular: { geometry: "linear", symmetry: 2, rotation: [1.989581], vibrations: [[2329.922, 1]], electronic: [[0, 1]] },
};
