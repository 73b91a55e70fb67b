import { evaluateFormulas, type Outcome } from "../../../src/recalc/evaluate";

/** Value of a formula that must come to one number. */
function numberOf(formula: string): number {
  const [outcome] = evaluateFormulas([formula]) as [Outcome];
  if ("error" in outcome) throw new Error(`${formula}: ${outcome.error.code} ${outcome.error.message}`);
  return outcome.value as number;
}

/**
 * Distributions: [D] values from SciPy 1.17 (cdflib, Boost), which keeps 1e-15 and agrees with the vendor's documentation in the ten
 * digits printed there. Tolerance 5e-15 relative: the digits a double keeps through three or four functions; more only where said.
 */
describe("distributions keep the digits of a double", () => {
  test.each<[string, number, number?]>([
    ["=NORM.DIST(42,40,1.5,TRUE)", 0.9087887802741321],
    ["=NORM.DIST(42,40,1.5,FALSE)", 0.10934004978399577],
    ["=NORM.S.DIST(-3,TRUE)", 0.0013498980316300933],
    // In the far tail the argument's own rounding counts x² ulps: 64 · 1.1e-16.
    ["=NORM.S.DIST(-8,TRUE)", 6.22096057427174e-16, 3e-14],
    ["=NORM.S.INV(0.975)", 1.959963984540054],
    ["=NORM.S.INV(1E-10)", -6.361340902404056],
    ["=NORM.INV(0.908789,40,1.5)", 42.00000200956616],
    ["=NORMSDIST(1.333333)", 0.9087887256040952],
    ["=GAUSS(2)", 0.4772498680518208],
    ["=PHI(0.75)", 0.30113743215480443],
    ["=LOGNORM.DIST(4,3.5,1.2,TRUE)", 0.03908355570680047],
    ["=LOGNORM.INV(0.039084,3.5,1.2)", 4.000025218680636],
    ["=T.DIST(60,1,TRUE)", 0.9946953263673767],
    ["=T.DIST(-2.5,7,TRUE)", 0.020496109292876444],
    ["=T.DIST(1.5,7,FALSE)", 0.12626306128596107],
    ["=T.DIST.2T(1.959999998,60)", 0.0546449299759209],
    ["=TDIST(1.959999998,60,2)", 0.0546449299759209],
    ["=T.INV(0.75,2)", 0.8164965809277261],
    ["=T.INV.2T(0.05,9)", 2.2621571627982053],
    ["=T.INV.2T(0.001,3)", 12.923978636687481],
    ["=TINV(0.05,1000)", 1.9623390808264085],
    ["=CHISQ.DIST(2,3,FALSE)", 0.2075537487102974],
    ["=CHISQ.DIST.RT(18.307,10)", 0.05000058909139812],
    ["=CHISQ.DIST.RT(80,10)", 5.020464318829132e-13],
    ["=CHIINV(0.050001,10)", 18.30697345696106],
    ["=CHISQ.INV(0.93,1)", 3.283020286759539],
    ["=CHISQ.INV.RT(0.000001,10)", 46.863046846784385],
    ["=F.DIST(15.2069,6,4,TRUE)", 0.9900000430027627],
    ["=F.DIST.RT(15.2069,6,4)", 0.009999956997237313],
    ["=F.INV(0.01,6,4)", 0.10930991412457852],
    ["=FINV(0.01,6,4)", 15.206864861157523],
    ["=GAMMA.DIST(10.00001131,9,2,TRUE)", 0.0680940038697872],
    ["=GAMMA.INV(0.068094,9,2)", 10.000011191437181],
    ["=BETA.DIST(2,8,10,TRUE,1,3)", 0.6854705810546875],
    ["=BETA.INV(0.685470581,8,10,1,3)", 1.9999999999631428],
    ["=BINOM.DIST(6,10,0.5,FALSE)", 0.205078125],
    ["=BINOM.DIST(6,10,0.5,TRUE)", 0.828125],
    ["=BINOM.INV(6,0.5,0.75)", 4],
    ["=POISSON.DIST(2,5,TRUE)", 0.12465201948308108],
    ["=HYPGEOM.DIST(1,4,8,20,FALSE)", 0.36326109391124867],
    ["=NEGBINOM.DIST(10,5,0.25,TRUE)", 0.3135140584781766],
    ["=CONFIDENCE.T(0.05,1,50)", 0.2841968554957299],
    ["=CONFIDENCE.NORM(0.05,2.5,50)", 0.6929519121748391],
    ["=GAMMA(2.5)", 1.329340388179137],
    ["=GAMMA(-3.75)", 0.26786612886141653],
    ["=GAMMALN(0.1)", 2.252712651734206],
    ["=GAMMALN(100000)", 1051287.7089736569],
    ["=ERF(0.745)", 0.7079289200957376],
    ["=ERF(1E-10)", 1.1283791670955126e-10],
    ["=ERFC(6)", 2.1519736712498913e-17],
    ["=T.TEST({3;4;5;8;9;1;2;4;5},{6;19;3;2;14;4;5;17;1},2,1)", 0.19601578492528204],
    // The sum of squares loses two digits to its mean.
    ["=T.TEST({3;4;5;8;9;1;2;4;5},{6;19;3;2;14;4;5;17;1},2,2)", 0.19199588676039622, 2e-14],
    ["=T.TEST({3;4;5;8;9;1;2;4;5},{6;19;3;2;14;4;5;17;1},2,3)", 0.20229392336867796],
    ["=F.TEST({6;7;9;15;21},{20;28;31;38;40})", 0.6483178467861745],
    ["=Z.TEST({3;6;7;8;6;5;4;2;1;9},4)", 0.09057419685136386],
  ])("%s", (formula, expected, tolerance = 5e-15) => {
    expect(Math.abs(numberOf(formula) / expected - 1)).toBeLessThanOrEqual(tolerance);
  });
});

