/**
 * Water, and perhaps a gas, sealed in a vessel: the state at a temperature, and where the last liquid or the last vapour disappears.
 *
 *   V(T) = V1 (1 + e (T − T1))         room inside, e the volumetric expansion of the vessel
 *   water alone                        IAPWS-95 at the overall density m/V
 *   no liquid                          p = p_w(T, m/V) + n R T/V
 *   liquid below its critical point    p = p_sat(T) + n R T/V_v,  V_v = (V ρ_l − m)/(ρ_l − ρ_v),  ρ_l = ρ_liquid(T, p),  ρ_v = ρ_v,sat(T)
 *
 * m mass of water, n amount of gas, V_v room of the vapour. The gas is ideal and stands beside the vapour (Dalton); none of it dissolves; the
 * vapour has its saturation pressure whatever the total pressure is (no Poynting factor). The liquid is compressed by the total pressure, so
 * that a pad of gas squeezed to almost nothing raises the pressure steeply but never without end. Above the critical temperature the gas
 * shares the whole room: contents so dense that the liquid filled the vessel lose a per cent of pressure within the last kelvin before, where
 * all this is rough. U of the water is zero for the liquid at the triple point; U of the gas has the zero of its heat capacity. K, Pa, m³, kg, mol, J.
 */
import type { Capacity } from "../capacity/capacity";
import { explainTemperature } from "../capacity/range";
import { GAS_CONSTANT } from "../constants";
import { root } from "../numeric/root";
import { printed, refuseRange } from "../refusal";
import type { WaterFormulation } from "../water/formulation";
import { isBelow } from "../water/limits";
import type { WaterSaturation } from "../water/types";
import { type PhaseEnd, phaseEndOf } from "./phase-end";
import type { Content, ContentState } from "./types";

/** What is sealed in, and in what. */
export interface WaterCharge {
  /** Mass of water, kg. */
  readonly mass: number;
  /** Room inside at `start`, m³. */
  readonly volume: number;
  /** T1, K. */
  readonly start: number;
  /** Volumetric expansion of the vessel, 1/K. */
  readonly expansion: number;
}

/** A gas beside the water: its partial pressure at T1, Pa, and its heat capacity. */
export interface GasPad {
  readonly pressure: number;
  readonly capacity: Capacity;
}

export type WaterContentPhase = "liquid" | "vapour" | "liquid and vapour" | "supercritical";

export interface WaterContentState extends ContentState {
  readonly phase: WaterContentPhase;
  /** Room inside, m³. */
  readonly volume: number;
  /** Mass of vapour to mass of water: 0 for liquid, 1 for vapour; undefined above the critical temperature. */
  readonly vapourFraction: number | undefined;
  /** Volume of the liquid to the room inside; undefined above the critical temperature. */
  readonly liquidShare: number | undefined;
  /** Saturation pressure of water, Pa; undefined above the critical temperature. */
  readonly saturationPressure: number | undefined;
  /** Partial pressure of the gas, Pa, and the room it has, m³; 0 Pa without one. */
  readonly gasPressure: number;
  readonly gasRoom: number;
  /** Density of what surrounds the gas: of the vapour, or of all the water where there is no liquid, kg/m³. */
  readonly vapourDensity: number;
  /** Internal energies, J. */
  readonly waterEnergy: number;
  readonly gasEnergy: number;
}

/** K below the critical temperature at which a search looks, where liquid beside gas loses pressure before it is supercritical. */
const NEAR_CRITICAL = [1, 0.3, 0.1, 0.03, 0.01, 1e-4, 0];
/** Share of the volume above which the room of the gas tells its pressure better than the compression of the liquid does. */
const WIDE = 0.01;

export class WaterContent implements Content<WaterContentState> {
  readonly from: number;
  readonly to: number;
  readonly fromLabel: string;
  readonly toLabel: string;
  /** Amount of gas, mol. */
  readonly gasAmount: number;
  private readonly critical: number;
  private end: PhaseEnd | undefined;

