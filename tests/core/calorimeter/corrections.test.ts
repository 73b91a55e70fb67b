/** Energy equivalent, gross value, certificate factor, acids, fuses, buoyancy: the formulas of the core against values computed apart. */
import fc from "fast-check";
import { acidBalance, nitricHeat, sulfurAmount, sulfuricHeat } from "../../../src/core/calorimeter/acids";
import { burningHeat, type BurningKind } from "../../../src/core/calorimeter/burning-heat";
import { massInVacuum } from "../../../src/core/calorimeter/buoyancy";
import { certificateFactor, certificateShares, factorOf } from "../../../src/core/calorimeter/certificate";
import { energyEquivalent } from "../../../src/core/calorimeter/energy-equivalent";
import { grossValue, type GrossRun } from "../../../src/core/calorimeter/gross-value";
import { acidsByTitration } from "../../../src/core/calorimeter/titration";
import { certificate } from "../../../src/data/calorimetry";
import { refusedWith } from "../refused";

const conditions = { pressure: 30 * 0.101325, volume: 1000 / 3, sampleMass: 1, waterMass: 1, temperature: 25 };
const heats = { nitric: 60000, sulfuric: 301700, sulfurMolarMass: 32.06 };

describe("energy equivalent and gross value", () => {
  test("1.0012 g of benzoic acid, 247 J beside, 2.499819 K: 10 685.86 J/K", () => {
    // Computed independently from ε = (m q + Q)/θ with the certified 26 434 J/g (NIST certificate, from memory)
    expect(energyEquivalent(1.0012, 26434, 2.499819, 247)).toBeCloseTo(10685.86, 2);
  });

  test("the condition factor multiplies the certified value", () => {
    const at = (factor: number) => energyEquivalent(1.0012, 26434, 2.499819, 247, factor);
    expect(at(1.0002) - at(1)).toBeCloseTo((1.0012 * 26434 * 0.0002) / 2.499819, 8);
  });

  test("the gross value undoes the energy equivalent of the same run", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.3, max: 2, noNaN: true }),
        fc.double({ min: 1, max: 5, noNaN: true }),
        fc.double({ min: 0, max: 300, noNaN: true }),
        (mass, rise, q) => {
          const equivalent = energyEquivalent(mass, 26434, rise, q);
          const run: GrossRun = { equivalent, rise, mass, heats: q, sulfurHeat: 0, soot: 0 };
          expect(grossValue(run, 33000)).toBeCloseTo(26434, 7);
        },
      ),
    );
  });

  test("each heat deducted and soot added back by its own amount", () => {
    const run: GrossRun = { equivalent: 10200, rise: 2.75, mass: 1, heats: 0, sulfurHeat: 0, soot: 0 };
    const base = grossValue(run, 33000);
    expect(base).toBeCloseTo(28050, 9);
    expect(grossValue({ ...run, heats: 122 }, 33000)).toBeCloseTo(base - 122, 9);
    expect(grossValue({ ...run, sulfurHeat: 94.1 }, 33000)).toBeCloseTo(base - 94.1, 9);
    expect(grossValue({ ...run, soot: 0.0005 }, 33000)).toBeCloseTo(base + 16.5, 9); // 0.5 mg × 33 kJ/g
  });

  test("refusals", () => {
    const run: GrossRun = { equivalent: 10200, rise: 2.75, mass: 1, heats: 0, sulfurHeat: 0, soot: 0 };
    expect(refusedWith(() => grossValue({ ...run, soot: 0.02 }, 33000))).toBe(
      "range: Soot 0.02 g is more than 1 % of the sample, 0.01 g: the combustion was incomplete; repeat the run",
    );
    expect(refusedWith(() => grossValue({ ...run, heats: 30000 }, 33000))).toBe(
      "range: The heats deducted, 30000 J, are not below the heat released, 28050 J",
    );
    expect(refusedWith(() => grossValue({ ...run, mass: 0.1 }, 33000))).toBe(
      "range: The value would be 280500 J/g, above that of hydrogen: check energy equivalent 10200 J/K, rise 2.75 K and mass 0.1 g",
    );
    expect(refusedWith(() => grossValue({ ...run, heats: -1 }, 33000))).toBe("range: Heats -1 J are negative");
    expect(refusedWith(() => energyEquivalent(1, 26434, 0, 0))).toBe("range: Corrected rise 0 K is not above 0 K");
    expect(refusedWith(() => energyEquivalent(0, 26434, 2, 0))).toBe("range: Sample mass 0 g is not above 0 g");
    expect(refusedWith(() => energyEquivalent(1, 26434, 2, -3))).toBe("range: Heats -3 J are negative");
  });
});

