/** Water and gas in a sealed vessel: against steam tables, against the formulation itself, and by its own balances. */
import fc from "fast-check";
import { GAS_CONSTANT } from "../../../src/core/constants";
import { constantLimit, limitReached } from "../../../src/core/vessel/limit";
import { type GasPad, WaterContent } from "../../../src/core/vessel/water-content";
import { saturationPressure } from "../../../src/core/water/saturation";
import { water } from "../../../src/functions/steam";
import { saturation } from "../../../src/data/saturation";
import { FIRST_CHOICE } from "../../../src/functions/set";
import { substanceOf } from "../../../src/functions/substance";
import { refusedWith } from "../refused";

const air = substanceOf({}, "air", FIRST_CHOICE).capacity;
const atmosphere: GasPad = { pressure: 101325, capacity: air };
const CELSIUS = 273.15;

/** In a litre, charged at 20 °C unless told otherwise. */
function litre(mass: number, pad?: GasPad, { start = 293.15, expansion = 0 } = {}): WaterContent {
  return new WaterContent(water, { mass, volume: 1e-3, start, expansion }, pad);
}

const relative = (value: number, expected: number) => Math.abs(value / expected - 1);

/** Of IAPWS-95; tables of older formulations have v of the vapour greater by 1.4e-4. */
describe("steam tables, from memory", () => {
  test("2 kg in 1 m³ at 100 °C: v 0.0010435 and 1.6718 m³/kg, u 419.06 and 2506.0 kJ/kg, 101.42 kPa", () => {
    const state = new WaterContent(water, { mass: 2, volume: 1, start: 373.15, expansion: 0 }).at(373.15);
    const dryness = (0.5 - 0.0010435) / (1.6718 - 0.0010435);
    expect(state.phase).toBe("liquid and vapour");
    expect(Math.abs(state.pressure - 101420)).toBeLessThan(5);
    // v of the vapour is rounded to 3e-5 of itself
    expect(Math.abs(state.vapourFraction! - dryness)).toBeLessThan(1e-5);
    expect(Math.abs(state.energy - 2e3 * (419.06 + dryness * (2506 - 419.06)))).toBeLessThan(150);
  });

  test("90 % full at 20 °C is full between 160 °C (v 0.001102) and 170 °C (v 0.001114 m³/kg)", () => {
    // v at 20 °C is 0.0010018 m³/kg; the rounding of v in its last digit is 0.4 K
    const mass = (0.9 * 1e-3) / 0.0010018;
    const full = 160 + (10 * (1e-3 / mass - 0.001102)) / (0.001114 - 0.001102);
    const { kind, temperature } = litre(mass).phaseEnd;
    expect(kind).toBe("full");
    expect(Math.abs(temperature! - CELSIUS - full)).toBeLessThan(0.8);
  });

  test("rigid and liquid-full at 25 °C: 5.7 bar/K, expansion 257e-6 1/K over compressibility 0.4525 1/GPa", () => {
    const content = litre(water.saturation(298.15).liquid.density * 1e-3 * (1 + 1e-9), undefined, { start: 298.15 });
    expect(relative(content.pressurePerKelvin(298.15)!, 257e-6 / 0.4525e-9)).toBeLessThan(0.005);
  });

  test("humid air of 60 % at 30 °C cooled to 5 °C: u 2415.9 kJ/kg of the vapour, then 21.02 and 2381.8, v 147.01 m³/kg", () => {
    const mass = 0.6 * water.saturation(303.15).vapour.density;
    const content = new WaterContent(water, { mass, volume: 1, start: 303.15, expansion: 0 }, atmosphere);
    const [warm, cold] = [content.at(303.15), content.at(278.15)];
    const dryness = 1 / 147.01 / mass;
    expect(relative(cold.vapourFraction!, dryness)).toBeLessThan(1e-4);
    // at 60 % u is above that of saturation by 0.4 ρ R T² dB/dT = 0.45 kJ/kg, with dB/dT some 16 cm³/(mol K), known to a quarter
    const expected = mass * (21.02 + dryness * (2381.8 - 21.02) - (2415.9 + 0.45)) * 1e3;
    expect(Math.abs(cold.waterEnergy - warm.waterEnergy - expected)).toBeLessThan(mass * 300);
    // 4.2469 kPa saturation pressure at 30 °C, from memory
    expect(Math.abs(warm.pressure - 101325 - 0.6 * 4246.9)).toBeLessThan(5);
  });
});

