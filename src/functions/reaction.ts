/** Family reaction: balancing an equation, its energy, enthalpy and heat capacity, and a complete reaction in a rigid vessel. */
import { cvOfReaction, energyOfReaction, enthalpyOfReaction, reacting, type ReactionPart } from "../core/reaction/reaction";
import { readTemperature, readText } from "./arguments";
import { spread } from "./broadcast";
import { Block, cells, finite } from "./cell";
import { equationCell, reactionOf, requireInside } from "./reaction-parts";
import { rigidCells } from "./reaction-rigid";
import { setsOf, wholeSets } from "./reaction-sets";
import { balancedText } from "./reaction-species";
import { inUnit } from "./result-unit";

/**
 * Balances a chemical equation with the smallest whole numbers; coefficients that stand in it do not count. Atoms and charge are conserved exactly.
 * @param text Equation such as "C3H8 + O2 = CO2 + H2O", with =, ->, → or ⇌; formulas, ions such as "Fe^3+" and "e-", or names of the library [-] value
 * @returns Balanced equation as text [-]
 * @source thermodynamics
 * @example STILL.REACTION.BALANCE("C3H8 + O2 = CO2 + H2O") -> "C3H8 + 5 O2 = 3 CO2 + 4 H2O"
 * @example STILL.REACTION.BALANCE("MnO4^- + Fe^2+ + H^+ -> Mn^2+ + Fe^3+ + H2O") -> "MnO4^- + 5 Fe^2+ + 8 H^+ = Mn^2+ + 5 Fe^3+ + 4 H2O"
 * @example STILL.REACTION.BALANCE("CH4 + O2 = CO2 + H2O + N2") -> #VALUE! Nothing on the left holds N, which N2 on the right does
 * @customfunction REACTION.BALANCE
 */
export function reactionBalance(text: any[][]): any[][] {
  return spread([["text", text]], ([cell]) => balancedText(equationCell(cell)));
}

/**
 * Internal energy of a reaction, ΔrU, at one temperature, per mole of the equation as written; negative: heat given off at constant volume. Ideal gases; for solids and liquids U = H.
 * @param equation Balanced equation such as "CH4 + 2 O2 = CO2 + 2 H2O(l)"; H2O is vapour; a species may stand on both sides [-] value
 * @param temperature Temperature, also as text such as "25 °C" [K] value
 * @param unit Unit of the result, by amount, such as "kJ/mol" [-] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", a range of two columns species and set id, or a coefficient block [-] value
 * @returns Internal energy of reaction [J/mol]
 * @source nasa-2002
 * @example STILL.REACTION.ENERGY("CH4 + 2 O2 = CO2 + 2 H2O(l)",298.15,"kJ/mol") -> ~ -885.6
 * @example STILL.REACTION.ENERGY("CO + 1/2 O2 = CO2",1000,"kJ/mol") -> ~ -278.46
 * @example STILL.REACTION.ENERGY("CH4 + O2 = CO2 + H2O",298.15) -> #VALUE! "CH4 + O2 = CO2 + H2O" is not balanced: H 4 on the left, 2 on the right; O 2 on the left, 3 on the right; balanced it is CH4 + 2 O2 = CO2 + 2 H2O
 * @customfunction REACTION.ENERGY
 */
export function reactionEnergy(equation: any[][], temperature: any[][], unit?: any[][], set?: any[][]): any[][] {
  return overStates(energyOfReaction, MOLAR_ENERGY, equation, temperature, unit, set);
}

/**
 * Enthalpy of a reaction, ΔrH, at one temperature, per mole of the equation as written; negative: heat given off at constant pressure.
 * @param equation Balanced equation such as "CH4 + 2 O2 = CO2 + 2 H2O(l)"; H2O is vapour; a species may stand on both sides [-] value
 * @param temperature Temperature, also as text such as "25 °C" [K] value
 * @param unit Unit of the result, by amount, such as "kJ/mol" [-] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", a range of two columns species and set id, or a coefficient block [-] value
 * @returns Enthalpy of reaction [J/mol]
 * @source nasa-2002
 * @example STILL.REACTION.ENTHALPY("CH4 + 2 O2 = CO2 + 2 H2O(l)",298.15,"kJ/mol") -> ~ -890.6
 * @example STILL.REACTION.ENTHALPY("CO + H2O = CO2 + H2","25 °C","kJ/mol") -> ~ -41.15
 * @customfunction REACTION.ENTHALPY
 */
export function reactionEnthalpy(equation: any[][], temperature: any[][], unit?: any[][], set?: any[][]): any[][] {
  return overStates(enthalpyOfReaction, MOLAR_ENERGY, equation, temperature, unit, set);
}

