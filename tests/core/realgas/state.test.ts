/** States at temperature and volume: one phase, two phases, and the way between them. */
import fc from "fast-check";
import { GAS_CONSTANT } from "../../../src/core/constants";
import { root } from "../../../src/core/numeric/root";
import type { CubicGas } from "../../../src/core/realgas/cubic-gas";
import { cubicSaturation, criticalVolume } from "../../../src/core/realgas/saturation";
import { cubicState, idealPressure, isLiquidMixture, volumeAt } from "../../../src/core/realgas/state";
import { stableVolume } from "../../../src/core/realgas/volumes";
import { derivative } from "../../laws/realgas-support";
import { refusedWith } from "../refused";
import { EQUATIONS, mixtureOf, pureGas } from "./gases";

const R = GAS_CONSTANT;
const GASES = ["CO2", "H2O", "N2", "C3H8", "NH3", "n-C7H16"] as const;

const pure = fc.tuple(fc.constantFrom(...GASES), fc.constantFrom(...EQUATIONS)).map(([species, equation]) => pureGas(species, equation));
const reduced = fc.double({ min: 0.45, max: 0.999, noNaN: true });
const share = fc.double({ min: 0.001, max: 0.999, noNaN: true });

/** Two phases: the gas, T and v, and its saturation. */
function twoPhase(check: (gas: CubicGas, t: number, v: number, s: NonNullable<ReturnType<typeof cubicSaturation>>) => void): void {
  fc.assert(
    fc.property(pure, reduced, share, (gas, tr, x) => {
      const t = tr * gas.criticalTemperature;
      const s = cubicSaturation(gas, t)!;
      check(gas, t, s.liquid + x * (s.vapour - s.liquid), s);
    }),
    { numRuns: 300 },
  );
}

describe("one phase", () => {
  test("of a pure gas is named by where it stands, and has the values of the equation", () => {
    const gas = pureGas("CO2");
    const { liquid, vapour, pressure } = cubicSaturation(gas, 280)!;
    const state = (t: number, v: number) => {
      const found = cubicState(gas, t, v);
      expect(found).toMatchObject({
        pressure: gas.pressure(t, v),
        residualEnergy: gas.residualEnergy(t, v),
        residualCv: gas.residualCv(t, v),
      });
      expect(found.vapourFraction).toBeUndefined();
      return [found.phase, found.vapourPressure];
    };
    expect(state(280, 1.01 * vapour)).toEqual(["gas", pressure]);
    expect(state(280, 0.99 * liquid)).toEqual(["liquid", pressure]);
    expect(state(320, 2e-4)).toEqual(["supercritical", undefined]);
    expect(state(320, 2e-3)).toEqual(["gas", undefined]); // below the critical pressure
    expect(state(320, 4e-5)).toEqual(["supercritical", undefined]);
    expect(state(gas.criticalTemperature, criticalVolume(gas))[0]).toBe("supercritical");
  });

  test("of a mixture is a gas, whatever its temperature", () => {
    const air = mixtureOf({ N2: 0.78, O2: 0.21, Ar: 0.01 });
    expect([cubicState(air, 150, 2e-3).phase, cubicState(air, 300, 2e-3).phase]).toEqual(["gas", "gas"]);
  });

  test("of the ideal gas: R T/v", () => expect(idealPressure(300, 0.01)).toBe((R * 300) / 0.01));
});