describe("without gas", () => {
  test("the state is that of the formulation at the overall density", () =>
    fc.assert(
      fc.property(
        fc.double({ min: 0.001, max: 0.999, noNaN: true }),
        fc.double({ min: 273.16, max: 620, noNaN: true }),
        (mass, temperature) => {
          const content = litre(mass);
          const state = water.state(temperature, mass / 1e-3);
          if (state.pressure > 9e8) return;
          const found = content.at(temperature);
          expect([found.pressure, found.energy, found.gasPressure]).toEqual([state.pressure, mass * state.energy, 0]);
          expect(found.phase === "liquid and vapour").toBe(state.phase === "two-phase");
        },
      ),
    ));

  test("liquid-full, the room grown with its wall: dp/dT is the slope of p", () => {
    const content = litre(0.99, undefined, { expansion: 36e-6 });
    expect(content.at(330).phase).toBe("liquid");
    for (const temperature of [330, 400, 550, 700]) {
      const slope = (content.at(temperature + 0.01).pressure - content.at(temperature - 0.01).pressure) / 0.02;
      expect(relative(content.pressurePerKelvin(temperature)!, slope)).toBeLessThan(1e-6);
    }
    expect(content.pressurePerKelvin(330)!).toBeLessThan(litre(0.99).pressurePerKelvin(330)!);
  });

  test("phases, shares and room", () => {
    const content = litre(0.5);
    expect(content.at(400)).toMatchObject({ phase: "liquid and vapour", volume: 1e-3, gasRoom: 1e-3 });
    const { liquid, vapour } = water.saturation(400);
    const state = content.at(400);
    expect(relative(state.liquidShare! * liquid.density + (1 - state.liquidShare!) * vapour.density, 500)).toBeLessThan(1e-12);
    expect(content.at(640)).toMatchObject({ phase: "liquid", vapourFraction: 0, liquidShare: 1 });
    expect(litre(0.01).at(640)).toMatchObject({ phase: "vapour", vapourFraction: 1, liquidShare: 0 });
    expect(content.at(700)).toMatchObject({
      phase: "supercritical",
      vapourFraction: undefined,
      liquidShare: undefined,
      saturationPressure: undefined,
    });
  });
});

