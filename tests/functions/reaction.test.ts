import fc from "fast-check";
import { CellError } from "../../src/functions/cell";
import { call, number, refusal } from "./helpers";

const BALANCED = "CH4 + 2 O2 = CO2 + 2 H2O(l)";

describe("REACTION.BALANCE", () => {
  const balanced = (text: unknown) => call("REACTION.BALANCE", text)[0]![0];

  test.each([
    ["C3H8 + O2 -> CO2 + H2O", "C3H8 + 5 O2 = 3 CO2 + 4 H2O"],
    // what is written before a species does not count, the species stay as typed
    ["3 C3H8 + 0.5 O2 ⇌ CO2 + H2O(g)", "C3H8 + 5 O2 = 3 CO2 + 4 H2O(g)"],
    ["H₂ + O₂ → H₂O", "2 H₂ + O₂ = 2 H₂O"],
    // names of the library, formulas and ions in any mixture
    ["methane + oxygen = carbon dioxide + H2O", "methane + 2 oxygen = carbon dioxide + 2 H2O"],
    ["n-C4H10 = i-C4H10", "n-C4H10 = i-C4H10"],
    ["S(a) = S(b)", "S(a) = S(b)"],
    ["CH2(S) = CH2", "CH2(S) = CH2"],
    ["C(gr) = C(g)", "C(gr) = C(g)"],
    ["graphite + O2 = CO", "2 graphite + O2 = 2 CO"],
    ["Fe³⁺ + e⁻ → Fe²⁺", "Fe³⁺ + e⁻ = Fe²⁺"],
    ["MnO4^- + C2O4^2- + H^+ = Mn^2+ + CO2 + H2O", "2 MnO4^- + 5 C2O4^2- + 16 H^+ = 2 Mn^2+ + 10 CO2 + 8 H2O"],
    // numbers that count atoms, and charges that are clear
    ["H2+ + e- = H2", "H2+ + e- = H2"],
    ["I2 + I- = I3-", "I2 + I- = I3-"],
    ["NH4+ + NO2- = N2 + H2O", "NH4+ + NO2- = N2 + 2 H2O"],
    ["Fe+2 + Ce(4+) = Fe^3+ + Ce^3+", "Fe+2 + Ce(4+) = Fe^3+ + Ce^3+"],
    ["H2O (l) = H2O (g)", "H2O (l) = H2O (g)"],
    ["AgNO3(aq) + NaCl(aq) = AgCl(s) + NaNO3(aq)", "AgNO3(aq) + NaCl(aq) = AgCl(s) + NaNO3(aq)"],
  ])("%s", (text, expected) => {
    expect(balanced(text)).toBe(expected);
  });

  test("spreads over a range, each cell with its own answer", () => {
    const found = call("REACTION.BALANCE", [
      ["H2 + O2 = H2O", "CO = CO2"],
      [null, "N2 + H2 = NH3"],
    ]);
    expect(found[0]![0]).toBe("2 H2 + O2 = 2 H2O");
    expect(found[1]![1]).toBe("N2 + 3 H2 = 2 NH3");
    expect((found[0]![1] as CellError).message).toBe("No numbers above 0 balance CO and CO2: a species is missing or mistyped");
    expect((found[1]![0] as CellError).message).toBe('The equation is missing: give a text such as "CH4 + 2 O2 = CO2 + 2 H2O"');
  });

  test("what it gives is balanced for the other functions", () => {
    for (const text of ["C2H6 + O2 = CO2 + H2O", "NH3 + O2 = NO + H2O", "C(gr) + H2O = CO + H2"]) {
      const [[answer]] = call("REACTION.BALANCE", text) as [[string]];
      expect(Number.isFinite(number("REACTION.ENERGY", answer, 500))).toBe(true);
      expect(call("REACTION.BALANCE", answer)[0]![0]).toBe(answer);
    }
  });

  test.each<[unknown, string]>([
    [12, '#VALUE! The equation is 12; give a text such as "CH4 + 2 O2 = CO2 + 2 H2O"'],
    ["oxygen + H2 = O2 + H2O", "#VALUE! O2 (oxygen) stands on both sides; leave it out, or write it on the side where more of it stands"],
    ["O2(g) + H2 = O2 + H2O", "#VALUE! O2 (O2(g)) stands on both sides; leave it out, or write it on the side where more of it stands"],
    ["CH4 + air = CO2 + H2O", '#VALUE! "air" is a mixture; an equation names single species, such as "O2 + 3.76 N2" for air'],
    // read as two atoms of iron this would balance, with numbers that nobody means
    ["Fe2+ + Ce4+ = Fe3+ + Ce3+", '#VALUE! "Fe2+" can be read in two ways; write Fe^2+ for the charge 2+, or Fe2^+ for the charge + alone'],
    [
      "Ba^2+ + SO42-(aq) = BaSO4",
      '#VALUE! "SO42-(aq)" can be read in two ways; write SO4^2-(aq) for the charge 2-, or SO42^-(aq) for the charge - alone',
    ],
    [
      "[Fe(CN)6]4- = [Fe(CN)6]3- + e-",
      '#VALUE! "[Fe(CN)6]4-" can be read in two ways; write [Fe(CN)6]^4- for the charge 4-, or [Fe(CN)6]4^- for the charge - alone',
    ],
    ["Xx + O2 = XxO", '#VALUE! "Xx" in "Xx" is not the symbol of an element'],
    ["methan + O2 = CO2", '#N/A "methan" is not in the library; nearest: CH4, CH2O (methanal), CH3OH (methanol)'],
    [
      "water = H2 + O2",
      '#VALUE! "water" stands for several species: write H2O (water vapour) or H2O(l) (water, liquid) or H2O(cr) (water, ice)',
    ],
    ["NH3 + O2 = H2O", "#VALUE! Nothing on the right holds N, which NH3 on the left does"],
  ])("%s is refused", (text, sentence) => {
    expect(refusal("REACTION.BALANCE", text)).toBe(sentence);
  });
});