describe("condition factor of the certificate", () => {
  // Computed independently from the printed coefficients 20, 42, 30, -45 (from memory of Coops, Jessup, van Nes 1956)
  test.each([
    ["certificate conditions", {}, 1],
    ["40 atm", { pressure: 40 * 0.101325 }, 1.0002],
    ["3.5 g/L of sample", { sampleMass: 3.5 / 3 }, 1.000021],
    ["26 °C", { temperature: 26 }, 0.999955],
  ])("%s", (_, change, factor) => {
    expect(certificateFactor({ ...conditions, ...change }, certificate)).toBeCloseTo(factor, 9);
  });

  test("26 434 J/g become 26 439.29 J/g at 40 atm", () => {
    expect(26434 * certificateFactor({ ...conditions, pressure: 4.053 }, certificate)).toBeCloseTo(26439.29, 2);
  });

  test("no water in a vessel of 0.34 L: 0.9999075, outside the limits", () => {
    const dry = { ...conditions, volume: 340, waterMass: 0 };
    expect(certificateFactor(dry, certificate, true)).toBeCloseTo(0.9999075, 7);
    expect(refusedWith(() => certificateFactor(dry, certificate))).toBe(
      'range: Water load 0 g/L is outside 2 to 4 g/L, the limits of the certificate\'s condition factor; "beyond limits" as last argument gives the value nevertheless',
    );
  });

  test("5 mL of water in 0.34 L: 14.7 g/L is out of range", () => {
    const shares = certificateShares({ ...conditions, volume: 340, waterMass: 5 }, certificate);
    expect(shares.map(({ inside }) => inside)).toEqual([true, true, false, true]);
    expect(shares[2]!.value).toBeCloseTo(14.7, 1);
  });

  test("limits met exactly are inside, and each step past them is outside", () => {
    const at = (change: Partial<typeof conditions>) =>
      certificateShares({ ...conditions, ...change }, certificate).every(({ inside }) => inside);
    for (const pressure of [20, 40]) expect(at({ pressure: pressure * 0.101325 })).toBe(true);
    for (const temperature of [20, 30]) expect(at({ temperature })).toBe(true);
    for (const load of [2 / 3, 4 / 3]) expect([at({ sampleMass: load }), at({ waterMass: load })]).toEqual([true, true]);
    expect(at({ pressure: 40.01 * 0.101325 })).toBe(false);
    expect(at({ temperature: 19.9 })).toBe(false);
    expect(at({ sampleMass: 0.66 })).toBe(false);
    expect(at({ waterMass: 1.34 })).toBe(false);
  });

  test("the shares add up to the factor", () => {
    const shares = certificateShares({ pressure: 2.5, volume: 310, sampleMass: 0.95, waterMass: 1, temperature: 27 }, certificate);
    expect(factorOf(shares)).toBe(1 + shares.reduce((sum, { millionths }) => sum + millionths, 0) / 1e6);
  });
});

