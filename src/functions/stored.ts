/** The table of VESSEL.STORED: the energy of a compressed gas by its usual definitions. */
import { printed } from "../core/refusal";
import { type CompressedGas, storedEnergy } from "../core/vessel/stored";
import { constantOf } from "../data/constants";
import { type Expected, PRESSURE, readNumber, readPressure, readQuantity } from "./arguments";
import { Block } from "./cell";
import { pressureNotes } from "./equilibrium";
import { line, type Report, SEE_NOTE, table } from "./table";
import { governLine } from "./vessel-words";

const VOLUME: Expected = { name: "Volume", unit: "m3", example: '"50 L"' };
const AMBIENT: Expected = { name: "Ambient pressure", unit: "Pa", example: '"1 atm"' };

const ATMOSPHERE = constantOf("atm").value;
const TNT = constantOf("E_TNT").value;

/** γ of an ideal gas does not exceed that of atoms, 5/3, often rounded to 1.67. */
const LARGEST_GAMMA = 1.67;
/** Above this, Pa, the gas law misses the stored energy by several per cent. */
const DENSE = 1e7;

/** Upright table, or one row for each of a column of states. */
export function storedCells(pressure: Block, volume: Block, gamma: Block, ambient?: Block): Block {
  return table(
    [
      ["pressure", pressure],
      ["volume", volume],
      ["gamma", gamma],
      ["ambient", ambient],
    ],
    ([pressureCell, volumeCell, gammaCell, ambientCell]) =>
      report(
        {
          pressure: readPressure(pressureCell, PRESSURE),
          volume: readQuantity(volumeCell, VOLUME),
          gamma: readNumber(gammaCell, "Gamma"),
          ambient: ambientCell === undefined || ambientCell === null ? ATMOSPHERE : readPressure(ambientCell, AMBIENT),
        },
        pressureNotes(pressureCell),
      ),
  );
}

function report(gas: CompressedGas, odd: readonly string[]): Report {
  const { brode, isentropic, useful, isothermal } = storedEnergy(gas);
  return {
    lines: [
      line("Brode", brode, "J", "(P - Pa) V/(gamma - 1): heat that raises the pressure from Pa to P at constant volume"),
      line(
        "isentropic expansion",
        isentropic,
        "J",
        "P V/(gamma - 1) [1 - (Pa/P)^((gamma - 1)/gamma)]: all the work of expansion to Pa, that against the atmosphere in it",
      ),
      line("isentropic, less work on the air", useful, "J", "the line above less Pa (V2 - V), V2 = V (P/Pa)^(1/gamma)"),
      line(
        "isothermal bound",
        isothermal,
        "J",
        "P V ln(P/Pa): work of expansion to Pa at constant temperature, that against the atmosphere in it; an upper bound, for heat has to flow in",
      ),
      line(
        "TNT equivalent",
        isentropic / TNT,
        "kg",
        `of the isentropic expansion at the conventional ${printed(TNT / 1e6)} MJ/kg; of Brode's energy ${printed(brode / TNT)} kg`,
      ),
      line(
        "caution",
        SEE_NOTE,
        "",
        "stored energy does not say how a vessel fails: fragments and their range, the shape of the blast, liquid that flashes and heat of reaction are not in it; near a burst vessel the blast of a gas is not that of TNT",
      ),
      governLine(`ideal gas of constant gamma, ambient pressure ${printed(gas.ambient)} Pa`),
    ],
    warnings: [...odd, ...gammaNotes(gas), ...denseNotes(gas)],
  };
}

function gammaNotes({ gamma }: CompressedGas): string[] {
  return gamma > LARGEST_GAMMA
    ? [`Gamma ${printed(gamma)} is above 5/3, that of a gas of atoms: no ideal gas has it, and the energies are too low`]
    : [];
}

function denseNotes({ pressure }: CompressedGas): string[] {
  return pressure > DENSE
    ? [`At ${printed(pressure)} Pa a gas is no longer ideal: expect a difference of several per cent or more, see VESSEL.COMPRESSIBILITY`]
    : [];
}