describe("two phases", () => {
  test("have the vapour pressure and share the volume and the energy by the lever", () =>
    twoPhase((gas, t, v, { liquid, vapour, pressure }) => {
      const state = cubicState(gas, t, v);
      expect([state.phase, state.pressure, state.vapourPressure]).toEqual(["two-phase", pressure, pressure]);
      const x = state.vapourFraction!;
      expect(Math.abs(x * vapour + (1 - x) * liquid - v)).toBeLessThan(1e-14 * vapour);
      const energy = x * gas.residualEnergy(t, vapour) + (1 - x) * gas.residualEnergy(t, liquid);
      expect(Math.abs(state.residualEnergy - energy)).toBeLessThan(1e-12 * Math.abs(gas.residualEnergy(t, liquid)));
    }));

  test("Cv is ∂u/∂T at constant volume, by differences", () =>
    twoPhase((gas, t, v, { liquid, vapour }) => {
      // As far as the volume stays between the phases: a hundredth of the temperature, or less.
      const inside = (x: number) => cubicState(gas, x, v).phase === "two-phase";
      let h = Math.min(0.01 * t, 0.1 * (gas.criticalTemperature - t));
      for (let halving = 0; halving < 12 && !(inside(t + 2 * h) && inside(t - 2 * h)); halving++) h /= 2;
      if (!inside(t + h) || !inside(t - h)) return;
      const { residualCv } = cubicState(gas, t, v);
      const difference = derivative((x) => cubicState(gas, x, v).residualEnergy, t, h);
      const rounding = (1e-13 * Math.abs(gas.residualEnergy(t, liquid)) * (vapour / (vapour - liquid))) / h;
      expect(Math.abs(residualCv - difference)).toBeLessThan(1e-7 * Math.abs(residualCv) + 10 * rounding);
    }));

  test("Cv is x c'' + (1 − x) c' + T dx/dT (s'' − s'), another way to write it", () =>
    twoPhase((gas, t, v, { liquid, vapour, slope }) => {
      const { residualCv, vapourFraction: x } = cubicState(gas, t, v);
      // Along the saturation line dv/dT = (dP/dT − ∂P/∂T)/(∂P/∂v), and at constant v the share follows from the lever.
      const along = (volume: number) => (slope - gas.pressureByTemperature(t, volume)) / gas.pressureByVolume(t, volume);
      const shareSlope = -(x! * along(vapour) + (1 - x!) * along(liquid)) / (vapour - liquid);
      const entropy = (volume: number) => gas.residualEntropy(t, volume) + R * Math.log(volume);
      const heat = (volume: number) => gas.residualCv(t, volume) + t * gas.pressureByTemperature(t, volume) * along(volume);
      const written = x! * heat(vapour) + (1 - x!) * heat(liquid) + t * shareSlope * (entropy(vapour) - entropy(liquid));
      const size = x! * Math.abs(heat(vapour)) + (1 - x!) * Math.abs(heat(liquid)) + R;
      expect(Math.abs(residualCv - written)).toBeLessThan(1e-9 * size);
    }));

  test("are found again from their energy", () =>
    twoPhase((gas, t, v) => {
      const { residualEnergy } = cubicState(gas, t, v);
      // Cv of the ideal gas is 3 R or so here: any will do, as long as the whole rises with T.
      const energy = (x: number) => 3 * R * x + cubicState(gas, x, v).residualEnergy;
      const low = Math.max(0.35 * gas.criticalTemperature, 0.9 * t);
      const found = root((x) => energy(x) - 3 * R * t - residualEnergy, low, 1.3 * gas.criticalTemperature);
      expect(Math.abs(found / t - 1)).toBeLessThan(1e-11);
    }));
});