describe("acids", () => {
  test("6.0 J for each mL of 0.1 mol/L, 94.1 J for each per cent and gram, and their excess", () => {
    // Printed routine values (ISO 1928, from memory); the excess derived from (h_S − 2 h_N)/M_S
    expect(nitricHeat(1, 0.1, heats.nitric)).toBeCloseTo(6, 12);
    expect(sulfuricHeat(1, 1, "separated", heats)).toBeCloseTo(94.1, 1);
    expect(sulfuricHeat(1, 1, "total", heats)).toBeCloseTo(56.7, 1);
    expect(sulfuricHeat(1, 1, "total", { ...heats, nitric: 59000 })).toBeCloseTo(57.3, 1);
    expect(sulfuricHeat(1, 1, "total", { ...heats, nitric: 57800 })).toBeCloseTo(58.0, 1);
  });

  test("1.2 % S, 5 mL of nitric acid, 0.9 g: both conventions deduct 146.25 J/g", () => {
    const titrant = 5 + 20000 * sulfurAmount(1.2, 0.9, 32.06); // mL of 0.1 mol/L
    const { separated, total, countedTwice } = acidBalance(titrant, 0.1, 1.2, 0.9, heats);
    expect(separated.nitric).toBeCloseTo(30, 9);
    expect((separated.nitric + separated.sulfuric) / 0.9).toBeCloseTo(146.26, 2);
    expect(Math.abs(separated.nitric + separated.sulfuric - total.nitric - total.sulfuric) / 0.9).toBeLessThan(1e-9);
    expect(Math.abs(33.333 + 94.1 * 1.2 - (total.nitric + total.sulfuric) / 0.9)).toBeLessThan(0.02); // 146.25 with the printed 94.1
    expect(countedTwice / 0.9).toBeCloseTo(44.9, 1); // too low, if both are deducted
  });

  test("deducting only a printed excess of 57 beside nitric acid alone is 44.5 J/g too high", () => {
    const excess = sulfuricHeat(1.2, 0.9, "total", { ...heats, sulfuric: 57 * 3206 + 2 * heats.nitric });
    expect((sulfuricHeat(1.2, 0.9, "separated", heats) - excess) / 0.9).toBeCloseTo(44.5, 1);
  });

  test("both conventions agree for any run", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 8, noNaN: true }),
        fc.double({ min: 0.2, max: 1.5, noNaN: true }),
        fc.double({ min: 0, max: 30, noNaN: true }),
        (sulfur, mass, nitric) => {
          const titrant = nitric + 20000 * sulfurAmount(sulfur, mass, 32.06) * (1 + 1e-12);
          const { separated, total } = acidBalance(titrant, 0.1, sulfur, mass, heats);
          expect(separated.nitric + separated.sulfuric).toBeCloseTo(total.nitric + total.sulfuric, 8);
        },
      ),
    );
  });

  test("refusals", () => {
    expect(refusedWith(() => acidBalance(5, 0.1, 1.2, 0.9, heats))).toBe(
      "range: The total acid, 0.5 mmol, is less than the 0.673737 mmol that 1.2 % sulfur alone would give: check the titration, or whether nitric acid alone was titrated",
    );
    expect(refusedWith(() => sulfuricHeat(1, 1, "total", { ...heats, sulfuric: 100000 }))).toBe(
      "input: A molar heat of sulfuric acid of 100000 J/mol is not above twice that of nitric acid, 120000 J/mol",
    );
    expect(refusedWith(() => nitricHeat(-1, 0.1, 60000))).toBe("range: Volume of titrant -1 mL is negative");
  });
});

