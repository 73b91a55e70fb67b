/** A gas of fixed amount in a fixed volume: figures computed elsewhere, and what its state must fulfil with and without an equation of state. */
import fc from "fast-check";
import { capacityOf, type Capacity } from "../../../src/core/capacity";
import { GAS_CONSTANT } from "../../../src/core/constants";
import { compileMixture } from "../../../src/core/mixture/compile";
import { gaussLegendre, integrate } from "../../../src/core/numeric/gauss-legendre";
import { CubicGas } from "../../../src/core/realgas/cubic-gas";
import { criticalVolume, cubicSaturation } from "../../../src/core/realgas/saturation";
import { volumeAt } from "../../../src/core/realgas/state";
import { molarMass, parseFormula } from "../../../src/core/species/formula";
import { GasContent } from "../../../src/core/vessel/gas-content";
import { atomicWeights, recordOf } from "../../../src/data/library";
import { derivative } from "../../laws/realgas-support";
import { type Equation, EQUATIONS, formOf, mixtureOf, pureGas } from "../realgas/gases";
import { refusedWith } from "../refused";

const R = GAS_CONSTANT;
const capacity = (species: string, set = "nasa-2002"): Capacity => capacityOf(recordOf(species, set));
const mixed = (fractions: Readonly<Record<string, number>>): Capacity =>
  compileMixture(Object.entries(fractions).map(([species, amount]) => ({ capacity: capacity(species), amount })));

describe("nitrogen of 200 bar at 15 °C in a bottle, Peng-Robinson (Tc 126.192 K, Pc 3.3958 MPa, ω 0.0372)", () => {
  const critical = { species: "N2", temperature: 126.192, pressure: 3.3958e6, acentric: 0.0372 };
  const gas = new CubicGas(formOf("peng-robinson"), [{ fraction: 1, critical }]);
  const volume = 0.05;
  const amount = volume / volumeAt(gas, 288.15, 2e7);
  const bottle = new GasContent(capacity("N2"), amount, volume, gas);

  // Computed from the formula apart from this program; half a bar.
  test.each([
    [15, 200],
    [50, 234],
    [100, 282],
    [300, 467],
  ])("at %d °C it has %d bar", (celsius, bar) => expect(Math.abs(bottle.at(celsius + 273.15).pressure / 1e5 - bar)).toBeLessThan(0.5));

  test("the ratio of temperatures says less: 224, 259, 398 bar", () => {
    const ideal = new GasContent(capacity("N2"), (2e7 * volume) / (R * 288.15), volume);
    for (const [celsius, bar] of [
      [50, 224],
      [100, 259],
      [300, 398],
    ] as const)
      // prettier-ignore
      expect(Math.abs(ideal.at(celsius + 273.15).pressure / 1e5 - bar)).toBeLessThan(0.5);
  });
});

