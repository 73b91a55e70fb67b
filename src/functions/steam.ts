/** Water and steam by IAPWS-95, built once when the functions load. */
import { WaterFormulation } from "../core/water/formulation";
import { iapws95 } from "../data/iapws95";

export const water = new WaterFormulation(iapws95);
