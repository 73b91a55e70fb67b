/**
 * Content of the dry sample from the content found in the moist one.
 *
 *   x_d = (x_ad − s · M_ad) · 100/(100 − M_ad)
 *
 * x content in per cent by mass, M_ad moisture of the sample as analysed in per cent, s the share of the element in water:
 * M(H2)/M(H2O) = 0.1119 for hydrogen, M(O)/M(H2O) = 0.8881 for oxygen, 0 for everything else. For totals that include the moisture's
 * hydrogen and oxygen, as an elemental analyser finds them. Left in, the moisture's hydrogen is counted twice in a net value:
 * 212.2 × 0.1119 = 23.7 J/g for each per cent of moisture.
 */
import { printed, refuseRange } from "../refusal";

/** Mass of hydrogen and of oxygen in one mass of water. */
export interface WaterShares {
  readonly hydrogen: number;
  readonly oxygen: number;
}

/** Shares of the elements in water from atomic weights, g/mol. */
export function waterShares(hydrogenWeight: number, oxygenWeight: number): WaterShares {
  const water = 2 * hydrogenWeight + oxygenWeight;
  return { hydrogen: (2 * hydrogenWeight) / water, oxygen: oxygenWeight / water };
}

/**
 * Content of the dry sample, per cent. `name` begins a sentence ("Hydrogen"). Refuses contents and moistures outside 0 to 100 %, a moisture
 * of 100 %, a content below what the moisture alone holds, and one that would be above 100 % of the dry sample.
 */
export function dryContent(content: number, moisture: number, share: number, name: string): number {
  if (!(content >= 0 && content <= 100)) refuseRange(`${name} ${printed(content)} % is not between 0 % and 100 %`);
  if (!(moisture >= 0 && moisture < 100)) refuseRange(`Moisture ${printed(moisture)} % is not from 0 % to below 100 %`);
  const ofMoisture = share * moisture;
  if (content < ofMoisture) {
    refuseRange(`${name} ${printed(content)} % is less than the ${printed(ofMoisture)} % that ${printed(moisture)} % moisture holds`);
  }
  if (content > ofMoisture + (100 - moisture)) {
    refuseRange(`${name} ${printed(content)} % is more than a sample of ${printed(moisture)} % moisture can hold`);
  }
  return ((content - ofMoisture) * 100) / (100 - moisture);
}