describe("the boundary of two phases", () => {
  test("pressure and energy are continuous across it, from both sides, by volume and by temperature", () =>
    fc.assert(
      fc.property(pure, reduced, fc.constantFrom("liquid" as const, "vapour" as const), (gas, tr, side) => {
        const t = tr * gas.criticalTemperature;
        const s = cubicSaturation(gas, t)!;
        const v = s[side];
        const [inner, outer] = side === "liquid" ? [v * (1 + 1e-10), v * (1 - 1e-10)] : [v * (1 - 1e-10), v * (1 + 1e-10)];
        const [two, one] = [cubicState(gas, t, inner), cubicState(gas, t, outer)];
        expect([two.phase, one.phase]).toEqual(["two-phase", side === "liquid" ? "liquid" : "gas"]);
        // A step of 1e-10 in v moves P by v ∂P/∂v of it, and a hundred times that in reserve.
        const stiffness = Math.abs(v * gas.pressureByVolume(t, v));
        expect(Math.abs(two.pressure - one.pressure)).toBeLessThan(1e-8 * stiffness + 1e-9 * s.pressure);
        expect(Math.abs(two.residualEnergy - one.residualEnergy)).toBeLessThan(1e-7 * R * t + 1e-8 * Math.abs(gas.residualEnergy(t, v)));
        // By temperature at constant v: on one side there are two phases, on the other one.
        const step = 1e-9 * t;
        const beside = [cubicState(gas, t - step, v), cubicState(gas, t + step, v)];
        expect(beside.filter(({ phase }) => phase === "two-phase")).toHaveLength(1);
        expect(Math.abs(beside[0]!.pressure - beside[1]!.pressure)).toBeLessThan(
          10 * step * Math.max(s.slope, gas.pressureByTemperature(t, v)) + 1e-9 * s.pressure,
        );
      }),
      { numRuns: 300 },
    ));

  test("a liquid or a vapour at a spinodal is two phases, not a stretched liquid", () => {
    for (const species of GASES)
      for (const equation of EQUATIONS) {
        const gas = pureGas(species, equation);
        for (const tr of [0.5, 0.7, 0.9]) {
          const t = tr * gas.criticalTemperature;
          const { liquid, vapour, pressure } = cubicSaturation(gas, t)!;
          const middle = criticalVolume(gas);
          const slope = (v: number) => gas.pressureByVolume(t, v);
          for (const spinodal of [root(slope, liquid, middle), root(slope, middle, vapour)]) {
            expect(cubicState(gas, t, spinodal)).toMatchObject({ phase: "two-phase", pressure });
            expect(Math.abs(gas.pressure(t, spinodal) / pressure - 1)).toBeGreaterThan(0.01);
          }
        }
        // Cold enough, the stretched liquid would pull: its pressure would be negative.
        const t = 0.5 * gas.criticalTemperature;
        const { liquid } = cubicSaturation(gas, t)!;
        expect(gas.pressure(t, 1.02 * liquid)).toBeLessThan(0);
        expect(cubicState(gas, t, 1.02 * liquid).pressure).toBeGreaterThan(0);
      }
  });

  test("the two phases end at the critical point: pressure and energy go on", () => {
    for (const equation of EQUATIONS) {
      const gas = pureGas("CO2", equation);
      const [tc, vc] = [gas.criticalTemperature, criticalVolume(gas)];
      const [below, above] = [cubicState(gas, tc * (1 - 2e-9), vc), cubicState(gas, tc * (1 + 2e-9), vc)];
      expect([below.phase, above.phase]).toEqual(["two-phase", "supercritical"]);
      expect(Math.abs(below.pressure / above.pressure - 1)).toBeLessThan(1e-7);
      expect(Math.abs(below.residualEnergy / above.residualEnergy - 1)).toBeLessThan(1e-7);
      // Cv jumps there, as it does in every equation that is smooth at its critical point.
      expect(below.residualCv - above.residualCv).toBeGreaterThan(3 * R);
      expect(cubicState(gas, tc * (1 - 0.5e-9), vc).phase).toBe("gas");
    }
  });
});

describe("the volume at T and P", () => {
  test("is that of the state with this pressure", () =>
    fc.assert(
      fc.property(pure, fc.double({ min: 0.45, max: 3, noNaN: true }), fc.double({ min: -6, max: 2, noNaN: true }), (gas, tr, logP) => {
        const t = tr * gas.criticalTemperature;
        const p = gas.parts[0]!.critical.pressure * 10 ** logP;
        // above the critical temperature gases denser than 1.3 b are refused; below it a liquid may be
        fc.pre(tr < 0.999 || stableVolume(gas, t, p) > 1.3 * gas.b);
        const v = volumeAt(gas, t, p);
        const state = cubicState(gas, t, v);
        const rounding = 8 * Number.EPSILON * ((R * t) / (v - gas.b)) * (v / (v - gas.b));
        expect(Math.abs(state.pressure - p)).toBeLessThan(1e-11 * p + rounding);
        if (state.vapourPressure === undefined) return;
        expect(state.phase).toBe(p > state.vapourPressure ? "liquid" : "gas");
      }),
      { numRuns: 1000 },
    ));
});