  /** Refuses a mass, a volume or a partial pressure that is not above 0, a T1 without a state, and a gas that finds no room at T1. */
  constructor(
    private readonly water: WaterFormulation,
    readonly charge: WaterCharge,
    private readonly pad?: GasPad,
  ) {
    requireAbove(charge.mass, "Mass of water", "kg");
    requireAbove(charge.volume, "Volume", "m3");
    const { constants } = water;
    const [low, high] = [pad && pad.capacity.from > constants.from, pad && pad.capacity.to < constants.to];
    this.from = low ? pad!.capacity.from : constants.from;
    this.to = high ? pad!.capacity.to : constants.to;
    this.fromLabel = low ? pad!.capacity.fromLabel : LABEL;
    this.toLabel = high ? pad!.capacity.toLabel : LABEL;
    this.critical = constants.criticalTemperature;
    this.gasAmount = pad ? this.amountOf(pad) : 0;
    this.at(charge.start);
  }

  /** Room inside, m³. */
  volumeAt(temperature: number): number {
    const { volume, expansion, start } = this.charge;
    return volume * (1 + expansion * (temperature - start));
  }

  /** Refuses temperatures outside the limits, pressures beyond those of the formulation, and water that would freeze. */
  at(temperature: number): WaterContentState {
    this.requireInside(temperature);
    if (this.pad && temperature < this.critical) {
      const saturation = this.water.saturation(temperature);
      if (this.charge.mass > saturation.vapour.density * this.volumeAt(temperature)) return this.beside(saturation);
    }
    return this.mixed(temperature);
  }

  /** Water by itself, or a gas that shares all its room. */
  private mixed(temperature: number): WaterContentState {
    const { mass } = this.charge;
    const volume = this.volumeAt(temperature);
    const density = mass / volume;
    const state = this.water.state(temperature, density);
    const saturation = temperature < this.critical ? this.water.saturation(temperature) : undefined;
    const vapourFraction = state.vapourFraction ?? (saturation && (density > saturation.liquid.density ? 0 : 1));
    const twoPhases = state.phase === "two-phase";
    const gasPressure = (this.gasAmount * GAS_CONSTANT * temperature) / volume;
    const waterEnergy = mass * state.energy;
    const gasEnergy = this.gasEnergyAt(temperature);
    return {
      temperature,
      pressure: state.pressure + gasPressure,
      energy: waterEnergy + gasEnergy,
      phase: state.phase === "two-phase" ? "liquid and vapour" : state.phase,
      volume,
      vapourFraction,
      liquidShare: twoPhases ? ((1 - vapourFraction!) * density) / saturation!.liquid.density : saturation && 1 - vapourFraction!,
      saturationPressure: saturation?.pressure,
      gasPressure,
      gasRoom: volume,
      vapourDensity: twoPhases ? saturation!.vapour.density : density,
      waterEnergy,
      gasEnergy,
    };
  }

  /** Liquid beside vapour and gas. */
  private beside({ temperature, pressure: saturated, liquid, vapour }: WaterSaturation): WaterContentState {
    const { mass } = this.charge;
    const volume = this.volumeAt(temperature);
    const gasRoomAt = (density: number) => (volume * density - mass) / (density - vapour.density);
    const thrust = this.gasAmount * GAS_CONSTANT * temperature;
    const surplus = (density: number) => (this.water.single(temperature, density).pressure - saturated) * gasRoomAt(density) - thrust;
    const density = this.liquidDensity(surplus, temperature, Math.max(liquid.density, mass / volume), thrust / volume);
    const compressed = this.water.single(temperature, density);
    const gasRoom = gasRoomAt(density);
    const vapourMass = vapour.density * gasRoom;
    const gasPressure = gasRoom > WIDE * volume ? thrust / gasRoom : compressed.pressure - saturated;
    const waterEnergy = (mass - vapourMass) * compressed.energy + vapourMass * vapour.energy;
    const gasEnergy = this.gasEnergyAt(temperature);
    return {
      temperature,
      pressure: saturated + gasPressure,
      energy: waterEnergy + gasEnergy,
      phase: "liquid and vapour",
      volume,
      vapourFraction: vapourMass / mass,
      liquidShare: 1 - gasRoom / volume,
      saturationPressure: saturated,
      gasPressure,
      gasRoom,
      vapourDensity: vapour.density,
      waterEnergy,
      gasEnergy,
    };
  }

