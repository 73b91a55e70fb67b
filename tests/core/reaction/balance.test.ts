import fc from "fast-check";
import { greatestCommonDivisor } from "../../../src/core/numeric/null-space";
import { balance, type Participant } from "../../../src/core/reaction/balance";
import { parseEquation, sideText } from "../../../src/core/reaction/equation";
import { minimalSolutions } from "../../../src/core/reaction/minimal";
import { Refusal } from "../../../src/core/refusal";
import { parseFormula } from "../../../src/core/species/formula";
import { refusedWith } from "../refused";

const participant = (species: string): Participant => ({ species, identity: species, ...parseFormula(species) });

function balanced(text: string): string {
  const { left, right } = parseEquation(text);
  const found = balance(
    left.map(({ species }) => participant(species)),
    right.map(({ species }) => participant(species)),
  );
  return `${sideText(found.left)} = ${sideText(found.right)}`;
}

/** Atoms and charge of a side, exact, by elements: a count of its own beside the balancing. */
function contents(side: readonly { coefficient: bigint; species: string }[]): Record<string, number> {
  const sum: Record<string, number> = {};
  for (const { coefficient, species } of side) {
    const { counts, charge } = parseFormula(species);
    for (const [element, count] of [...counts, ["charge", charge] as const])
      sum[element] = (sum[element] ?? 0) + Number(coefficient) * count;
  }
  return sum;
}

// Exercises of textbooks; that the numbers are right shows itself in the count of atoms below, that they are the smallest in the divisor.
const TEXTBOOK: readonly (readonly [text: string, answer: string])[] = [
  ["H2 + O2 = H2O", "2 H2 + O2 = 2 H2O"],
  ["C3H8 + O2 -> CO2 + H2O", "C3H8 + 5 O2 = 3 CO2 + 4 H2O"],
  ["Fe2O3 + CO = Fe + CO2", "Fe2O3 + 3 CO = 2 Fe + 3 CO2"],
  ["Ca3(PO4)2 + SiO2 + C = CaSiO3 + P4 + CO", "2 Ca3(PO4)2 + 6 SiO2 + 10 C = 6 CaSiO3 + P4 + 10 CO"],
  ["KMnO4 + HCl = KCl + MnCl2 + H2O + Cl2", "2 KMnO4 + 16 HCl = 2 KCl + 2 MnCl2 + 8 H2O + 5 Cl2"],
  // permanganate and oxalate
  ["MnO4^- + C2O4^2- + H^+ = Mn^2+ + CO2 + H2O", "2 MnO4^- + 5 C2O4^2- + 16 H^+ = 2 Mn^2+ + 10 CO2 + 8 H2O"],
  ["Cr2O7^2- + Fe^2+ + H+ = Cr^3+ + Fe^3+ + H2O", "Cr2O7^2- + 6 Fe^2+ + 14 H+ = 2 Cr^3+ + 6 Fe^3+ + 7 H2O"],
  [
    "K4[Fe(CN)6] + KMnO4 + H2SO4 = KHSO4 + Fe2(SO4)3 + MnSO4 + HNO3 + CO2 + H2O",
    "10 K4[Fe(CN)6] + 122 KMnO4 + 299 H2SO4 = 162 KHSO4 + 5 Fe2(SO4)3 + 122 MnSO4 + 60 HNO3 + 60 CO2 + 188 H2O",
  ],
  [
    "H2 + Ca(CN)2 + NaAlF4 + FeSO4 + MgSiO3 + KI + H3PO4 + PbCrO4 + BrCl + CF2Cl2 + SO2 = PbBr2 + CrCl3 + MgCO3 + KAl(OH)4 + Fe(SCN)3 + PI3 + Na2SiO3 + CaF2 + H2O",
    "88 H2 + 15 Ca(CN)2 + 6 NaAlF4 + 10 FeSO4 + 3 MgSiO3 + 6 KI + 2 H3PO4 + 6 PbCrO4 + 12 BrCl + 3 CF2Cl2 + 20 SO2 = 6 PbBr2 + 6 CrCl3 + 3 MgCO3 + 6 KAl(OH)4 + 10 Fe(SCN)3 + 2 PI3 + 3 Na2SiO3 + 15 CaF2 + 79 H2O",
  ],
  // half reactions and ions alone
  ["Fe^3+ + e- = Fe^2+", "Fe^3+ + e- = Fe^2+"],
  ["O2 + H+ + e- = H2O", "O2 + 4 H+ + 4 e- = 2 H2O"],
  ["Ag+ + Cl- = AgCl(s)", "Ag+ + Cl- = AgCl(s)"],
  // phases do not matter for atoms
  ["H2O(l) = H2O(g)", "H2O(l) = H2O(g)"],
  // broken counts: cotton
  ["CH1.686O0.843 + O2 = CO2 + H2O(l)", "1000 CH1.686O0.843 + 1000 O2 = 1000 CO2 + 843 H2O(l)"],
];