describe("with a gas", () => {
  test("liquid under the total pressure, vapour at saturation, gas in the rest: mass and pressures add up", () =>
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 0.97, noNaN: true }),
        fc.double({ min: 273.16, max: 640, noNaN: true }),
        fc.double({ min: 1, max: 5e6, noNaN: true }),
        (mass, temperature, pressure) => {
          const content = litre(mass, { pressure, capacity: air });
          const full = content.phaseEnd.kind === "full" ? content.phaseEnd.temperature! : Infinity;
          if (temperature > full + 100) return; // squeezed to hundreds of MPa
          const state = content.at(temperature);
          if (state.phase !== "liquid and vapour") return;
          const liquid = water.density(temperature, state.pressure, "liquid");
          const inVapour = state.vapourDensity * state.gasRoom;
          expect(relative(liquid * (1e-3 - state.gasRoom) + inVapour, mass)).toBeLessThan(1e-10);
          expect(relative(state.saturationPressure! + state.gasPressure, state.pressure)).toBeLessThan(1e-14);
          expect(relative((content.gasAmount * GAS_CONSTANT * temperature) / state.gasRoom, state.gasPressure)).toBeLessThan(1e-6);
          expect(relative(state.waterEnergy + state.gasEnergy, state.energy)).toBeLessThan(1e-14);
        },
      ),
    ));

  test("the partial pressure at T1 is the one that was given", () => {
    for (const mass of [0.001, 0.5, 0.9]) expect(relative(litre(mass, atmosphere).at(293.15).gasPressure, 101325)).toBeLessThan(1e-11);
    for (const start of [293.15, 450, 700])
      expect(relative(litre(1e-5, atmosphere, { start }).at(start).gasPressure, 101325)).toBeLessThan(1e-14);
  });

  test("a pad of vanishing pressure leaves the water as without it, also where it fills the vessel", () => {
    for (const mass of [0.002, 0.3, 0.9])
      for (const temperature of [280, 373.15, 460, 600, 700]) {
        const [with1, without] = [litre(mass, { pressure: 1e-4, capacity: air }).at(temperature), litre(mass).at(temperature)];
        expect(relative(with1.pressure, without.pressure)).toBeLessThan(1e-6);
        expect(Math.abs(with1.energy - without.energy)).toBeLessThan(1e-6 * Math.abs(without.energy));
      }
  });

  test("air above dilute vapour follows Gay-Lussac and Dalton", () => {
    const state = litre(1e-6, atmosphere).at(373.15);
    // 1 mg of water in a litre, all vapour: an ideal gas within 1e-4
    const vapour = ((1e-6 / 0.01801528) * GAS_CONSTANT * 373.15) / 1e-3;
    expect(Math.abs(state.pressure - (101325 * 373.15) / 293.15 - vapour)).toBeLessThan(1e-4 * vapour);
  });

  test("the same amounts charged at a temperature on the way reach the same state", () =>
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 0.9, noNaN: true }),
        fc.double({ min: 280, max: 420, noNaN: true }),
        fc.double({ min: 280, max: 700, noNaN: true }),
        (mass, middle, end) => {
          const expansion = 50e-6;
          const direct = litre(mass, atmosphere, { expansion });
          const halfway = direct.at(middle);
          const grown = { mass, volume: halfway.volume, start: middle, expansion: (expansion * 1e-3) / halfway.volume };
          const onward = new WaterContent(water, grown, { pressure: halfway.gasPressure, capacity: air });
          const [one, other] = [direct.at(end), onward.at(end)];
          expect(relative(onward.gasAmount, direct.gasAmount)).toBeLessThan(1e-10);
          expect(relative(other.pressure, one.pressure)).toBeLessThan(1e-9);
          expect(Math.abs(other.energy - one.energy)).toBeLessThan(1e-10 * Math.max(1e3, Math.abs(one.energy)));
        },
      ),
    ));

  test("a squeezed pad raises the pressure steeply, above that of the water alone, which it approaches", () => {
    const [padded, alone] = [litre(0.9, atmosphere), litre(0.9)];
    const full = padded.phaseEnd.temperature!;
    let before = 0;
    for (let temperature = 293.15; temperature < 560; temperature += 2) {
      const { pressure } = padded.at(temperature);
      expect(pressure).toBeGreaterThan(before);
      if (temperature > full) expect(pressure).toBeGreaterThan(alone.at(temperature).pressure);
      before = pressure;
    }
    // well beyond, the pad hardly matters: it is crushed to a ten-thousandth of the volume
    expect(relative(padded.at(500).pressure, alone.at(500).pressure)).toBeLessThan(0.01);
    expect(padded.isSqueezed(full + 0.01)).toBe(true);
    expect(padded.isSqueezed(full - 0.01)).toBe(false);
    const slope = (padded.at(500.001).pressure - padded.at(499.999).pressure) / 0.002;
    expect(relative(padded.pressurePerKelvin(500)!, slope)).toBeLessThan(1e-5);
    expect(padded.pressurePerKelvin(400)).toBeUndefined();
    expect(padded.pressurePerKelvin(646.5)).toBeUndefined();
  });

  test("vapour, and above the critical point: dp/dT is the slope of p, wall and gas included", () => {
    const content = litre(0.05, { pressure: 1e6, capacity: air }, { expansion: 50e-6 });
    for (const temperature of [600, 647.2, 900]) {
      const slope = (content.at(temperature + 0.01).pressure - content.at(temperature - 0.01).pressure) / 0.02;
      expect(relative(content.pressurePerKelvin(temperature)!, slope)).toBeLessThan(1e-6);
    }
  });

  test("dense contents lose less than 2 % of their pressure on the last kelvin to the critical temperature, as the head says", () => {
    for (const mass of [0.33, 0.4, 0.5, 0.7]) {
      const content = litre(mass, atmosphere);
      const [below, above] = [content.at(646), content.at(647.096)];
      expect(above.pressure / below.pressure).toBeGreaterThan(0.98);
    }
    for (const mass of [0.1, 0.3]) {
      const content = litre(mass, atmosphere);
      expect(relative(content.at(647.0959999).pressure, content.at(647.096).pressure)).toBeLessThan(1e-7);
    }
  });
});

