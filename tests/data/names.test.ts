import { Refusal } from "../../src/core/refusal";
import { allSpecies, findSpecies } from "../../src/data/library";

const key = (text: string): string => findSpecies(text).key;

function sentence(text: string): string {
  try {
    return `resolved: ${findSpecies(text).key}`;
  } catch (refusal) {
    if (refusal instanceof Refusal) return `${refusal.kind}: ${refusal.message}`;
    throw refusal;
  }
}

/** The spellings of the published tables, each on its own, exactly as printed there. */
const SPELLINGS =
  "CH4;CO;CO2;C2H6;H2;H2O;O3;H2O(cr);H2O(l);C2H4;C2H2;O2;H;N;NH;NO;N2;O;OH;HCN;NH3;SO2;Ar;He;Kr;Ne;Xe;COS;H2S;HCl;HF;NO2;HNO3;N2O;CH3Cl;C(gr);Br2;F2;I2;S(a);S(b);S(L);Cl2;C3H8;C3H4 (propyne);C2N2;CH3CN;i-C4H10;HBr;HO2;H2O2;CH;CH2;CH2(S);CH3;HCO;CH2O;CH2OH;CH3O;CH3OH;C2H;C2H3;C2H5;CH2CO;HCCO;HCCOH;H2CN;HNO;NNH;NH2;HCNO;HOCN;HNCO;NCO;CN;HCNN;C3H7;CH3CHO;CH2CHO;oxirane;C3H6;acetone;1,3-C4H6;n-C4H10;1-C4H8;i-C4H8;C6H6;C7H8 (toluene);phenol;naphthalene;ethylbenzene;n-C5H12;n-C6H14;n-C7H16;n-C8H18;n-C9H20;n-C10H22;n-C12H26;methylcyclohexane;C2H5OH;dimethyl ether;N2H4;HONO;i-C8H18;Fe(cr);Si(cr);FeO(cr);Ni(cr);MgO(cr);Al2O3(cr,alpha);SiO2(cr,quartz);CaO(cr);NaCl(cr);Cu(cr);SO3;Be(cr);Mg(cr);Al(cr);Cr(cr);Mn(cr);Zn(cr);Zr(cr);Nb(cr);Mo(cr);Ta(cr);W(cr);Pb(cr);SiC(cr);Acetone(l);Acetone;Benzene(l);Benzene;n-Butane;CaC2;CaCO3;Ca(OH)2;CaO;CCl4(l);Cu;allene;CH3COOH;cyclo-C3H6;benzyl alcohol;benzaldehyde;biphenyl".split(
    ";",
  );

describe("a species key as its table prints it", () => {
  test.each(SPELLINGS)("%s resolves", (text) => expect(sentence(text)).toMatch(/^resolved: /));

  test.each(["C", "S", "c", "s"])("bare %s is refused with its meanings", (text) => {
    expect(sentence(text)).toMatch(/^input: .*\b[CS]\(g\).* or /);
  });
});

describe("every text of the library", () => {
  test.each(allSpecies().map((entry) => [entry.key, entry] as const))("%s: key, name and synonyms lead to it", (_, entry) => {
    for (const text of [entry.key, entry.name, ...entry.synonyms]) {
      expect([text, key(text)]).toEqual([text, entry.key]);
      expect([text, key(text.toLowerCase())]).toEqual([text, entry.key]);
      expect([text, key(` ${text.replace(/-/g, "\u2011")} `)]).toEqual([text, entry.key]);
    }
  });
});