describe("the state", () => {
  test("of an ideal gas", () => {
    const content = new GasContent(capacity("N2"), 2, 0.01);
    const state = content.at(300);
    expect(state).toMatchObject({ phase: "ideal gas", temperature: 300, compressibility: 1 });
    expect(state.pressure).toBe((R * 300) / 0.005);
    expect(state.energy).toBe(2 * capacity("N2").energy(300));
    expect(state.heatCapacity).toBe(2 * capacity("N2").cv(300));
    expect([content.from, content.to, content.toLabel, content.kinks]).toEqual([200, 20000, "nasa-2002 for N2", []]);
  });

  test("of a real one is that of the ideal one and the residuals", () => {
    const gas = pureGas("CO2");
    const state = new GasContent(capacity("CO2"), 3, 3e-3, gas).at(320);
    expect(state.pressure).toBe(gas.pressure(320, 1e-3));
    expect(state.energy).toBe(3 * (capacity("CO2").energy(320) + gas.residualEnergy(320, 1e-3)));
    expect(state.heatCapacity).toBe(3 * (capacity("CO2").cv(320) + gas.residualCv(320, 1e-3)));
    expect(state.compressibility).toBe((state.pressure * 1e-3) / (R * 320));
    expect(state.phase).toBe("gas");
  });

  const pure = fc.tuple(fc.constantFrom("CO2", "N2", "C3H8", "NH3", "H2O"), fc.constantFrom(...EQUATIONS));

  test("its heat capacity is ∂U/∂T at constant volume, also of two phases", () =>
    fc.assert(
      fc.property(
        pure,
        fc.double({ min: 210, max: 800, noNaN: true }),
        fc.double({ min: 0.4, max: 5, noNaN: true }),
        ([species, equation], t, log) => {
          const gas = pureGas(species, equation);
          const content = new GasContent(capacity(species), 1, gas.b * 10 ** log * 1.3, gas);
          const end = content.twoPhasesUpTo ?? 0;
          const h = Math.min(0.004 * t, 0.2 * Math.abs(t - end));
          // near the joints of the fit, and where two phases end, a difference would reach across
          if (h < 1e-3 || Math.abs(t - gas.criticalTemperature) < 2) return;
          const { heatCapacity, energy } = content.at(t);
          const difference = derivative((x) => content.at(x).energy, t, h);
          const rounding = (1e-14 * (Math.abs(energy) + 1e5)) / h;
          expect(Math.abs(heatCapacity - difference)).toBeLessThan(1e-6 * heatCapacity + 10 * rounding);
        },
      ),
      { numRuns: 300 },
    ));

  test("heat from T1 to T2 is n times the integral of Cv", () => {
    const quadrature = gaussLegendre(32);
    for (const [content, t1, t2] of [
      [new GasContent(capacity("N2"), 2, 0.01), 300, 900],
      [new GasContent(capacity("CO2"), 3, 3e-3, pureGas("CO2")), 310, 950],
      [new GasContent(mixed({ N2: 0.79, O2: 0.21 }), 5, 1e-3, mixtureOf({ N2: 0.79, O2: 0.21 }, "soave")), 250, 900],
      // liquid and vapour of propane, from 220 K to where one of them is gone
      [new GasContent(capacity("C3H8"), 1, 1e-3, pureGas("C3H8")), 220, 300],
    ] as const) {
      const heat = content.at(t2).energy - content.at(t1).energy;
      const integral = integrate((t) => content.at(t).heatCapacity, t1, t2, quadrature, 12);
      expect(Math.abs(integral / heat - 1)).toBeLessThan(1e-10);
    }
  });

  test("on the way of a search it is the same as at the end, and nothing outside the range", () => {
    const gas = mixtureOf({ CH4: 0.9, "i-C4H10": 0.1 });
    const content = new GasContent(mixed({ CH4: 0.9, "i-C4H10": 0.1 }), 2, 1e-3, gas);
    const { energy, heatCapacity } = content.at(400);
    expect(content.trial(400)).toEqual({ energy, heatCapacity });
    // A mixture is taken as one phase on the way, and refused at the end.
    expect(content.trial(230).energy).toBeLessThan(energy);
    expect(refusedWith(() => content.at(230))).toContain("part of it would condense");
    expect(content.trial(100)).toEqual({ energy: NaN, heatCapacity: NaN });
    expect(new GasContent(capacity("N2"), 1, 1).trial(100)).toEqual({ energy: NaN, heatCapacity: NaN });
    expect(new GasContent(capacity("CO2"), 1, 1, pureGas("CO2")).trial(100)).toEqual({ energy: NaN, heatCapacity: NaN });
  });
});

