/** Units that are refused although everybody writes them, because they do not say which unit is meant. Each with its way out. */

const calories = "cal_th (4.184 J), cal_IT (4.1868 J), cal_15 (4.1858 J) or cal_20 (4.1819 J)";
const kilocalories = "kcal_th (4184 J), kcal_IT (4186.8 J), kcal_15 (4185.8 J) or kcal_20 (4181.9 J)";

const wayOut: readonly (readonly [RegExp, string])[] = [
  [/^(?:Cal|k-?cals?|kilocalories?)$/i, `has several sizes: say ${kilocalories}`],
  [/^(?:cals?|calories?)$/i, `has several sizes: say ${calories}`],
  [/^[MG]cals?$/, "has several sizes: say which calorie, for example Mcal_th or Mcal_IT"],
  [/^(?:k|mm?)?btus?$/i, "has several sizes: say Btu_IT (1055.05585262 J) or Btu_th (1054.350 J); a million is MMBtu_IT or MMBtu_th"],
  [/^therms?$/i, "has several sizes: say MMBtu_IT or MJ"],
  [/^(?:gal|gals|gallons?)$/i, "has several sizes: say gal_US (3.785411784 L) or gal_UK (4.54609 L)"],
  [/^tons?$/i, "has several sizes: say t (1000 kg), ton_US (2000 lb) or ton_UK (2240 lb)"],
  [/^M$/, "is not read as a concentration: say mol/L"],
];

/** The second half of the refusal (`has several sizes: say …`) if the name is known to be ambiguous. */
export function ambiguity(name: string): string | undefined {
  if (name === "Cal") return wayOut[0]![1];
  return wayOut.slice(name.toLowerCase() === "cal" ? 1 : 0).find(([pattern]) => pattern.test(name))?.[1];
}

const pressureStem = String.raw`(?:kgf\/cm\^?2|[kMG]?Pa|hPa|[mk]?bar|k?psi|ksi|atm|at|m?torr|(?:mm|cm|in)(?:Hg|H2O))`;
const gauge = new RegExp(String.raw`^(${pressureStem})(?: ?\( ?(?:g|gauge|ü) ?\)| ?\*?gauge| ?g| ?ü)$`, "i");
const absolute = new RegExp(String.raw`^(${pressureStem})(?: ?\( ?(?:a|abs|absolute) ?\)| ?(?:a|abs|absolute))$`, "i");

/** The absolute unit inside a gauge unit in plain spelling: `bar` for `barg`, `bar(g)`, `bar gauge`; undefined for all others. */
export function gaugeStem(plain: string): string | undefined {
  return gauge.exec(plain)?.[1];
}

/** The refusal of a gauge unit, with the way out. */
export function gaugeSentence(typed: string, stem: string): string {
  return `"${typed}" is a gauge pressure, and pressures here are absolute: use UNITS.ABSOLUTE(value, "${stem}")`;
}

/** A pressure said to be absolute (`bara`, `psi(a)`) without that word; all pressures here are absolute. Other text is unchanged. */
export function withoutAbsolute(plain: string): string {
  return absolute.exec(plain)?.[1] ?? plain;
}
