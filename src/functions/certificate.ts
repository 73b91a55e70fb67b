/** The condition factor of the benzoic-acid certificate: one number, and the table that shows what it is made of. */
import {
  certificateFactor,
  type CertificateShare,
  certificateShares,
  drynessWarning,
  factorOf,
  outsideLimits,
} from "../core/calorimeter/certificate";
import { certificate } from "../data/calorimetry";
import { type Named, spread } from "./broadcast";
import { Block, Cell, finite } from "./cell";
import { OXYGEN_PRESSURE, readBeyond, REACTION_TEMPERATURE, readMeasured, SAMPLE_MASS, VESSEL_VOLUME, WATER_MASS } from "./laboratory";
import { type Line, line, type Report, table } from "./table";

export function certificateCells(...given: readonly (Block | undefined)[]): Block {
  return spread(named(given), (values) => finite(certificateFactor(conditionsOf(values), certificate, readBeyond(values[5]))));
}

export function certificateReportCells(...given: readonly (Block | undefined)[]): Block {
  return table(named(given), reportOf);
}

const NAMES = ["pressure", "volume", "sample_mass", "water_mass", "temperature", "beyond"];

function named(given: readonly (Block | undefined)[]): readonly Named[] {
  return NAMES.map((name, i) => [name, given[i]] as const);
}

function conditionsOf([pressure, volume, sampleMass, waterMass, temperature]: readonly (Cell | undefined)[]) {
  return {
    pressure: readMeasured(pressure, OXYGEN_PRESSURE),
    volume: readMeasured(volume, VESSEL_VOLUME),
    sampleMass: readMeasured(sampleMass, { ...SAMPLE_MASS, name: "Mass of benzoic acid" }),
    waterMass: readMeasured(waterMass, WATER_MASS),
    temperature: readMeasured(temperature, REACTION_TEMPERATURE),
  };
}

function reportOf(values: readonly (Cell | undefined)[]): Report {
  readBeyond(values[5]);
  const conditions = conditionsOf(values);
  const shares = certificateShares(conditions, certificate);
  const outside = shares.filter(({ inside }) => !inside);
  const within = outside.length === 0;
  return {
    lines: [
      line("condition factor", factorOf(shares), "", "multiplies the certified value; from memory of Coops, Jessup, van Nes 1956"),
      line("within limits", within ? "yes" : "no", "", "inside them the factor holds to about 0.00002"),
      ...shares.flatMap(linesOf),
    ],
    warnings: [...outside.map(outsideLimits), ...[drynessWarning(conditions, certificate) ?? []].flat()],
  };
}

function linesOf({ term, value, millionths }: CertificateShare): Line[] {
  const { name, unit, least, most, reference, coefficient } = term;
  return [
    line(name.toLowerCase(), Number(value.toPrecision(12)), unit, `limits ${least} to ${most} ${unit}, certificate ${reference} ${unit}`),
    line(`${name.toLowerCase()}, share`, Number(millionths.toPrecision(10)), "1e-6", `${coefficient} for each ${unit}`),
  ];
}
