import fc from "fast-check";
import { equationText, parseEquation, sideText } from "../../../src/core/reaction/equation";
import { refusedWith } from "../refused";

type Side = [coefficient: number, species: string][];
const read = (text: string): [Side, Side] => {
  const { left, right } = parseEquation(text);
  const side = (terms: typeof left): Side => terms.map(({ coefficient, species }) => [coefficient, species]);
  return [side(left), side(right)];
};

test.each(["=", "==", "->", "-->", "=>", "→", "⟶", "⇒", "⇌", "⇄", "<=>", "<->"])("%s parts the sides, with and without blanks", (arrow) => {
  const expected = [
    [
      [1, "CH4"],
      [2, "O2"],
    ],
    [
      [1, "CO2"],
      [2, "H2O(g)"],
    ],
  ];
  expect(read(`CH4 + 2 O2 ${arrow} CO2 + 2 H2O(g)`)).toEqual(expected);
  if (arrow !== "-->") expect(read(`CH4+2O2${arrow}CO2+2H2O(g)`)).toEqual(expected);
});

test.each<[text: string, left: Side]>([
  // coefficients
  ["1/2 O2 = x", [[0.5, "O2"]]],
  ["3/2O2 = x", [[1.5, "O2"]]],
  ["½ O2 = x", [[0.5, "O2"]]],
  ["1½O2 = x", [[1.5, "O2"]]],
  [
    "H2+¾ O2 = x",
    [
      [1, "H2"],
      [0.75, "O2"],
    ],
  ],
  [".5 O2 = x", [[0.5, "O2"]]],
  ["2.50 CO2 = x", [[2.5, "CO2"]]],
  ["2(NH4)2SO4 = x", [[2, "(NH4)2SO4"]]],
  ["3[Fe(CN)6]^3- = x", [[3, "[Fe(CN)6]^3-"]]],
  // names, also those that begin with a number
  ["2 carbon dioxide = x", [[2, "carbon dioxide"]]],
  ["1,3-C4H6 = x", [[1, "1,3-C4H6"]]],
  ["2 1-C4H8 = x", [[2, "1-C4H8"]]],
  [
    "methane+oxygen = x",
    [
      [1, "methane"],
      [1, "oxygen"],
    ],
  ],
  // a plus that is a charge, and one that is not
  [
    "Fe^3+ + e- = x",
    [
      [1, "Fe^3+"],
      [1, "e-"],
    ],
  ],
  [
    "H+ +OH- = x",
    [
      [1, "H+"],
      [1, "OH-"],
    ],
  ],
  [
    "H++OH- = x",
    [
      [1, "H+"],
      [1, "OH-"],
    ],
  ],
  [
    "Ca+2 + SO4^2- = x",
    [
      [1, "Ca+2"],
      [1, "SO4^2-"],
    ],
  ],
  [
    "2 Na+(aq) + CO3^2-(aq) = x",
    [
      [2, "Na+(aq)"],
      [1, "CO3^2-(aq)"],
    ],
  ],
  [
    "Fe(2+) + 2 e- = x",
    [
      [1, "Fe(2+)"],
      [2, "e-"],
    ],
  ],
  [
    "H2+O2 = x",
    [
      [1, "H2"],
      [1, "O2"],
    ],
  ],
  [
    "H2+1/2O2 = x",
    [
      [1, "H2"],
      [0.5, "O2"],
    ],
  ],
  [
    "Na+ + 2 H+ = x",
    [
      [1, "Na+"],
      [2, "H+"],
    ],
  ],
  [
    "Fe³⁺ + e⁻ = x",
    [
      [1, "Fe³⁺"],
      [1, "e⁻"],
    ],
  ],
])("%s", (text, left) => {
  expect(read(text)).toEqual([left, [[1, "x"]]]);
});

test("a charge before the arrow stays", () => {
  expect(read("Cl- -> Cl + e-")).toEqual([
    [[1, "Cl-"]],
    [
      [1, "Cl"],
      [1, "e-"],
    ],
  ]);
  expect(read("Fe^2+ = Fe^3+ + e-")).toEqual([
    [[1, "Fe^2+"]],
    [
      [1, "Fe^3+"],
      [1, "e-"],
    ],
  ]);
});

test("what is written from an equation reads back to the same", () => {
  const coefficient = fc.oneof(fc.integer({ min: 1, max: 999 }), fc.double({ min: 0.001, max: 99, noNaN: true }));
  const species = fc.constantFrom("O2", "Fe^3+", "e-", "H2O(l)", "carbon dioxide", "1,3-C4H6", "(NH4)2SO4", "Na+(aq)", "CH1.686O0.843");
  const side = fc.array(fc.record({ coefficient, species }), { minLength: 1, maxLength: 6 });
  fc.assert(
    fc.property(side, side, (left, right) => {
      expect(parseEquation(equationText({ left, right }))).toEqual({ left, right });
    }),
  );
});

test("a coefficient of 1 is not written", () => {
  expect(
    sideText([
      { coefficient: 1, species: "A" },
      { coefficient: 1n, species: "B" },
      { coefficient: 2n, species: "C" },
    ]),
  ).toBe("A + B + 2 C");
});

test.each([
  ["  ", 'input: The equation is empty; write a text such as "CH4 + 2 O2 = CO2 + 2 H2O"'],
  ["CH4 + 2 O2", 'input: "CH4 + 2 O2" has no equals sign or arrow; write reactants = products, such as "CH4 + 2 O2 = CO2 + 2 H2O"'],
  ["A = B -> C", 'input: "A = B -> C" has 2 equals signs or arrows; an equation has one'],
  ["CH2=CH2 + H2 = C2H6", 'input: "CH2=CH2 + H2 = C2H6" has 2 equals signs or arrows; an equation has one'],
  ["= CO2", 'input: The left side of "= CO2" is empty'],
  ["CO2 =", 'input: The right side of "CO2 =" is empty'],
  ["CH4 + + O2 = CO2", 'input: The left side of "CH4 + + O2 = CO2" has a plus sign with nothing beside it'],
  ["+ CH4 = CO2", 'input: The left side of "+ CH4 = CO2" has a plus sign with nothing beside it'],
  ["CH4 = CO2 +", 'input: The right side of "CH4 = CO2 +" has a plus sign with nothing beside it'],
  ["0 CH4 = C", "input: The coefficient 0 of CH4 is not a number above 0"],
  ["1/0 CH4 = C", "input: The coefficient 1/0 of CH4 is not a number above 0"],
  ["-1 O2 = O3", 'input: The coefficient in "-1 O2" is negative; a species that is used up stands on the left'],
  ["0,5 O2 = O3", 'input: The coefficient in "0,5 O2" has a decimal comma; write 0.5 O2'],
  ["2 = O3", 'input: "2" is a coefficient without a species'],
  ["1 1/2 O2 = O3", 'input: "1 1/2 O2" has two numbers before the species; write one, such as 1.5 or 3/2'],
  [`${"A".repeat(2000)} = B`, "input: The equation has 2004 characters; at most 2000 are read"],
  [
    "N".repeat(90),
    `input: "${"N".repeat(80)}…" has no equals sign or arrow; write reactants = products, such as "CH4 + 2 O2 = CO2 + 2 H2O"`,
  ],
])("%s is refused", (text, sentence) => {
  expect(refusedWith(() => parseEquation(text))).toBe(sentence);
});