describe("where two phases end", () => {
  test.each<[string, number, Equation]>([
    ["CO2", 3e-4, "peng-robinson"],
    ["CO2", 6e-5, "peng-robinson"],
    ["C3H8", 1e-3, "soave"],
    ["C3H8", 1.1e-4, "soave"],
    ["H2O", 0.02, "peng-robinson"],
  ])("%s at %d m3/mol: at the saturation of the phase that stays, by %s", (species, volume, equation) => {
    const gas = pureGas(species, equation);
    const content = new GasContent(capacity(species), 1, volume, gas);
    const end = content.twoPhasesUpTo!;
    expect(content.kinks).toEqual([end]);
    const { liquid, vapour } = cubicSaturation(gas, end)!;
    const stays = volume > criticalVolume(gas) ? vapour : liquid;
    expect(Math.abs(stays / volume - 1)).toBeLessThan(1e-9);
    expect([content.at(end - 1e-6).phase, content.at(end + 1e-6).phase]).toEqual([
      "two-phase",
      volume > criticalVolume(gas) ? "gas" : "liquid",
    ]);
    // Neither pressure nor energy jumps, the heat capacity does.
    const [below, above] = [content.at(end - 1e-7), content.at(end + 1e-7)];
    expect(Math.abs(below.pressure / above.pressure - 1)).toBeLessThan(1e-7);
    expect(Math.abs(below.energy - above.energy)).toBeLessThan(4e-7 * below.heatCapacity);
    expect(below.heatCapacity).toBeGreaterThan(above.heatCapacity + 0.1 * R);
  });

  test("at the critical volume they end at the critical temperature", () => {
    const gas = pureGas("CO2");
    expect(new GasContent(capacity("CO2"), 1, criticalVolume(gas), gas).twoPhasesUpTo).toBe(gas.criticalTemperature);
  });

  test("of a thin gas, a mixture, an ideal gas there are none", () => {
    const none = [
      new GasContent(capacity("CO2"), 1, 1, pureGas("CO2")),
      new GasContent(capacity("N2"), 1, 1e-4, pureGas("N2")),
      new GasContent(capacity("CO2"), 1, 1e-4),
      new GasContent(mixed({ CO2: 0.5, N2: 0.5 }), 1, 1e-4, mixtureOf({ CO2: 0.5, N2: 0.5 })),
    ];
    for (const content of none) expect([content.twoPhasesUpTo, content.kinks]).toEqual([undefined, []]);
  });

  test("37.5 kg of CO2 in 50 L at 15 °C are liquid beside vapour, and fill the vessel as liquid before 31 °C", () => {
    const mass = molarMass(parseFormula("CO2"), atomicWeights);
    const gas = pureGas("CO2");
    const content = new GasContent(capacity("CO2"), 37500 / mass, 0.05, gas);
    const state = content.at(288.15);
    expect(state.phase).toBe("two-phase");
    // 5.09 MPa by tables (from memory), 1 % by the equation.
    expect(Math.abs(state.pressure / 5.09e6 - 1)).toBeLessThan(0.01);
    expect(state.pressure).toBe(state.vapourPressure);
    expect(content.twoPhasesUpTo).toBeGreaterThan(288.15);
    expect(content.twoPhasesUpTo).toBeLessThan(gas.criticalTemperature);
    expect(content.at(content.twoPhasesUpTo! + 0.5).phase).toBe("liquid");
    // Filled, it gains some bar for every kelvin, more than twice what the vapour pressure did.
    const gain = (t: number) => content.at(t + 1).pressure - content.at(t).pressure;
    expect(gain(319)).toBeGreaterThan(2 * cubicSaturation(gas, 288.15)!.slope);
  });
});

describe("refusals", () => {
  test("an amount or a volume that is none", () => {
    const refused = (amount: number, volume: number) => refusedWith(() => new GasContent(capacity("N2"), amount, volume));
    expect(refused(0, 1)).toBe("range: Amount 0 mol is not above 0 mol");
    expect(refused(-2, 1)).toBe("range: Amount -2 mol is not above 0 mol");
    expect(refused(NaN, 1)).toBe("range: Amount NaN mol is not above 0 mol");
    expect(refused(Infinity, 1)).toBe("range: Amount Infinity mol is not above 0 mol");
    expect(refused(1, 0)).toBe("range: Volume 0 m3 is not above 0 m3");
    expect(refused(1, NaN)).toBe("range: Volume NaN m3 is not above 0 m3");
  });

  test("a temperature outside the range of the heat capacity, and a vessel too full", () => {
    const content = new GasContent(capacity("CO2"), 1, 1e-3, pureGas("CO2"));
    expect(refusedWith(() => content.at(150))).toBe("range: Temperature 150 K is below 200 K, the lower limit of nasa-2002 for CO2");
    expect(refusedWith(() => content.at(30000))).toBe("range: Temperature 30000 K is above 20000 K, the upper limit of nasa-2002 for CO2");
    expect(refusedWith(() => new GasContent(capacity("CO2"), 100, 1e-3, pureGas("CO2")).at(300))).toBe(
      "range: The molar volume 10 cm3/mol is not above 26.6768 cm3/mol, which the molecules take up by Peng-Robinson",
    );
  });

  test("the range of a heavy gas begins where its equation does", () => {
    const content = new GasContent(capacity("H2O2", "gri-1999"), 1, 1, pureGas("H2O2"));
    expect([content.from, content.fromLabel]).toEqual([0.3 * 730.155, "Peng-Robinson for H2O2"]);
    expect(content.at(content.from).phase).toBe("two-phase");
    expect(refusedWith(() => content.at(210))).toContain("Temperature 210 K is below 0.3 of the critical temperature of H2O2");
  });
});