describe("double titration", () => {
  const usual = { barium: 0.05, carbonate: 0.05, acid: 0.1 };

  test("9.0 mL barium hydroxide, 15.0 mL hydrochloric acid: 0.5 mmol of nitric, 0.2 mmol of sulfuric acid", () => {
    // By the printed equations 6.0 (20 − V) and 15.1 (V_Ba + V − 20): 30.0 J and 60.4 J, 6.41 mg S
    const { nitric, sulfuric } = acidsByTitration({ barium: 9, carbonate: 20, acid: 15 }, usual);
    expect(nitric).toBeCloseTo(0.5, 12);
    expect(sulfuric).toBeCloseTo(0.2, 12);
    expect(sulfuric * 32.06).toBeCloseTo(6.41, 2);
  });

  test("volumes made from known amounts give the amounts back, at any concentrations", () => {
    const positive = fc.double({ min: 0.02, max: 0.2, noNaN: true });
    fc.assert(
      fc.property(
        positive,
        positive,
        positive,
        fc.double({ min: 0, max: 0.6, noNaN: true }),
        fc.double({ min: 0, max: 0.6, noNaN: true }),
        (barium, carbonate, acid, nitric, sulfuric) => {
          const given = { barium, carbonate, acid };
          const volumes = { barium: (nitric + 2 * sulfuric) / (2 * barium), carbonate: 20, acid: (40 * carbonate - nitric) / acid };
          const found = acidsByTitration(volumes, given);
          expect(found.nitric).toBeCloseTo(nitric, 9);
          expect(found.sulfuric).toBeCloseTo(sulfuric, 9);
        },
      ),
    );
  });

  test("refusals", () => {
    expect(refusedWith(() => acidsByTitration({ barium: 9, carbonate: 20, acid: 21 }, usual))).toBe(
      "range: The hydrochloric acid, 2.1 mmol, is more than the carbonate can take, 2 mmol: check 21 mL against 20 mL of carbonate",
    );
    expect(refusedWith(() => acidsByTitration({ barium: 3, carbonate: 20, acid: 15 }, usual))).toBe(
      "range: The nitric acid, 0.5 mmol, is more than all acid found with barium hydroxide, 0.3 mmol: check the volumes",
    );
  });
});

describe("fuses and aids", () => {
  const wire: BurningKind = { kind: "test wire", plain: "length", perCentimetre: 9.6, perGram: 6000, mostCentimetres: 12, mostGrams: 0.1 };

  test("length, mass and a heat of one's own", () => {
    expect(burningHeat(wire, "length", 4.1)).toBeCloseTo(39.4, 1); // 4.1 cm × 9.6 J/cm, as printed in ASTM D240 (from memory)
    expect(burningHeat(wire, "mass", 0.007)).toBeCloseTo(42, 9);
    expect(burningHeat(wire, "length", 5, 10)).toBe(50);
  });

  test("refusals: larger than the wire, negative, by a measure without a heat", () => {
    expect(refusedWith(() => burningHeat(wire, "length", 14))).toBe(
      "range: Test wire consumed 14 cm is above 12 cm, larger than the wire: give what was consumed, the length fitted less the length that remained",
    );
    expect(refusedWith(() => burningHeat(wire, "length", -1))).toBe("range: Test wire consumed -1 cm is negative");
    const thread: BurningKind = { kind: "thread", plain: "mass", perGram: 17500, mostGrams: 0.5 };
    expect(refusedWith(() => burningHeat(thread, "length", 3))).toBe(
      "input: No heat by length is known for thread: give what was consumed by mass",
    );
    expect(refusedWith(() => burningHeat(thread, "mass", 50))).toBe(
      'range: Thread consumed 50 g is above 0.5 g, larger than a run can hold: give grams, or a text such as "50 mg"',
    );
  });
});

describe("buoyancy", () => {
  test("benzoic acid of 1.320 g/cm3 in air of 0.0012: 1.0007669 with brass, 1.0007598 with weights of 8.0", () => {
    // Derived from Archimedes' law; 26 434 J/g in vacuum are 26 454 J/g in air (as in circulation, from memory)
    expect(massInVacuum(1, 1.32, 8.4, 0.0012)).toBeCloseTo(1.0007669, 7);
    expect(massInVacuum(1, 1.32, 8, 0.0012)).toBeCloseTo(1.0007598, 7);
    expect(26434 * massInVacuum(1, 1.32, 8.4, 0.0012)).toBeCloseTo(26454, 0);
  });

  test("a sample as dense as the weights needs no correction", () => {
    expect(massInVacuum(1.2345, 8, 8, 0.0012)).toBeCloseTo(1.2345, 12);
  });

  test("refusals", () => {
    expect(refusedWith(() => massInVacuum(1, 0.001, 8, 0.0012))).toBe(
      "range: The density of the sample, 0.001 g/cm3, is not above that of the air, 0.0012 g/cm3",
    );
    expect(refusedWith(() => massInVacuum(1, 1.3, 0.001, 0.0012))).toBe(
      "range: The density of the weights, 0.001 g/cm3, is not above that of the air, 0.0012 g/cm3",
    );
  });
});