  /** The density of the liquid at which the surplus of its pressure over vapour and gas, which rises with it, is nought. */
  private liquidDensity(surplus: (density: number) => number, temperature: number, least: number, pressure: number): number {
    // a gas thinner than the last digits of the saturation pressure does not press on the liquid
    if (surplus(least) >= 0) return least;
    const { pressureByDensity } = this.water.single(temperature, least);
    let step = Math.max(pressure / pressureByDensity, 1e-9 * least);
    while (!(surplus(least + step) >= 0)) {
      // refuses what is beyond the limits of the formulation, so that the search ends
      this.water.state(temperature, least + step);
      step *= 4;
    }
    const density = root(surplus, least, least + step, { what: "The density of the liquid", unit: " kg/m3" });
    this.water.state(temperature, density);
    return density;
  }

  private gasEnergyAt(temperature: number): number {
    if (!this.pad) return 0;
    const energy = this.pad.capacity.energy(temperature);
    if (!Number.isFinite(energy)) throw explainTemperature(this.pad.capacity, temperature);
    return this.gasAmount * energy;
  }

  /** n = p V_v/(R T1), with the liquid at T1 under the pressure of vapour and gas. */
  private amountOf({ pressure }: GasPad): number {
    requireAbove(pressure, "Partial pressure of the gas", "Pa");
    const { mass, volume, start } = this.charge;
    this.requireInside(start);
    let room = volume;
    const saturation = start < this.critical ? this.water.saturation(start) : undefined;
    if (saturation && mass > saturation.vapour.density * volume) {
      const density = this.water.density(start, saturation.pressure + pressure, "liquid");
      room = (volume * density - mass) / (density - saturation.vapour.density);
      if (!(room > 0))
        refuseRange(
          `${printed(mass)} kg of water take up ${printed(mass / density)} m3 at ${printed(start)} K: there is no room for a gas in ${printed(volume)} m3`,
        );
    }
    return (pressure * room) / (GAS_CONSTANT * start);
  }

  private requireInside(temperature: number): void {
    const { from, to } = this.water.constants;
    if (isBelow(this.water.constants, temperature))
      refuseRange(`Temperature ${printed(temperature)} K is below ${from} K, where water freezes`);
    if (!(temperature <= to)) refuseRange(`Temperature ${printed(temperature)} K is above ${to} K, the upper limit of ${LABEL}`);
  }

  /** Where two phases end, found within the last digits of a temperature. */
  get phaseEnd(): PhaseEnd {
    this.end ??= phaseEndOf(this.water, this.charge.mass, (temperature) => this.volumeAt(temperature));
    return this.end;
  }

  get kinks(): readonly number[] {
    const { kind, temperature } = this.phaseEnd;
    const isBent = temperature !== undefined && (kind === "dew" || !this.pad);
    const steps = this.pad && kind !== "dew" && kind !== "always vapour" ? NEAR_CRITICAL.map((below) => this.critical - below) : [];
    return [...(isBent ? [temperature] : []), ...steps].filter((each) => each > this.from && each < this.to);
  }

  /**
   * dp/dT, Pa/K, in the vessel as it expands; undefined where liquid stands beside vapour. Of liquid that squeezes a gas by
   * differences, and undefined in the last kelvin below the critical temperature.
   */
  pressurePerKelvin(temperature: number): number | undefined {
    const { phase, volume, gasPressure } = this.at(temperature);
    if (phase === "liquid and vapour")
      return this.isSqueezed(temperature) && temperature < this.critical - NEAR_CRITICAL[0]! ? this.bySteps(temperature) : undefined;
    const { pressureByTemperature, pressureByDensity, density } = this.water.single(temperature, this.charge.mass / volume);
    const growth = (this.charge.volume * this.charge.expansion) / volume;
    return pressureByTemperature - pressureByDensity * density * growth + gasPressure * (1 / temperature - growth);
  }

  /** True where the water alone would fill the vessel, so that a gas is squeezed. */
  isSqueezed(temperature: number): boolean {
    if (!this.pad || temperature >= this.critical) return false;
    return this.charge.mass > this.water.saturation(temperature).liquid.density * this.volumeAt(temperature);
  }

  private bySteps(temperature: number): number {
    const low = Math.max(temperature - STEP, this.from);
    return (this.at(temperature + STEP).pressure - this.at(low).pressure) / (temperature + STEP - low);
  }
}

/** Half width of a difference, K. */
const STEP = 0.01;

const LABEL = "IAPWS-95 for water";

function requireAbove(value: number, what: string, unit: string): void {
  if (!(value > 0 && value < Infinity)) refuseRange(`${what} ${printed(value)} ${unit} is not above 0 ${unit}`);
}