/** [M] by mathematics or definition, [V] the vendor's documentation of the function. Exact unless a tolerance says otherwise. */
describe("arithmetic, samples, lines", () => {
  test.each<[string, number, number?]>([
    ["=-2^2", 4], // [V] a sign binds closer than the power
    ["=0-2^2", -4],
    ["=MOD(5.5,1.1)", 0], // [V] number − divisor · INT(number/divisor)
    ["=MOD(-3,2)", 1], // [V]
    ["=MOD(3,-2)", -1], // [V]
    ["=YEARFRAC(45000,45200)", 196 / 360], // [M] 15 March to 1 October 2023, months of 30 days
    ["=HYPGEOMDIST(1,4,8,20)", 0.36326109391124867, 5e-15], // [V] 0.363261
    ["=2^-1", 0.5],
    ["=2^-1*3", 1.5],
    ["=6/-3*2", -4],
    ["=2^3^2", 64], // [V] from left to right
    ["=LOG10(100)", 2],
    ["=LOG10(1000)", 3],
    ["=50%^2", 0.25],
    ["=ROUND(1.005,2)", 1.01], // [V] on decimal digits
    ["=ROUND(2.675,2)", 2.68],
    ["=ROUND(-2.5,0)", -3],
    ["=ROUND(1234.5,-2)", 1200],
    ["=ROUNDUP(3.14159,3)", 3.142], // [V]
    ["=ROUNDDOWN(-3.14159,1)", -3.1], // [V]
    ["=TRUNC(-8.9)", -8], // [V]
    ["=ROUND(123456789.123456789,3)", 123456789.123],
    ["=MROUND(1.3,0.2)", 1.4], // [V]
    ["=FACT(5)", 120],
    ["=FACT(170)", 7.257415615307999e306, 2e-14], // [M] 170!; 170 products, each rounded
    ["=COMBIN(60,30)", 118264581564861424], // [M]
    ["=COMBINA(4,3)", 20], // [V]
    ["=PERMUT(100,3)", 970200], // [V]
    ["=MULTINOMIAL(2,3,4)", 1260], // [V]
    ["=QUOTIENT(-10,3)", -3], // [V]
    ["=GCD(24,36)", 12],
    ["=LCM(24,36)", 72],
    ["=SIGN(-3)", -1],
    ["=EVEN(-1)", -2], // [V]
    ["=SUMSQ(3,4)", 25],
    ["=SERIESSUM(2,0,1,{1,1,1})", 7],
    ["=N(TRUE)", 1],
    ["=GEOMEAN({2,8})", 4, 1e-15],
    ["=HARMEAN({1,3})", 1.5, 1e-15],
    ["=DEVSQ({4,5,8,7,11,4,3})", 48], // [V]
    ["=KURT({3,4,5,2,3,4,5,6,4,7})", -0.15179963720841405, 2e-14], // [V] -0.151799637; the difference of two numbers of size 3
    ["=SKEW({3,4,5,2,3,4,5,6,4,7})", 0.35954307140679753, 1e-15],
    ["=MODE({5.6,4,4,3,2,4})", 4], // [V]
    ["=RANK.AVG(94,{89,88,92,101,94,97,95})", 4], // [V]
    ["=PERCENTRANK.INC({13,12,11,8,4,3,2,1,1,1},5)", 0.583], // [V] cut, not rounded
    ["=PERCENTRANK.EXC({1,2,3,6,6,6,7,8,9},7)", 0.7], // [V]
    ["=TRIMMEAN({4,5,6,7,2,3,4,5,1,2,3},0.2)", 34 / 9], // [V] 3.778
    ["=AGGREGATE(9,6,{1,2,3})", 6],
    ["=AGGREGATE(9,6,{1,#DIV/0!,3})", 4],
    ["=AGGREGATE(14,6,{1,2,3,4},2)", 3],
    ["=SLOPE({2,3,9,1,8,7,5},{6,5,11,7,5,4,4})", 0.3055555555555556, 1e-15], // [V] 0.305556
    ["=INTERCEPT({1,2,3},{2,4,6})", 0],
    ["=FORECAST(30,{6,7,9,15,21},{20,28,31,38,40})", 10.607253086419755, 2e-15], // [V] 10.607253
    ["=INDEX(LINEST({1;9;5;7},{0;4;2;3}),1)", 2], // [V]
    ["=INDEX(LINEST({1;9;5;7},{0;4;2;3}),2)", 1], // [V]
    ['=CONVERT(1,"BTU","J")', 1055.05585262], // NIST SP 811, International Table
    ['=CONVERT(1,"cal","J")', 4.1868],
    ['=CONVERT(1,"c","J")', 4.184],
    ['=CONVERT(1,"lbm","g")', 453.59237],
    ['=CONVERT(1,"atm","Pa")', 101325],
    ['=CONVERT(20,"C","F")', 68],
    ["=ERROR.TYPE(#N/A)", 7], // [V]
    ["=ERROR.TYPE(1/0)", 2],
    ["=XMATCH(2.5,{1,2,3},-1)", 2],
    ['=HEX2DEC("A5")', 165], // [V]
    ['=IMABS("5+12i")', 13],
  ])("%s", (formula, expected, tolerance = 0) => {
    const value = numberOf(formula);
    if (tolerance === 0) expect(value).toBe(expected);
    else expect(Math.abs(value / expected - 1)).toBeLessThanOrEqual(tolerance);
  });

  it("keeps the digits of a cubic in temperature that inverting the squares would lose", () => {
    // y = 30 - 0.02 T + 5e-5 T² - 2e-8 T³ at 300 … 1000 K; coefficients are compared with those put in.
    const temperatures = [300, 400, 500, 600, 700, 800, 900, 1000];
    const y = temperatures.map((t) => 30 - 0.02 * t + 5e-5 * t ** 2 - 2e-8 * t ** 3);
    const rows = temperatures.map((t) => [t, t ** 2, t ** 3].join(",")).join(";");
    const [outcome] = evaluateFormulas([`=LINEST({${y.join(";")}},{${rows}})`]) as unknown as [{ value: number[][] }];
    const [cubic, square, linear, constant] = outcome.value[0] as [number, number, number, number];
    expect(Math.abs(cubic / -2e-8 - 1)).toBeLessThan(1e-10);
    expect(Math.abs(square / 5e-5 - 1)).toBeLessThan(1e-10);
    expect(Math.abs(linear / -0.02 - 1)).toBeLessThan(1e-10);
    expect(Math.abs(constant / 30 - 1)).toBeLessThan(1e-11);
  });
});