describe("formulas, phases and cases", () => {
  test.each([
    ["H3N", "NH3"],
    ["OH2", "H2O"],
    ["H4C", "CH4"],
    ["h2o", "H2O"],
    ["n2", "N2"],
    ["N₂", "N2"],
    ["C₂H₅OH", "C2H5OH"],
    ["co", "CO"],
    ["CO", "CO"],
    ["H2O(g)", "H2O"],
    ["N2(g)", "N2"],
    ["N2 (g)", "N2"],
    ["Fe(s)", "Fe(cr)"],
    ["Fe", "Fe(cr)"],
    ["S(l)", "S(L)"],
    ["H2O(s)", "H2O(cr)"],
    ["C(cr)", "C(gr)"],
    ["C(s)", "C(gr)"],
    ["carbon(g)", "C(g)"],
    ["liquid water", "H2O(l)"],
    ["water(l)", "H2O(l)"],
    ["water vapor", "H2O"],
    ["Steam", "H2O"],
    ["carbonic gas", "CO2"],
    ["ETHYLENE", "C2H4"],
    ["acetylene", "C2H2"],
    ["iso-octane", "i-C8H18"],
    ["isooctane", "i-C8H18"],
    ["sulphur dioxide", "SO2"],
    ["aluminum", "Al(cr)"],
    ["nitrogen gas", "N2"],
    ["C3H6", "C3H6"],
    ["propylene", "C3H6"],
    ["CH2", "CH2"],
    ["CH3O", "CH3O"],
    ["(CH3)2CO", "acetone"],
    ["Benzene(g)", "C6H6"],
    ["benzene(l)", "C6H6(l)"],
    ["liquid benzene", "C6H6(l)"],
    ["C6H6(l)", "C6H6(l)"],
    ["n-Butane", "n-C4H10"],
    ["butane", "n-C4H10"],
    ["NaCl", "NaCl(cr)"],
    ["Al2O3", "Al2O3(cr,alpha)"],
    ["rhombic sulfur", "S(a)"],
    ["Sulphur, liquid", "S(L)"],
    ["HCL", "HCl"],
  ])("%s is %s", (text, expected) => expect(sentence(text)).toBe(`resolved: ${expected}`));

  test.each([
    ["C3H4", "propyne", "allene"],
    ["C2H6O", "C2H5OH", "dimethyl ether"],
    ["C4H10", "n-C4H10", "i-C4H10"],
    ["C8H18", "n-C8H18", "i-C8H18"],
    ["C2H4O", "CH3CHO", "oxirane"],
    ["CHNO", "HNCO", "HOCN"],
    ["C2H2O", "CH2CO", "HCCOH"],
    ["C4H8", "1-C4H8", "i-C4H8"],
    ["S(cr)", "S(a)", "S(b)"],
    ["water", "H2O", "H2O(l)"],
    ["carbon", "C(g)", "C(gr)"],
    ["sulphur", "S(g)", "S(a)"],
    ["C8H10", "xylenes", "ethylbenzene"],
  ])("%s has several meanings and is refused, naming %s and %s", (text, one, other) => {
    const words = sentence(text);
    expect(words).toMatch(/^input: ".*" stands for several /);
    expect(words).toContain(one);
    expect(words).toContain(other);
  });
});

describe("a miss", () => {
  test("names the nearest", () => {
    expect(sentence("N3")).toBe('absent: "N3" is not in the library; nearest: N2, NH3, NO');
    expect(sentence("nitrogn")).toContain("nearest: N2");
    expect(sentence("methan")).toContain("nearest: CH4");
    expect(sentence("toluen")).toContain("nearest: toluene");
    expect(sentence("ethanl")).toContain("C2H5OH (ethanol)");
  });

  test("another element's symbol is never read as a gas in other letters", () => {
    expect(sentence("Co")).toMatch(/^absent: "Co" is not in the library/);
    expect(sentence("No")).toMatch(/^absent: /);
    expect(sentence("Hf")).toMatch(/^absent: /);
    expect(sentence("CU")).toMatch(/^absent: /);
  });

  test.each(["OH-", "CN-", "NO2-", "H+", "OH⁻"])("the ion %s is not the molecule", (text) => expect(sentence(text)).toMatch(/^absent: /));

  test.each(["ethanol(l)", "N2(l)", "H2O(aq)", "", " ", "((", "0.5 N2", "TNT", "x".repeat(5000)])("%p is refused, not misread", (text) => {
    expect(sentence(text)).toMatch(/^(absent|input): /);
  });
});