describe("where two phases end", () => {
  test("liquid-full: the saturated liquid has the mass in the room there; dew: the saturated vapour has", () =>
    fc.assert(
      fc.property(fc.double({ min: 1e-5, max: 0.99, noNaN: true }), fc.double({ min: 0, max: 75e-6, noNaN: true }), (mass, expansion) => {
        const content = litre(mass, undefined, { expansion });
        const { kind, temperature } = content.phaseEnd;
        const { liquid, vapour } = water.saturation(temperature!);
        const density = kind === "full" ? liquid.density : vapour.density;
        // towards the critical point the density turns steep, and the last digit of the temperature shows in it
        expect(relative(density * content.volumeAt(temperature!), mass)).toBeLessThan(temperature! < 640 ? 1e-12 : 1e-9);
        if (temperature! > 646) return; // here the two are hardly two
        expect(content.at(temperature! - 0.01).phase).toBe("liquid and vapour");
        expect(content.at(temperature! + 0.01).phase).toBe(kind === "full" ? "liquid" : "vapour");
      }),
    ));

  test("the dew temperature of humid air is where the vapour, an ideal gas within 0.1 %, would have its saturation pressure", () => {
    const content = new WaterContent(
      water,
      { mass: 0.6 * water.saturation(303.15).vapour.density, volume: 1, start: 303.15, expansion: 0 },
      atmosphere,
    );
    const partial = (temperature: number) => (0.6 * saturationPressure(303.15, saturation) * temperature) / 303.15;
    let [low, high] = [280, 303];
    while (high - low > 1e-9) {
      const middle = (low + high) / 2;
      if (saturationPressure(middle, saturation) < partial(middle)) low = middle;
      else high = middle;
    }
    const { kind, temperature } = content.phaseEnd;
    expect(kind).toBe("dew");
    expect(Math.abs(temperature! - low)).toBeLessThan(0.02);
    const dew = content.at(temperature!);
    expect(relative(dew.pressure - dew.gasPressure, dew.saturationPressure!)).toBeLessThan(1e-9);
    expect(content.kinks).toEqual([temperature]);
  });

  test("contents that are always full, or always vapour", () => {
    expect(litre(1.02).phaseEnd).toEqual({ kind: "always full" });
    expect(litre(1e-6).phaseEnd).toEqual({ kind: "always vapour" });
    expect(litre(1e-6).kinks).toEqual([]);
    expect(litre(0.8).kinks).toEqual([litre(0.8).phaseEnd.temperature]);
    expect(litre(0.8, atmosphere).kinks).toContain(647.096);
  });
});

