import { classicalLimits } from "../../../src/core/capacity/limits";
import { GAS_CONSTANT as R } from "../../../src/core/constants";
import { refusedWith } from "../refused";
import { nitrogenMolecular } from "./fits";

test.each([
  ["an atom", { atoms: 1 }, 1.5, 1.5, "an atom has no vibrations"],
  ["two atoms", { atoms: 2 }, 2.5, 3.5, "a molecule of 2 atoms has 1 vibration"],
  ["CO2", { atoms: 3, linear: true }, 2.5, 6.5, "4 vibrations of a linear molecule of 3 atoms"],
  ["H2O", { atoms: 3, linear: false }, 3, 6, "3 vibrations of a non-linear molecule of 3 atoms"],
  ["CH4", { atoms: 5, linear: false }, 3, 12, "9 vibrations of a non-linear molecule of 5 atoms"],
])("%s", (_, molecule, frozen, excited, basis) => {
  const limits = classicalLimits(molecule);
  expect(limits.frozen / R).toBeCloseTo(frozen, 14);
  expect(limits.excited / R).toBeCloseTo(excited, 14);
  expect(limits.basis).toBe(basis);
});

test("molecular constants count their own vibrations", () => {
  const limits = classicalLimits(nitrogenMolecular.molecular!);
  expect(limits).toEqual({ frozen: 2.5 * R, excited: 2.5 * R + R, vibrations: 1, basis: "1 vibration of the molecular constants" });
});

test("an internal rotor counts as one vibration", () => {
  const limits = classicalLimits({
    geometry: "nonlinear",
    symmetry: 1,
    rotation: [],
    vibrations: [
      [1000, 3],
      [3000, 8],
    ],
    electronic: [[0, 1]],
    rotors: [{ barrier: 1000, folds: 3, reducedMoment: 1e-47 }],
  });
  expect(limits.vibrations).toBe(12);
  expect(limits.basis).toBe("12 vibrations of the molecular constants, 1 of them internal rotors");
});

test("refuses to guess whether a molecule is linear", () =>
  expect(refusedWith(() => classicalLimits({ atoms: 3 }))).toBe(
    "input: It is not known whether this molecule of 3 atoms is linear, so its classical limits are not known",
  ));

test("refuses a broken number of atoms", () => expect(refusedWith(() => classicalLimits({ atoms: 2.529 }))).toMatch(/2.529 atoms/));