describe("energy, enthalpy and Cv", () => {
  test("combustion of methane, by hand from CODATA 1989 and ΔfH°(CH4) = −74.6 kJ/mol", () => {
    // −393.51 − 2 × 285.83 + 74.6 = −890.57; + 2 × 2.47896 = −885.612
    expect(number("REACTION.ENTHALPY", BALANCED, 298.15, "kJ/mol")).toBeCloseTo(-890.57, 2);
    expect(number("REACTION.ENERGY", BALANCED, "25 °C", "kJ/mol")).toBeCloseTo(-885.612, 2);
  });

  test("surplus and inert species on both sides change nothing, the size of the equation does", () => {
    const plain = number("REACTION.ENERGY", "CH4 + 2 O2 = CO2 + 2 H2O", 1200);
    expect(number("REACTION.ENERGY", "CH4 + 3 O2 + 7.52 N2 = CO2 + 2 H2O + O2 + 7.52 N2", 1200)).toBe(plain);
    expect(number("REACTION.ENERGY", "1/2 CH4 + O2 = 0.5 CO2 + H2O", 1200)).toBeCloseTo(plain / 2, 6);
    expect(number("REACTION.ENERGY", "CO2 + 2 H2O = CH4 + 2 O2", 1200)).toBeCloseTo(-plain, 6);
  });

  test("a blank before the phase does not count", () => {
    expect(number("REACTION.ENERGY", "CH4 (g) + 2 O2 (g) = CO2 (g) + 2 H2O (l)", 298.15)).toBe(number("REACTION.ENERGY", BALANCED, 298.15));
  });

  test("a name, a formula and a phase mean the same species", () => {
    expect(number("REACTION.ENERGY", "methane + 2 oxygen -> carbon dioxide + 2 liquid water", 298.15)).toBe(
      number("REACTION.ENERGY", BALANCED, 298.15),
    );
    expect(number("REACTION.CV", "CH4(g) + 2 O2(g) = CO2(g) + 2 H2O(g)", 400)).toBe(number("REACTION.CV", "CH4 + 2 O2 = CO2 + 2 H2O", 400));
  });

  test("six decimals are enough for a third", () => {
    const exact = number("REACTION.ENERGY", "1/3 N2 + H2 = 2/3 NH3", 298.15);
    expect(Math.abs(number("REACTION.ENERGY", "0.333333 N2 + H2 = 0.666667 NH3", 298.15) / exact - 1)).toBeLessThan(1e-6);
  });

  test("it is the sum over ENERGY, ENTHALPY and CV.AT of the species", () => {
    const terms: [string, number][] = [
      ["CO", -1],
      ["H2O", -1],
      ["CO2", 1],
      ["H2", 1],
    ];
    const temperature = fc.double({ min: 250, max: 3000, noNaN: true });
    fc.assert(
      fc.property(temperature, (at) => {
        for (const [id, of] of [
          ["ENERGY", "ENERGY"],
          ["ENTHALPY", "ENTHALPY"],
          ["CV", "CV.AT"],
        ] as const) {
          const sum = terms.reduce((total, [species, n]) => total + n * number(of, species, at), 0);
          // 1e-9 of the sum of sizes covers the order of adding
          expect(Math.abs(number(`REACTION.${id}`, "CO + H2O = CO2 + H2", at) - sum)).toBeLessThan(1e-6);
        }
      }),
    );
  });

  test("spreads over equations and temperatures", () => {
    const equations = [["CO + 1/2 O2 = CO2"], ["H2 + 1/2 O2 = H2O"]];
    const block = call("REACTION.ENTHALPY", equations, [[500], ["1000 K"]], "kJ/mol");
    expect(block).toEqual([
      [number("REACTION.ENTHALPY", equations[0]![0], 500, "kJ/mol")],
      [number("REACTION.ENTHALPY", equations[1]![0], 1000, "kJ/mol")],
    ]);
    const row = call("REACTION.CV", "H2 + 1/2 O2 = H2O", [[300, 99, new CellError("#DIV/0!")]]);
    expect(row[0]![0]).toBe(number("REACTION.CV", "H2 + 1/2 O2 = H2O", 300));
    expect((row[0]![1] as CellError).message).toBe(
      'Temperature 99 K is below 200 K, the lower limit of nasa-2002 for H2; for degrees Celsius write "99 °C"',
    );
    expect((row[0]![2] as CellError).code).toBe("#DIV/0!");
  });
});