describe("as contents of a vessel", () => {
  test("the temperature at a limit: 10 bar of water alone at 179.9 °C, from memory; with air the pressures add up there", () => {
    const alone = limitReached(litre(0.5), constantLimit(1e6), 293.15);
    expect(alone.kind === "reached" && Math.abs(alone.temperature - CELSIUS - 179.9)).toBeLessThan(0.05);
    const padded = litre(0.5, atmosphere);
    const reached = limitReached(padded, constantLimit(1e6), 293.15);
    if (reached.kind !== "reached") throw new Error("not reached");
    expect(relative(padded.at(reached.temperature).pressure, 1e6)).toBeLessThan(1e-11);
    expect(reached.temperature).toBeLessThan(453);
  });

  test("the lowest of several, where dense contents lose pressure below the critical temperature", () => {
    const content = litre(0.5, atmosphere);
    const [peak, after] = [content.at(647).pressure, content.at(647.096).pressure];
    const limit = peak - 0.05 * (peak - after);
    const reached = limitReached(content, constantLimit(limit), 293.15);
    if (reached.kind !== "reached") throw new Error("not reached");
    expect(relative(content.at(reached.temperature).pressure, limit)).toBeLessThan(1e-9);
    expect(reached.temperature).toBeLessThan(647);
  });

  test("beyond 1000 MPa the search ends, and says why", () => {
    const found = limitReached(litre(0.99), constantLimit(5e9), 293.15);
    expect(found.kind).toBe("never");
    if (found.kind === "never") expect(found.because).toMatch(/1000 MPa/);
  });

  test("limits are those of the water, or of the gas where it has narrower ones", () => {
    expect(litre(0.5)).toMatchObject({ from: 273.16, to: 1273, fromLabel: "IAPWS-95 for water", toLabel: "IAPWS-95 for water" });
    const narrow = { ...air, from: 280, to: 900, fromLabel: "low of gas", toLabel: "high of gas", energy: () => 0 } as typeof air;
    expect(litre(0.5, { pressure: 1e5, capacity: narrow })).toMatchObject({
      from: 280,
      to: 900,
      fromLabel: "low of gas",
      toLabel: "high of gas",
    });
  });
});

describe("refusals", () => {
  test("what is not above nought", () => {
    expect(refusedWith(() => litre(0))).toBe("range: Mass of water 0 kg is not above 0 kg");
    expect(refusedWith(() => new WaterContent(water, { mass: 1, volume: -1, start: 300, expansion: 0 }))).toBe(
      "range: Volume -1 m3 is not above 0 m3",
    );
    expect(refusedWith(() => litre(0.5, { pressure: 0, capacity: air }))).toBe("range: Partial pressure of the gas 0 Pa is not above 0 Pa");
  });

  test("temperatures outside the limits of water or gas", () => {
    expect(refusedWith(() => litre(0.5).at(270))).toBe("range: Temperature 270 K is below 273.16 K, where water freezes");
    expect(refusedWith(() => litre(0.5).at(1300))).toBe("range: Temperature 1300 K is above 1273 K, the upper limit of IAPWS-95 for water");
    expect(refusedWith(() => litre(0.5, atmosphere, { start: 260 }))).toContain("where water freezes");
    const warm = substanceOf({}, "N2", { key: "gri", id: "gri-1999", extrapolate: false }).capacity;
    expect(refusedWith(() => litre(0.5, { pressure: 1e5, capacity: warm }))).toBe(
      "range: Temperature 293.15 K is below 300 K, the lower limit of gri-1999 for N2",
    );
  });

  test("no room for a gas, and more water than 1000 MPa press in", () => {
    expect(refusedWith(() => litre(0.999, atmosphere))).toBe(
      "range: 0.999 kg of water take up 0.00100079 m3 at 293.15 K: there is no room for a gas in 0.001 m3",
    );
    expect(refusedWith(() => litre(1.4))).toMatch(/^range: .*(1000 MPa|freezes)/);
    expect(refusedWith(() => litre(0.96, atmosphere).at(900))).toMatch(/^range: .*1000 MPa/);
  });
});