describe("refusals", () => {
  const gas = pureGas("CO2");

  test("a gas denser than a liquid, above its critical temperature: by volume and by pressure; and a mixture", () => {
    const sentence =
      "range: At 320 K the molar volume 34.6532 cm3/mol is below 34.6798 cm3/mol, 1.3 times what the molecules take up: denser than a liquid, and Peng-Robinson tells no pressure of it";
    expect(refusedWith(() => cubicState(gas, 320, 1.299 * gas.b))).toBe(sentence);
    expect(refusedWith(() => volumeAt(gas, 320, gas.pressure(320, 1.299 * gas.b)))).toBe(sentence);
    expect(cubicState(gas, 320, 1.301 * gas.b).phase).toBe("supercritical");
    expect(cubicState(gas, 250, 1.299 * gas.b).phase).toBe("liquid");
    const air = mixtureOf({ N2: 0.78, O2: 0.21, Ar: 0.01 });
    expect(refusedWith(() => cubicState(air, 300, 1.29 * air.b))).toContain("denser than a liquid");
  });

  test("a volume not above that of the molecules", () => {
    const refused = (volume: number) => refusedWith(() => cubicState(gas, 300, volume));
    const sentence = (volume: string) =>
      `range: The molar volume ${volume} cm3/mol is not above 26.6768 cm3/mol, which the molecules take up by Peng-Robinson`;
    expect(refused(2e-5)).toBe(sentence("20"));
    expect(refused(0)).toBe(sentence("0"));
    expect(refused(-1e-3)).toBe(sentence("-1000"));
    expect(refused(NaN)).toBe(sentence("NaN"));
    expect(refusedWith(() => cubicState(mixtureOf({ CO2: 0.5, N2: 0.5 }, "soave"), 300, 2e-5))).toContain("take up by Soave");
  });

  test("a temperature below 0.3 Tc of a pure gas", () =>
    expect(refusedWith(() => cubicState(gas, 91, 1e-3))).toBe(
      "range: Temperature 91 K is below 0.3 of the critical temperature of CO2, 304.12 K, from where Peng-Robinson tells a vapour pressure",
    ));

  test("a mixture that is not one phase, at T and v and at T and P", () => {
    const mixture = mixtureOf({ CH4: 0.9, "n-C4H10": 0.1 });
    const sentence =
      "range: At 250 K and 6000000 Pa this mixture is not one gas by Peng-Robinson: part of it would condense; mixtures are served as one phase only";
    expect(refusedWith(() => volumeAt(mixture, 250, 6e6))).toBe(sentence);
    expect(refusedWith(() => cubicState(mixture, 250, (0.6 * R * 250) / 6e6))).toContain("part of it would condense");
    // propane and butane as they are bottled: the isotherm is below nought there, which is no pressure to tell
    const bottled = mixtureOf({ C3H8: 0.5, "n-C4H10": 0.5 });
    expect(bottled.pressure(288.15, 1.06e-4)).toBeLessThan(0);
    expect(refusedWith(() => cubicState(bottled, 288.15, 1.06e-4))).toBe(
      "range: At 288.15 K and 106 cm3/mol this mixture is not one gas by Peng-Robinson: part of it would condense; mixtures are served as one phase only",
    );
    // Warm enough it is one, and the volume gives the pressure back.
    const v = volumeAt(mixture, 350, 6e6);
    expect(Math.abs(cubicState(mixture, 350, v).pressure / 6e6 - 1)).toBeLessThan(1e-12);
  });
});

describe("a mixture that is one phase is liquid or gas by the fluid it is taken for", () => {
  test("of a pure gas that fluid is itself: liquid below its critical temperature and its critical volume", () => {
    fc.assert(
      fc.property(pure, fc.double({ min: 0.4, max: 1.6, noNaN: true }), fc.double({ min: 0.4, max: 3, noNaN: true }), (gas, tr, vr) => {
        fc.pre(Math.abs(tr - 1) > 1e-3 && Math.abs(vr - 1) > 1e-3);
        const found = isLiquidMixture(gas, tr * gas.criticalTemperature, vr * criticalVolume(gas));
        expect(found).toBe(tr < 1 && vr < 1);
      }),
      { numRuns: 500 },
    );
  });

  test("propane and butane at 15 °C: liquid at 20 bar, gas at 1 bar, and gas far above both critical temperatures", () => {
    for (const equation of EQUATIONS) {
      const lpg = mixtureOf({ C3H8: 0.5, "n-C4H10": 0.5 }, equation);
      const phaseAt = (t: number, p: number) => cubicState(lpg, t, volumeAt(lpg, t, p)).phase;
      expect([phaseAt(288.15, 20e5), phaseAt(288.15, 1e5), phaseAt(500, 200e5)]).toEqual(["liquid", "gas", "gas"]);
    }
  });
});
