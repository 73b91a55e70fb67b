/**
 * S of fits whose terms nearly cancel, against the same printed coefficients evaluated with 64 digits by a general-purpose library
 * (mathjs, BigNumber). In doubles alone the entropy of liquid water is blurred by some 1e-10 of itself.
 */
import { all, create } from "mathjs";
import { capacityOf } from "../../../src/core/capacity";
import { recordOf } from "../../../src/data/library";

const { bignumber, add, multiply, divide, log, pow } = create(all!, { number: "BigNumber", precision: 64 });

/** S = R (−a1 T⁻²/2 − a2 T⁻¹ + a3 ln T + a4 T + a5 T²/2 + a6 T³/3 + a7 T⁴/4 + b2), NASA/TP-2002-211556, equation 3. */
function entropyOf(species: string, temperature: number): number {
  const { intervals, gasConstant } = recordOf(species, "nasa-2002");
  const { coefficients } = intervals.find(({ to }) => temperature <= to)!;
  const [t, a] = [bignumber(temperature), coefficients.map((each) => bignumber(each ?? 0))];
  const terms = [
    ...[multiply(a[0]!, divide(pow(t, -2), -2)), multiply(a[1]!, multiply(pow(t, -1), -1)), multiply(a[2]!, log(t))],
    ...[1, 2, 3, 4].map((power) => multiply(a[2 + power]!, divide(pow(t, power), power))),
    a[8]!,
  ];
  return Number(
    multiply(
      bignumber(gasConstant),
      terms.reduce((sum, term) => add(sum, term) as never),
    ),
  );
}

// Coefficients of the compiled row are products of a printed one with R: each is off by 1e-16 of itself, which cancelling terms enlarge.
test.each([
  ["H2O(l)", [273.15, 274.5, 298.15, 350, 373.2, 373.15, 450, 599.9], 5e-11],
  ["N2", [6001, 9000, 20000], 1e-14],
  ["CO2", [300, 1500], 1e-15],
] as const)("S of %s", (species, temperatures, relative) => {
  const capacity = capacityOf(recordOf(species, "nasa-2002"));
  for (const temperature of temperatures)
    expect(Math.abs(capacity.entropy(temperature) / entropyOf(species, temperature) - 1)).toBeLessThan(relative);
});

test("S of liquid water is smooth: neighbouring temperatures differ by Cp/T, not by the rounding of its terms", () => {
  const capacity = capacityOf(recordOf("H2O(l)", "nasa-2002"));
  for (let k = 0; k < 200; k++) {
    const [low, high] = [280 + k * 1.3, (280 + k * 1.3) * (1 + 1e-9)];
    const expected = capacity.cp(low) * Math.log(high / low);
    expect(Math.abs(capacity.entropy(high) - capacity.entropy(low) - expected)).toBeLessThan(3e-14);
  }
});