describe("sets", () => {
  const SHIFT = "CO + H2O = CO2 + H2";
  const sum = (sets: Record<string, string | undefined>, at: number) =>
    [
      ["CO", -1],
      ["H2O", -1],
      ["CO2", 1],
      ["H2", 1],
    ].reduce((total, [species, n]) => total + Number(n) * number("ENERGY", species, at, null, sets[String(species)]), 0);

  test("an id is for every species, two columns are for those they name", () => {
    const gri = "gri-1999";
    expect(number("REACTION.ENERGY", SHIFT, 900, null, gri)).toBeCloseTo(sum({ CO: gri, H2O: gri, CO2: gri, H2: gri }, 900), 6);
    const table = [
      ["species", "set"],
      ["CO", gri],
      ["carbon dioxide", gri],
      ["H2", null],
    ];
    expect(number("REACTION.ENERGY", SHIFT, 900, null, table)).toBeCloseTo(sum({ CO: gri, CO2: gri }, 900), 6);
    expect(number("REACTION.ENERGY", SHIFT, 900, null, table)).not.toBeCloseTo(number("REACTION.ENERGY", SHIFT, 900), 1);
  });

  test("a list of ids spreads with the temperatures", () => {
    const found = call("REACTION.ENERGY", SHIFT, [[900, 900]], null, [["gri-1999", "nasa-2002"]]);
    expect(found).toEqual([[number("REACTION.ENERGY", SHIFT, 900, null, "gri-1999"), number("REACTION.ENERGY", SHIFT, 900)]]);
  });

  test("extrapolation carries gases, and leaves solids in their range", () => {
    const at = 6500;
    expect(refusal("REACTION.ENERGY", SHIFT, at, null, "gri-1999")).toMatch(/ K is above \d+ K, the upper limit of gri-1999 for /);
    expect(Number.isFinite(number("REACTION.ENERGY", SHIFT, at, null, "gri-1999; extrapolate"))).toBe(true);
    expect(refusal("REACTION.ENERGY", "C(gr) + O2 = CO2", at, null, "; extrapolate")).toBe(
      "#VALUE! Temperature 6500 K is above 6000 K, the upper limit of nasa-2002 for C(gr)",
    );
    expect(number("REACTION.ENERGY", "C(gr) + O2 = CO2", 3000, null, "; extrapolate")).toBe(
      number("REACTION.ENERGY", "C(gr) + O2 = CO2", 3000),
    );
  });

  test("a coefficient block gives its species, the library the others", () => {
    // a fuel of constant Cp 30 J/(mol K) and ΔfH −50 kJ/mol, CODATA R: U(400 K) = −50 000 + 30 × 101.85 − R 400
    const fuel = [["Cp", "g", "C7H8O2", "power 0", 200, 3000, "J/(mol K)", null, -50000, null, 30]];
    const equation = "C7H8O2 + 8 O2 = 7 CO2 + 4 H2O";
    const own = -50000 + 30 * (400 - 298.15) - 8.314462618 * 400;
    const others = 7 * number("ENERGY", "CO2", 400) + 4 * number("ENERGY", "H2O", 400) - 8 * number("ENERGY", "O2", 400);
    expect(number("REACTION.ENERGY", equation, 400, null, fuel)).toBeCloseTo(others - own, 5);
    expect(refusal("REACTION.ENERGY", equation, 400)).toMatch(/^#N\/A "C7H8O2" is not in the library; nearest: /);
    const without = [["Cp", "g", "C7H8O2", "power 0", 200, 3000, "J/(mol K)", null, null, null, 30]];
    expect(refusal("REACTION.ENERGY", equation, 400, null, without)).toBe(
      "#VALUE! No formation enthalpy is known in the coefficient block for C7H8O2(g); it is needed for the energy of a reaction",
    );
    expect(Number.isFinite(number("REACTION.CV", equation, 400, null, without))).toBe(true);
  });

  test.each<[unknown, string]>([
    ["usc-2007", "#N/A Set usc-2007 does not hold CO; sets that do: "],
    ["nasa-2003", '#N/A There is no set "nasa-2003"; the sets are nasa-2002, gri-1999'],
    [[["CO", "nasa-2003"]], '#N/A There is no set "nasa-2003"; the sets are nasa-2002, gri-1999'],
    [
      [
        ["CH4", "gri-1999"],
        ["methane", "nasa-2002"],
      ],
      "#VALUE! Row 2 of the sets names CH4 once more; give one set for each species",
    ],
    [
      [
        ["CO", "gri-1999"],
        [null, "nasa-2002"],
      ],
      "#VALUE! Row 2 of the sets has blank where a species is expected",
    ],
    [[["carbon monoxid", "gri-1999"]], '#N/A "carbon monoxid" is not in the library; nearest: CO'],
    [[["CO", new CellError("#REF!")]], "#REF! "],
  ])("%j is refused", (set, sentence) => {
    expect(refusal("REACTION.ENERGY", SHIFT, 900, null, set)).toContain(sentence);
  });
});

test.each<[string, unknown[], string]>([
  [
    "ENERGY",
    ["CH4 + O2 = CO2 + H2O", 298.15],
    '#VALUE! "CH4 + O2 = CO2 + H2O" is not balanced: H 4 on the left, 2 on the right; O 2 on the left, 3 on the right; balanced it is CH4 + 2 O2 = CO2 + 2 H2O',
  ],
  // with a surplus the numbers are the user's to mend
  [
    "ENTHALPY",
    ["CH4 + 3 O2 = CO2 + H2O + O2", 298.15],
    '#VALUE! "CH4 + 3 O2 = CO2 + H2O + O2" is not balanced: H 4 on the left, 2 on the right; O 6 on the left, 5 on the right',
  ],
  ["CV", ["CO = CO2", 298.15], '#VALUE! "CO = CO2" is not balanced: O 1 on the left, 2 on the right'],
  [
    "CV",
    ["H2 + 1/2 O2 = H2O(l)", 298.15],
    "#VALUE! H2O(l) is liquid, and the Cv of a liquid is not its Cp: the change of Cv of this reaction is not known",
  ],
  [
    "ENERGY",
    [BALANCED, 298.15, "kJ/kg"],
    '#VALUE! The unit "kJ/kg" does not fit this result; give an energy by amount such as "kJ/mol": a reaction is per mole of the equation as written; for a value by mass divide by the molar mass of the substance meant (MOLARMASS)',
  ],
  ["ENERGY", [BALANCED, 298.15, "nasa-2002"], '#VALUE! "nasa-2002" is a set id; the unit comes first, the set after it'],
  [
    "ENERGY",
    [BALANCED, 25],
    '#VALUE! Temperature 25 K is below 273.15 K, the lower limit of nasa-2002 for H2O(l); for degrees Celsius write "25 °C"',
  ],
  ["ENERGY", [BALANCED, 700], "#VALUE! Temperature 700 K is above 600 K, the upper limit of nasa-2002 for H2O(l)"],
  ["ENERGY", [BALANCED, null], '#VALUE! Temperature is missing: give a number in K, or a text such as "25 °C"'],
  [
    "ENERGY",
    ["H+ + OH- = H2O", 298.15],
    "#N/A H+ carries a charge, and the library has no energies of ions and electrons; REACTION.BALANCE balances them",
  ],
  ["ENERGY", ["CO2(aq) = CO2", 298.15], "#N/A CO2(aq) is in solution, and the library has no energies of solutions"],
  ["ENERGY", ["CH4 + 2 air = CO2", 298.15], '#VALUE! "air" is a mixture; an equation names single species, such as "O2 + 3.76 N2" for air'],
  ["ENERGY", ["C + O2 = CO2", 298.15], '#VALUE! "C" stands for several species: write C(g) (carbon atom) or C(gr) (graphite)'],
  ["ENERGY", [null, 298.15], '#VALUE! The equation is missing: give a text such as "CH4 + 2 O2 = CO2 + 2 H2O"'],
])("REACTION.%s %j is refused", (id, given, sentence) => {
  expect(refusal(`REACTION.${id}`, ...given)).toBe(sentence);
});

describe("fits that begin at 300 K serve 25 °C, as they do in BURN", () => {
  // ΔcH° of the gases at 298.15 K, water liquid: n-heptane −4853.5, isooctane −5496.5 kJ/mol: formation −187.7 and −224.0 kJ/mol with the
  // products' −393.51 and −285.83 (from memory); the fits' own formation values differ from these by up to 1.6 kJ/mol.
  test.each([
    ["n-C7H16 + 11 O2 = 7 CO2 + 8 H2O(l)", -4853.5],
    ["i-C8H18 + 12.5 O2 = 8 CO2 + 9 H2O(l)", -5496.5],
  ])("%s", (equation, printed) => {
    expect(Math.abs(number("REACTION.ENTHALPY", equation, 298.15, "kJ/mol") - printed)).toBeLessThan(2.5);
  });

  test("the table says what is held; below 298.15 K it is refused", () => {
    const table = call("REACTION.RIGID", "i-C8H18 + 12.5 O2 = 8 CO2 + 9 H2O", "25 °C", "10 kPa", 1000);
    expect(table.map((row) => row[3])).toContain(
      "c3mech-2022 for i-C8H18 begins at 300 K; from there down to 298.15 K the heat capacity at 300 K is held",
    );
    expect(refusal("REACTION.ENERGY", "i-C8H18 + 12.5 O2 = 8 CO2 + 9 H2O", 290)).toBe(
      "#VALUE! Temperature 290 K is below 298.15 K, the lower limit of c3mech-2022 for i-C8H18",
    );
  });
});