describe("texts, comparisons, tables", () => {
  test.each<[string, unknown]>([
    ['="a"&1', "a1"],
    ['=1/3&""', "0.333333333333333"], // 15 digits
    ['=0.1+0.2&""', "0.3"],
    ['=1E21&""', "1E+21"],
    ['=IFERROR(INDEX(STILL.CV.AT("N2",25),5,2),"refused")', "refused"],
    // & goes cell by cell over an array; CONCAT joins all
    ['=INDEX({7.5;30;11}&" kg",2)', "30 kg"],
    ['=INDEX({1,2}&{"a";"b"},2,1)', "1b"],
    ['=INDEX(CONCATENATE({1,2},"a"),1,2)', "2a"],
    ['=CONCAT({1,2},"a")', "12a"],
    ['=ROWS({7.5;30;11}&" kg")', 3],
    ["=LEN(1/3)", 17],
    ['=TEXTJOIN(",",TRUE,1/3,"b")', "0.333333333333333,b"],
    ['=TEXT(12345.678,"0.00E+00")', "1.23E+04"],
    ['=TEXT(12345,"##0.0E+0")', "12.3E+3"],
    ['=TEXT(9.996,"0.00E+00")', "1.00E+01"],
    ['=TEXT(0.285,"0.0%")', "28.5%"],
    ['=TEXT("abc","0")', "abc"],
    ['=REPT("-",3)', "---"],
    ["=T(1)", ""],
    ["=BASE(7,2)", "111"],
    ["=DEC2HEX(255)", "FF"],
    ["=1=1", true],
    ['="a"="A"', true],
    ['=1<"a"', true],
    ['=TRUE>"z"', true],
    [
      "={1,2;3,4}",
      [
        [1, 2],
        [3, 4],
      ],
    ],
    [
      "={1,2;3,4}*2",
      [
        [2, 4],
        [6, 8],
      ],
    ],
    ["=FILTER({1;2;3},{TRUE;FALSE;TRUE})", [[1], [3]]],
    ['=FILTER({1;2},{FALSE;FALSE},"none")', "none"],
    ["=SORT({3;1;2},1,-1)", [[3], [2], [1]]],
    ['=SORTBY({"a";"b";"c"},{3;1;2})', [["b"], ["c"], ["a"]]],
    ['=CONCAT({"a","b";"c","d"})', "abcd"],
    ["=MODE.MULT({1;2;3;4;3;2;1;2;3;5;6;1})", [[1], [2], [3]]], // [V]
    ["=TREND({1,2,3})", [[1, 2, 3]]],
    ["=@{5,6}", 5],
    ["=SIGN({-1,0,2})", [[-1, 0, 1]]],
  ] as [string, unknown][])("%s", (formula, expected) => {
    const [outcome] = evaluateFormulas([formula]) as [Outcome];
    expect(outcome).toEqual({ formula, value: expected });
  });
});

