/** Everything that is measured inside this program, in order. The runner adds the sizes of the bundle. */
import { capacityGoals, type ExpressionCompiler } from "./capacity";
import { equilibriumGoals } from "./equilibrium";
import { type Goal, goalLine, isMet } from "./goals";
import { formulaByHand, type OtherProgram, recalculationGoals } from "./recalculation";
import { realGasGoals } from "./realgas";
import { riseGoals } from "./rise";
import { COUNT } from "./subjects";
import { sunk } from "./timing";
import { waterGoals } from "./water";
import { worksheetGoals } from "./worksheet";

export { COUNT, type Goal, formulaByHand, goalLine, isMet, sunk };

export const parts = {
  capacity: (mathjs: ExpressionCompiler): Goal[] => capacityGoals(mathjs),
  worksheet: (): Goal[] => worksheetGoals(),
  rise: (): Goal[] => riseGoals(),
  equilibrium: (): Goal[] => equilibriumGoals(),
  water: (): Goal[] => waterGoals(),
  realgas: (): Goal[] => realGasGoals(),
  recalculation: (other: OtherProgram | undefined): Promise<Goal[]> => recalculationGoals(other),
};
