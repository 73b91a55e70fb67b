/** Capacities of what is only put in: a fuel known at 25 °C alone, and gases whose fits begin a little above it. */
import { capacityOf } from "../../../src/core/capacity";
import { extrapolated } from "../../../src/core/capacity/range";
import { fixedEnergy } from "../../../src/core/capacity/fixed-energy";
import { reachingReference } from "../../../src/core/capacity/reference";
import { allSpecies, recordOf, recordsOf } from "../../../src/data/library";

describe("a substance known at 25 °C alone", () => {
  test("holds its energy at every temperature; a gas keeps H − U = RT", () => {
    const [solid, gas] = [fixedEnergy(-385200, "cr", "a solid"), fixedEnergy(-74600, "g", "a gas")];
    for (const temperature of [10, 298.15, 350, 5000]) {
      expect(solid.energy(temperature)).toBe(-385200);
      expect(solid.enthalpy(temperature)).toBe(-385200);
      // R = 8.314462618 J/(mol K), 298.15 K: 2478.957 J/mol
      expect(gas.energy(temperature)).toBeCloseTo(-74600 - 2478.957, 3);
      expect(gas.enthalpy(temperature) - gas.energy(temperature)).toBeCloseTo(8.314462618 * temperature, 4);
    }
    expect(gas.enthalpy(298.15)).toBe(-74600);
  });

  test("has no heat capacity and no entropy, which a balance could take for nothing", () => {
    const solid = fixedEnergy(-385200, "cr", "a solid");
    expect([solid.cp(300), solid.cv(300), solid.entropy(300)]).toEqual([NaN, NaN, NaN]);
    expect([solid.onFormationScale, solid.hasEntropy, solid.phase]).toEqual([true, false, "cr"]);
  });
});

const fits = allSpecies().flatMap(({ key }) => recordsOf(key));

describe("a fit that begins just above 298.15 K", () => {
  const early = fits
    .map((fit) => ({ fit, own: capacityOf(fit) }))
    .filter(({ own }) => own.from > 298.15 && own.from < 300.5 && own.onFormationScale);

  test("is that of many a fuel", () => {
    const keys = early.map(({ fit }) => `${fit.set} ${fit.species}`);
    for (const one of ["gri-1999 N2", "jetsurf-2010 n-C7H16", "c3mech-2022 i-C8H18", "aramco-2016 C2H5OH"]) expect(keys).toContain(one);
  });

  test.each(early)("$fit.set for $fit.species reaches 298.15 K and is itself above", ({ own }) => {
    const reaching = reachingReference(own);
    expect(reaching.from).toBe(298.15);
    expect(reaching.energy(298)).toBeNaN();
    for (const temperature of [300.01, 900, 1000, 2500]) {
      expect(reaching.energy(temperature)).toBe(own.energy(temperature));
      expect(reaching.enthalpy(temperature)).toBe(own.enthalpy(temperature));
    }
    // at the joint itself the carried part is used: the same value, summed in another order
    expect(Math.abs(reaching.energy(own.from) / own.energy(own.from) - 1)).toBeLessThan(1e-12);
    const fall = own.enthalpy(own.from) - reaching.enthalpy(298.15);
    expect(Math.abs(fall - own.cp(own.from) * (own.from - 298.15))).toBeLessThan(1e-9 * Math.abs(own.enthalpy(own.from)) + 1e-9);
    // the same as extrapolation, which the user may ask for by name
    expect(reaching.enthalpy(299)).toBe(extrapolated(own).enthalpy(299));
    // what the held Cp leaves out: half the slope of Cp times the gap squared; the largest is 1.4 J/mol, of dodecane
    expect((Math.abs(own.cp(own.from + 2) - own.cp(own.from)) / 2) * ((own.from - 298.15) ** 2 / 2)).toBeLessThan(1.5);
  });
});

test("every other fit comes back as it is", () => {
  const [nitrogen, sulfur, relative] = [recordOf("N2", "nasa-2002"), recordOf("S(b)", "nasa-2002"), recordOf("SiC(cr)", "srd69-shomate")];
  for (const fit of [nitrogen, sulfur, relative]) {
    const own = capacityOf(fit);
    expect(reachingReference(own)).toBe(own);
  }
});