test.each(TEXTBOOK)("%s", (text, answer) => {
  expect(balanced(text)).toBe(answer);
  const { left, right } = parseEquation(answer);
  const whole = (side: typeof left) => side.map(({ coefficient, species }) => ({ coefficient: BigInt(coefficient), species }));
  const [here, there] = [contents(whole(left)), contents(whole(right))];
  for (const key of new Set([...Object.keys(here), ...Object.keys(there)])) expect([key, here[key] ?? 0]).toEqual([key, there[key] ?? 0]);
  expect([...whole(left), ...whole(right)].map(({ coefficient }) => coefficient).reduce(greatestCommonDivisor, 0n)).toBe(1n);
});

test("coefficients that stand in the text do not count", () => {
  expect(balanced("7 H2 + 0.5 O2 = 3 H2O")).toBe("2 H2 + O2 = 2 H2O");
});

test("3 × 0.1 counts as 0.3, which it is not in doubles", () => {
  // by hand: C 3a = c, H 0.3 a = 2d, O 2b = 2c + d
  expect(balanced("(CH0.1)3 + O2 = CO2 + H2O")).toBe("40 (CH0.1)3 + 123 O2 = 120 CO2 + 6 H2O");
});

const ELEMENTS = ["C", "H", "O", "N", "S"];

/** Species with random atoms and charge, their random numbers, and one last product that holds what is left: the answer is known. */
const reaction = fc.integer({ min: 1, max: 5 }).chain((size) =>
  fc.record({
    species: fc.array(
      fc.record({
        atoms: fc.array(fc.integer({ min: 0, max: 6 }), { minLength: ELEMENTS.length, maxLength: ELEMENTS.length }),
        charge: fc.integer({ min: -2, max: 2 }),
        number: fc.integer({ min: 1, max: 12 }),
        left: fc.boolean(),
      }),
      { minLength: size, maxLength: size },
    ),
  }),
);

const counted = (atoms: readonly number[]) => new Map(ELEMENTS.map((element, k) => [element, atoms[k]!] as const).filter(([, n]) => n > 0));