describe("errors are of Excel's kind", () => {
  test.each([
    ["=1/0", "#DIV/0!"],
    ["=LN(-1)", "#NUM!"],
    ["=SQRT(-1)", "#NUM!"],
    ["=(-8)^(1/3)", "#NUM!"],
    ["=0^0", "#NUM!"],
    ["=EXP(1000)", "#NUM!"],
    ["=1/EXP(1000)", "#NUM!"], // never 0 from an overflow
    ["=FACT(171)", "#NUM!"],
    ["=COMBIN(2,3)", "#NUM!"],
    ["=NORM.S.INV(0)", "#NUM!"],
    ["=LARGE({1,2},3)", "#NUM!"],
    ["=INDEX({1;2},9)", "#REF!"],
    ["=MOD(5,0)", "#DIV/0!"],
    ["=LOG10(0)", "#NUM!"],
    ['="x"*2', "#VALUE!"],
    ['=LN("x")', "#VALUE!"],
    ["=MODE({1,2})", "#N/A"],
    ['=CONVERT(1,"J","Pa")', "#N/A"],
    ["=ERROR.TYPE(1)", "#N/A"],
    ["=#REF!", "#REF!"],
    ["=SUM({1,#N/A})", "#N/A"],
    ["=FILTER({1},{FALSE})", "#CALC!"],
  ])("%s is %s", (formula, code) => {
    expect(evaluateFormulas([formula])[0]).toMatchObject({ error: { code } });
  });
});
