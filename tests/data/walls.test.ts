import { capacityOf } from "../../src/core/capacity";
import { Refusal } from "../../src/core/refusal";
import { recordOf } from "../../src/data/library";
import { allWalls, recommendedWalls, type WallPiece, type WallRecord, wallOf } from "../../src/data/walls";
import computed from "./wall-checks.json";

function sum(coefficients: readonly number[], exponents: readonly number[], t: number): number {
  return coefficients.reduce((total, coefficient, i) => total + coefficient * t ** exponents[i]!, 0);
}

function ofPiece(piece: WallPiece, t: number): number {
  return piece.coefficients ? sum(piece.coefficients, piece.exponents!, t) : piece.constant! + piece.numerator! / (t - piece.pole!);
}

/** Heat capacity as the form says, J/(kg K), at a temperature on the record's own scale; written here apart from the product. */
function heatCapacity(record: WallRecord, t: number): number {
  switch (record.form) {
    case "polynomial":
      return sum(record.coefficients!, record.exponents!, t);
    case "log10":
      return (
        10 **
        sum(
          record.coefficients!,
          record.coefficients!.map((_, i) => i),
          Math.log10(t),
        )
      );
    case "species": {
      const fit = recordOf(record.species!, record.set!);
      return (1000 * capacityOf(fit).cp(t)) / fit.molarMass;
    }
    case "piecewise":
      return ofPiece(record.pieces!.find((piece) => t >= piece.from && t < piece.to) ?? record.pieces![record.pieces!.length - 1]!, t);
    case "table":
      return record.points!.find(([at]) => at === t)![1]!;
    case "constant":
      return record.value!;
  }
}

describe("values computed from the printed forms by another program", () => {
  test.each(Object.entries(computed))("%s", (id, values) => {
    const record = wallOf(id);
    for (const [t, value] of Object.entries(values)) {
      // Printed to one decimal (to two on some lines); molar masses differ in the fifth figure.
      expect(Math.abs(heatCapacity(record, Number(t)) - value)).toBeLessThan(Math.max(0.051, 2e-4 * value));
    }
  });

  test("cover every form that computes", () => expect(Object.keys(computed)).toHaveLength(27));
});

test("every record is whole: id, limits in order, a heat capacity that a solid can have", () => {
  expect(new Set(allWalls().map((record) => record.id)).size).toBe(67);
  for (const record of allWalls()) {
    const where =
      record.form === "constant" ? record.at! : record.form === "table" ? record.points![0]![0]! : (record.from! + record.to!) / 2;
    const value = heatCapacity(record, where);
    expect([record.id, value > 80 && value < 2000]).toEqual([record.id, true]);
    if (record.form !== "constant") expect([record.id, record.from! < record.to!]).toEqual([record.id, true]);
    for (const [[a], [b]] of (record.points ?? []).slice(1).map((point, i) => [record.points![i]!, point] as const))
      expect(b!).toBeGreaterThan(a!);
  }
});

test("carbon steel: pieces join within 0.1 % and the peak is the standard's 5000 J/(kg K) at 735 degC", () => {
  const { pieces } = wallOf("carbon steel");
  for (const joint of [600, 735, 900]) {
    const [before, after] = [pieces!.find((piece) => piece.to === joint)!, pieces!.find((piece) => piece.from === joint)!];
    expect(Math.abs(ofPiece(after, joint) / ofPiece(before, joint) - 1)).toBeLessThan(0.001);
  }
  expect(ofPiece(pieces![2]!, 735)).toBe(5000);
});

test("each recommended wall has its record, and 20 to 25 degC agrees with the value known in the trade within 5 %", () => {
  const known: Readonly<Record<string, number>> = {
    "austenitic stainless steel": 470,
    "carbon steel": 450,
    "aluminium alloy": 900,
    copper: 385,
    brass: 378,
    "nickel alloy": 430,
    titanium: 522,
    PTFE: 1000,
    "borosilicate glass": 830,
  };
  expect(recommendedWalls().map(({ wall }) => wall)).toEqual(Object.keys(known));
  expect(wallOf("Stainless steel").id).toBe(wallOf("austenitic stainless steel").id);
  expect(wallOf("aluminum alloy").id).toBe(wallOf("aluminium alloy").id);
  for (const { wall } of recommendedWalls()) {
    const record = wallOf(wall);
    const t = record.form === "table" ? 300 : record.temperature === "degC" ? 23 : 298.15;
    expect([wall, Math.abs(heatCapacity(record, t) / known[wall]! - 1) < 0.05]).toEqual([wall, true]);
  }
});

test("what was written from memory says so", () => {
  expect(
    allWalls()
      .filter((record) => record.fromMemory)
      .map((record) => record.id),
  ).toContain("stainless-steel-aisi-304@incropera-a1");
  expect(allWalls().filter((record) => record.fromMemory)).toHaveLength(15);
});

test("an unknown material is refused with the nearest", () => {
  expect(() => wallOf("carbon stel")).toThrow(
    expect.objectContaining({ kind: "absent", message: expect.stringContaining("nearest: carbon steel") }),
  );
  expect(() => wallOf("")).toThrow(expect.any(Refusal));
});