test("random reactions give back their numbers, the smallest, or hold another reaction", () => {
  let unique = 0;
  fc.assert(
    fc.property(reaction, ({ species }) => {
      const sum = (of: (one: (typeof species)[number]) => number) =>
        species.reduce((total, one) => total + (one.left ? 1 : -1) * one.number * of(one), 0);
      const rest = ELEMENTS.map((_, k) => sum(({ atoms }) => atoms[k]!));
      fc.pre(rest.every((count) => count >= 0) && rest.some((count) => count > 0));
      fc.pre(species.some(({ left }) => left) && species.every(({ atoms }) => atoms.some((count) => count > 0)));
      const named = species.map((one, k) => ({ ...one, species: `X${k}`, identity: `X${k}`, counts: counted(one.atoms) }));
      const last = { species: "Y", identity: "Y", counts: counted(rest), charge: sum(({ charge }) => charge) };
      const [left, right] = [named.filter((one) => one.left), [...named.filter((one) => !one.left), last]];
      try {
        const found = balance(left, right);
        const divisor = Number(species.map(({ number }) => BigInt(number)).reduce(greatestCommonDivisor, 1n));
        expect([...found.left, ...found.right.slice(0, -1)].map(({ coefficient }) => Number(coefficient) * divisor)).toEqual(
          [...left, ...named.filter((one) => !one.left)].map(({ number }) => number),
        );
        expect(Number(found.right[found.right.length - 1]!.coefficient) * divisor).toBe(1);
        unique++;
      } catch (thrown) {
        if (!(thrown instanceof Refusal)) throw thrown;
        expect(thrown.message).toMatch(/^The equation can be balanced in more than one way: it holds \d independent reactions/);
      }
    }),
    { numRuns: 1000 },
  );
  expect(unique).toBeGreaterThan(100);
});

describe("minimal reactions", () => {
  const rows = (text: string) => {
    const { left, right } = parseEquation(text);
    const all = [...left, ...right].map(({ species }) => parseFormula(species).counts);
    const elements = [...new Set(all.flatMap((counts) => [...counts.keys()]))];
    return {
      rows: elements.map((element) => all.map((counts, k) => BigInt((counts.get(element) ?? 0) * (k < left.length ? 1 : -1)))),
      columns: all.length,
    };
  };

  test("carbon burns to CO and to CO2", () => {
    const { rows: conservation, columns } = rows("C + O2 = CO + CO2");
    const found = minimalSolutions(conservation, columns)!.map((vector) => vector.map(Number));
    expect(found).toHaveLength(2);
    expect(found).toEqual(
      expect.arrayContaining([
        [2, 1, 2, 0],
        [1, 1, 0, 1],
      ]),
    );
  });

  test("each solves, is positive, has no divisor and includes no other", () => {
    for (const text of ["KMnO4 + H2O2 + H2SO4 = K2SO4 + MnSO4 + O2 + H2O", "CH4 + C2H6 + O2 + N2 = CO2 + CO + H2O + H2 + NO"]) {
      const { rows: conservation, columns } = rows(text);
      const found = minimalSolutions(conservation, columns)!;
      expect(found.length).toBeGreaterThan(1);
      for (const vector of found) {
        for (const row of conservation) expect(row.reduce((sum, value, k) => sum + value * vector[k]!, 0n)).toBe(0n);
        expect(vector.every((value) => value >= 0n)).toBe(true);
        expect(vector.reduce(greatestCommonDivisor, 0n)).toBe(1n);
        const others = found.filter((other) => other !== vector);
        expect(others.some((other) => other.every((value, k) => value === 0n || vector[k] !== 0n))).toBe(false);
      }
    }
  });

  test("there are none where nothing balances", () => {
    const { rows: conservation, columns } = rows("CO = CO2");
    expect(minimalSolutions(conservation, columns)).toEqual([]);
  });

  test("too many on the way are given up", () => {
    const row = Array.from({ length: 60 }, (_, k) => (k < 30 ? 1n : -1n));
    expect(minimalSolutions([row], 60)).toBeUndefined();
  });
});