/**
 * Change of the heat capacity at constant volume in a reaction, ΔrCv, per mole of the equation as written: the slope of its energy with temperature. Solids: Cv = Cp taken; liquids are refused.
 * @param equation Balanced equation such as "CO + 1/2 O2 = CO2"; H2O is vapour; a species may stand on both sides [-] value
 * @param temperature Temperature, also as text such as "25 °C" [K] value
 * @param unit Unit of the result, by amount, such as "J/(mol K)" [-] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", a range of two columns species and set id, or a coefficient block [-] value
 * @returns Change of the heat capacity at constant volume [J/(mol K)]
 * @source nasa-2002
 * @example STILL.REACTION.CV("N2 + 3 H2 = 2 NH3",298.15) -> ~ -27.74
 * @example STILL.REACTION.CV("H2 + 1/2 O2 = H2O(l)",298.15) -> #VALUE! H2O(l) is liquid, and the Cv of a liquid is not its Cp: the change of Cv of this reaction is not known
 * @customfunction REACTION.CV
 */
export function reactionCv(equation: any[][], temperature: any[][], unit?: any[][], set?: any[][]): any[][] {
  return overStates(cvOfReaction, MOLAR_CAPACITY, equation, temperature, unit, set);
}

/**
 * A complete reaction in a rigid vessel: heat and final pressure from the reactants at T1, their gases at P1, to the products at T2. Not a design or relief calculation.
 * @param equation Balanced equation with any surplus on both sides, such as "CH4 + 3 O2 = CO2 + 2 H2O + O2"; H2O is vapour, H2O(l) liquid [-] value
 * @param T1 Temperature before the reaction, also as text such as "25 °C" [K] value
 * @param P1 Absolute pressure of the gases on the left before the reaction, also as text such as "1 atm" [Pa] value
 * @param T2 Temperature after the reaction, also as text such as "800 °C" [K] value
 * @param set Set id such as "nasa-2002", "nasa-2002; extrapolate", a range of two columns species and set id, or a coefficient block [-] value
 * @returns One state: label, value, unit, note; a column of states: heading row, then a row for each [-]
 * @lines reaction | heat into the contents | energy of reaction ΔrU | heating of the products | uncertainty from formation values | without published uncertainty | gas before | gas after | change in gas | final pressure P2 | pressure ratio P2/P1 | volume | sets | assumptions | caution
 * @source nasa-2002 codata-1989 anl-05-20 iapws-sr1-86 iapws-r14-08
 * @example INDEX(STILL.REACTION.RIGID("CH4 + 3 O2 = CO2 + 2 H2O + O2",298.15,"1 atm",1000),2,2) -> ~ -717.79
 * @example INDEX(STILL.REACTION.RIGID("CH4 + 3 O2 = CO2 + 2 H2O + O2",298.15,"1 atm",1000),11,2) -> ~ 3.3540
 * @customfunction REACTION.RIGID
 */
export function reactionRigid(equation: any[][], T1: any[][], P1: any[][], T2: any[][], set?: any[][]): any[][] {
  return rigidCells(equation, T1, P1, T2, set);
}

interface ResultUnit {
  readonly si: string;
  readonly words: string;
}

const BY_AMOUNT =
  "a reaction is per mole of the equation as written; for a value by mass divide by the molar mass of the substance meant (MOLARMASS)";
const MOLAR_ENERGY: ResultUnit = { si: "J/mol", words: `an energy by amount such as "kJ/mol": ${BY_AMOUNT}` };
const MOLAR_CAPACITY: ResultUnit = { si: "J/(mol K)", words: `a heat capacity by amount such as "J/(mol K)": ${BY_AMOUNT}` };

/** A value for each equation and temperature. */
function overStates(
  of: (parts: readonly ReactionPart[], temperature: number) => number,
  { si, words }: ResultUnit,
  equation: Block,
  temperature: Block,
  unit: Block | undefined,
  set: Block | undefined,
): Block {
  return cells(() => {
    const whole = wholeSets(set);
    return spread(
      [
        ["equation", equation],
        ["temperature", temperature],
        ["unit", unit],
        ["set", whole ? undefined : set],
      ],
      ([text, kelvin, unitCell, setCell]) => {
        const { parts } = reactionOf(text, whole ?? setsOf(setCell));
        const at = readTemperature(kelvin);
        requireInside(reacting(parts), at);
        return finite(inUnit(of(parts, at), readText(unitCell, "unit"), si, words));
      },
    );
  });
}