test.each([
  // an element or a charge on one side only
  ["NH3 + O2 = H2O", "Nothing on the right holds N, which NH3 on the left does"],
  ["CO2 + H2O = CH4 + C2H6", "Nothing on the right holds O, which CO2 and H2O on the left do"],
  ["CH4 + O2 = CO2 + H2O + N2", "Nothing on the left holds N, which N2 on the right does"],
  [
    "Na = Na^+",
    "The charges cannot balance: nothing makes up for the negative charge on the left or the positive on the right; an ion or e- is missing",
  ],
  [
    "Cl2 = Cl-",
    "The charges cannot balance: nothing makes up for the positive charge on the left or the negative on the right; an ion or e- is missing",
  ],
  // only zero solves
  ["CO = CO2", "No numbers above 0 balance CO and CO2: a species is missing or mistyped"],
  // a species on the wrong side, or without part
  ["CH4 + CO = CO2 + H2", "The equation balances only with CO and CO2 on the other side: CH4 + CO2 = 2 CO + 2 H2"],
  ["H2O2 + O2 = H2O", "The equation balances only with O2 on the other side: 2 H2O2 = O2 + 2 H2O"],
  ["CO = CO2 + O2", "The equation balances only with O2 on the other side: 2 CO + O2 = 2 CO2"],
  ["N2O4 + NO = NO2", "NO takes no part: only N2O4 = 2 NO2 balances"],
  // more than one reaction
  [
    "C + O2 = CO + CO2",
    "The equation can be balanced in more than one way: it holds 2 independent reactions, such as 2 C + O2 = 2 CO; C + O2 = CO2; write one of them, or the sum that is meant with its numbers",
  ],
  [
    "KMnO4 + H2O2 + H2SO4 = K2SO4 + MnSO4 + O2 + H2O",
    "The equation can be balanced in more than one way: it holds 2 independent reactions, such as 2 H2O2 = O2 + 2 H2O; 4 KMnO4 + 6 H2SO4 = 2 K2SO4 + 4 MnSO4 + 5 O2 + 6 H2O; write one of them, or the sum that is meant with its numbers",
  ],
  // the same species again
  ["CH4 + 3 O2 = CO2 + 2 H2O + O2", "O2 stands on both sides; leave it out, or write it on the side where more of it stands"],
  ["CO2 = CO2", "CO2 stands on both sides; leave it out, or write it on the side where more of it stands"],
  ["H2 + O2 + H2 = H2O", "H2 stands twice on the left; write each species once"],
])("%s is refused", (text, sentence) => {
  expect(refusedWith(() => balanced(text))).toBe(`input: ${sentence}`);
});

test("two spellings of one species are named both", () => {
  const oxygen = { ...participant("O2"), species: "oxygen" };
  expect(refusedWith(() => balance([participant("O2"), participant("H2")], [oxygen]))).toBe(
    "input: oxygen (O2) stands on both sides; leave it out, or write it on the side where more of it stands",
  );
});

test("an empty side, more than 50 species, and counts beyond all reason", () => {
  expect(refusedWith(() => balance([], [participant("O2")]))).toBe("input: The left side holds no species");
  expect(refusedWith(() => balance([participant("O2")], []))).toBe("input: The right side holds no species");
  const many = Array.from({ length: 50 }, (_, k) => participant(`C${k + 1}H${k + 2}`));
  expect(refusedWith(() => balance(many, [participant("CH4")]))).toBe("input: The equation has 51 species; at most 50 are balanced");
  const tiny = { ...participant("C"), counts: new Map([["C", 1e-9]]) };
  expect(refusedWith(() => balance([tiny], [participant("C2")]))).toBe(
    "input: The count of atoms 1e-9 is too small or too large to be balanced",
  );
});

test("fifty species that hold many reactions are refused, not hung on", () => {
  const alkanes = Array.from({ length: 25 }, (_, k) => participant(`C${k + 1}H${2 * k + 4}`));
  const alcohols = Array.from({ length: 25 }, (_, k) => participant(`C${k + 1}H${2 * k + 4}O`));
  const mixed = [...alkanes.slice(0, 20), ...alcohols.slice(0, 5)];
  expect(refusedWith(() => balance(mixed, [...alkanes.slice(20), ...alcohols.slice(5)]))).toMatch(
    /^input: The equation can be balanced in more than one way: it holds 47 independent reactions, such as /,
  );
});
