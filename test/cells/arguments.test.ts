// How arguments, words, settings, blanks and errors behave in the cells. Expectations follow from the rules themselves
// (shapes, equality of the same case written in two ways), not from stored numbers. Fails where a rule is broken.
import { describe, expect, test } from "vitest";
import { CellError } from "../../src/cells/cell.js";
import { column, film, numberOf, one, row, sentence } from "./call.js";

const plate = ["air", 80, 20, 0.3] as const;
const h = numberOf(one("FREE.PLATE", plate));

describe("the same case in other words", () => {
  test.each([
    [["AIR", "353.15 K", "68 degF", "300 mm"]],
    [["dry air", "80 °C", "293.15 K", "11.811023622047244 in"]],
    [["air", "176 degF", 20, "0.3 m"]],
    [["air", "80", "20", "0,3"]],
  ])("%j", (values) => {
    expect(numberOf(one("FREE.PLATE", values)) / h).toBeCloseTo(1, 10);
  });

  test("units = US reads bare numbers and gives results in US units", () => {
    const us = film("FREE.PLATE", ["air", 176, 68, 0.3 / 0.3048], row("h", "Ts", "h [W/(m²·K)]"), "units=US")[0] as number[];
    expect((us[0] as number) * 5.678263341113488).toBeCloseTo(h, 8); // NIST SP 811: 1 Btu/(h·ft²·°F) = 5.678263 W/(m²·K)
    expect(us[1]).toBeCloseTo(176, 9);
    expect(us[2]).toBeCloseTo(h, 8);
  });

  test("unit of NAME sets the unit of one argument's bare numbers", () => {
    expect(numberOf(one("FREE.PLATE", ["air", 80, 20, 300], null, "unit of height=mm"))).toBeCloseTo(h, 10);
  });

  test("settings as text, as two columns and as a table with one row say the same", () => {
    const text = numberOf(one("FREE.PLATE", plate, "h", "pressure=2 bar; gravity=5"));
    expect(
      numberOf(
        one("FREE.PLATE", plate, "h", [
          ["pressure", "2 bar"],
          ["gravity", 5],
        ]),
      ),
    ).toBe(text);
    expect(
      numberOf(
        one("FREE.PLATE", plate, "h", [
          ["pressure", "gravity"],
          ["2 bar", 5],
        ]),
      ),
    ).toBe(text);
    expect(text).not.toBeCloseTo(h, 2);
  });

  test("altitude thins the air, and a gauge pressure adds to the ambient of the altitude", () => {
    const high = numberOf(one("FREE.PLATE", plate, "h", "altitude=3000 m"));
    expect(high).toBeLessThan(h);
    // ISO 2533:1975: 70 108.5 Pa at 3000 m
    expect(numberOf(one("FREE.PLATE", plate, "h", "pressure=70108.5 Pa"))).toBeCloseTo(high, 4);
    expect(numberOf(one("FREE.PLATE", plate, "h", "altitude=3000 m; pressure=0 barg"))).toBeCloseTo(high, 9);
  });
});

describe("shapes", () => {
  test("a column of cases and a row of words give one row a case", () => {
    const cells = film("FREE.PLATE", ["air", column(40, 60, 80), 20, 0.3], row("Ts [°C]", "h", "verdict"));
    expect(cells.map((line) => line.length)).toEqual([3, 3, 3]);
    expect(cells[2]?.[0]).toBeCloseTo(80, 9);
    expect(cells[2]?.[1]).toBe(h);
    expect(cells[2]?.[2]).toBe("in range");
  });

  test("a row of cases gives one column a case, whichever way the words lie", () => {
    const cells = film("FREE.PLATE", ["air", row(40, 60, 80), 20, 0.3], column("h", "Ra"));
    expect(cells).toHaveLength(2);
    expect(cells[0]?.[2]).toBe(h);
  });

  test("a column against a row gives the grid, with one word", () => {
    const cells = film("FREE.PLATE", ["air", column(60, 80), 20, row(0.2, 0.3, 0.4)]);
    expect(cells.map((line) => line.length)).toEqual([3, 3]);
    expect(cells[1]?.[1]).toBe(h);
    expect(sentence(one("FREE.PLATE", ["air", column(60, 80), 20, row(0.2, 0.3)], row("h", "Ra")))).toMatch(
      /^#VALUE! give: .*grid of 2 × 2/,
    );
  });

  test("shapes that do not fit are an error that states both", () => {
    expect(sentence(one("FREE.PLATE", ["air", column(60, 80), column(20, 20, 20), 0.3]))).toMatch(
      /^#VALUE! bulk: has 3 rows, but surface has 2/,
    );
  });

  test("names of fluids broadcast, and an own table does not", () => {
    const cells = film("FREE.PLATE", [column("air", "water"), 40, 20, 0.3]);
    expect(numberOf(cells[1]?.[0] as number)).toBeGreaterThan(10 * numberOf(cells[0]?.[0] as number));
    const own = [
      ["temperature", "density", "cp", "conductivity", "viscosity", "expansivity"],
      [50, 1.1, 1007, 0.028, 1.95e-5, 0.0031],
    ];
    expect(film("FREE.PLATE", [own, column(60, 80), 20, 0.3])).toHaveLength(2);
  });

  test("a settings table gives every case its own row", () => {
    const cells = film("FREE.PLATE", ["air", column(80, 80), 20, 0.3], "h", [["pressure"], ["1 atm"], ["3 atm"]]);
    expect(numberOf(cells[0]?.[0] as number)).toBeCloseTo(h, 9);
    expect(numberOf(cells[1]?.[0] as number)).toBeGreaterThan(1.5 * h);
  });
});

describe("blanks and errors in cells", () => {
  test.each([[0], [""], [null]])("a case whose broadcast cells are all %j is a blank row", (blank) => {
    const cells = film("FREE.PLATE", ["air", column(80, blank), 20, column(0.3, blank)], row("h", "verdict"));
    expect(cells[0]?.[0]).toBe(h);
    expect(cells[1]).toEqual(["", ""]);
  });

  test.each([[0], [""], [null]])("a length of %j is a blank row", (blank) => {
    expect(film("FREE.PLATE", ["air", column(80, 80), 20, column(0.3, blank)])[1]).toEqual([""]);
  });

  test("0 beside full cells is 0 °C, and cautions says so", () => {
    const [[hot, cautions] = []] = film("FREE.PLATE", ["air", 0, 20, 0.3], row("Ts", "cautions"));
    expect(hot).toBeCloseTo(0, 9);
    expect(cautions).toMatch(/surface: A temperature of 0 °C was taken/);
  });

  test("an error cell passes through in its own row only", () => {
    const cells = film("FREE.PLATE", ["air", column(80, { code: "#DIV/0!" }, 80), 20, 0.3], row("h", "verdict"));
    expect(cells[0]?.[0]).toBe(h);
    expect((cells[1]?.[0] as CellError).code).toBe("#DIV/0!");
    expect(cells[2]?.[0]).toBe(h);
  });
});

describe("refusals are sentences", () => {
  test.each<[unknown[], unknown, unknown, RegExp]>([
    [["air", 80, 20, "0.3 m/s"], null, null, /^#VALUE! height: "0.3 m\/s" is a speed; a length is needed/],
    [["air", 80, 20, -1], null, null, /^#VALUE! height: -1 is not above zero/],
    [["argonn", 80, 20, 0.3], null, null, /^#VALUE! fluid: .*argonn/],
    [["air", 80, 20, 0.3], "hh", null, /^#VALUE! give: "hh" is not a word known here/],
    [["air", 80, 20, 0.3], "h [m]", null, /^#VALUE! give: m is a unit of length; a unit of film coefficient is needed/],
    [["air", 80, 20, 0.3], null, "presure=2 bar", /^#VALUE! settings: "presure" is not a setting here; known are pressure/],
    [["air", 80, 20, 0.3], null, "equation=Nobody", /^#VALUE! equation: "Nobody" names no equation that serves here/],
    [["air", 80, 20, 0.3], "h conservative", null, /^#VALUE! concern: .*"too hot" or "too cold"/],
    [["air", 80, 20, 0.3], "h total", null, /^#VALUE! settings: radiation needs both/],
    [["air", 80, 20, 0.3], "heat rate", null, /^#VALUE! area: /],
    [["water", 180, 60, 0.3], null, null, /^#N\/A surface: 180 °C is above the saturation temperature of water .*FILM\.BOIL/],
    [["air", 80, 20, 60], null, null, /^#N\/A Ra .* is above .*beyond range=flag/],
  ])("%j %j %j", (values, give, settings, wanted) => {
    expect(sentence(one("FREE.PLATE", values, give, settings))).toMatch(wanted);
  });

  test("all bad arguments are reported together", () => {
    expect(sentence(one("FREE.PLATE", ["air", "x", 20, "0.3 m/s"]))).toMatch(/surface: .*height: /);
  });

  test("text words stay text when the arguments are wrong", () => {
    const [cells = []] = film("FREE.PLATE", ["air", 80, 20, -1], row("h", "verdict", "cautions", "equation", "source", "regime"));
    expect(cells[0]).toBeInstanceOf(CellError);
    for (const cell of cells.slice(1)) expect(typeof cell).toBe("string");
    expect(cells[1]).toMatch(/height: -1 is not above zero/);
  });

  test("out of range, groups and given temperatures stay numbers; flagged, the numbers come marked and with wider bounds", () => {
    const [refused = []] = film("FREE.PLATE", ["air", 80, 20, 60], row("h", "Ra", "Ts", "verdict"));
    expect(refused[0]).toBeInstanceOf(CellError);
    expect(refused[1]).toBeGreaterThan(1e12);
    expect(refused[2]).toBeCloseTo(80, 9);
    const [flagged = []] = film("FREE.PLATE", ["air", 80, 20, 60], row("h", "h low", "h high", "verdict"), "beyond range=flag");
    expect(flagged[3]).toBe(refused[3]);
    expect(flagged[3]).toMatch(/^Ra .* is above 1e12 \(Raithby & Hollands 1998\)/);
    const width = ((flagged[2] as number) - (flagged[1] as number)) / (2 * (flagged[0] as number));
    expect(width).toBeGreaterThan(0.11);
  });
});

describe("what h means", () => {
  test("q is h times surface minus reference, negative when the surface is the colder", () => {
    for (const [hot, cold] of [
      [80, 20],
      [5, 40],
    ] as const) {
      const [[value, q, reference] = []] = film(
        "FREE.PLATE",
        ["air", hot, cold, 0.3],
        row("h", "q", "reference temperature"),
      ) as number[][];
      expect((q as number) / ((value as number) * (hot - (reference as number)))).toBeCloseTo(1, 12);
    }
  });

  test("at zero difference the limit is the answer, and says so", () => {
    const [[value, verdict] = []] = film("FREE.CYLINDER", ["air", 20, 20, 0.05], row("Nu", "verdict"));
    expect(value).toBeCloseTo(0.36, 12); // 0.60², the limit of Churchill & Chu 1975 as Ra goes to zero
    expect(verdict).toBe("no driving difference");
  });

  test("a flux finds the temperature that carries it", () => {
    for (const id of ["FREE.PLATE", "FREE.CYLINDER"]) {
      const [[Ts, q, value, Tref] = []] = film(
        id,
        ["air", "500 W/m2", 20, 0.3],
        row("Ts", "q", "h", "reference temperature"),
      ) as number[][];
      expect(q).toBeCloseTo(500, 5);
      expect((value as number) * ((Ts as number) - (Tref as number))).toBeCloseTo(500, 5);
    }
    expect(numberOf(one("FREE.PLATE", ["air", "-200 W/m2", 20, 0.3], "Ts"))).toBeLessThan(20);
  });

  test("a flux with radiation splits between both", () => {
    const [cells = []] = film(
      "FREE.PLATE",
      ["air", "500 W/m2", 20, 0.3],
      row("q", "q radiant", "q total", "Ts"),
      "emissivity=0.9; surroundings=20",
    ) as number[][];
    expect(cells[2]).toBeCloseTo(500, 5);
    expect((cells[0] as number) + (cells[1] as number)).toBeCloseTo(500, 5);
    expect(cells[3]).toBeLessThan(numberOf(one("FREE.PLATE", ["air", "500 W/m2", 20, 0.3], "Ts")));
  });

  test("h total with surroundings apart from the bulk goes with the equivalent reference", () => {
    const [cells = []] = film(
      "FREE.PLATE",
      ["air", 80, 20, 0.3],
      row("h total", "q total", "reference temperature"),
      "emissivity=0.9; surroundings=5",
    ) as number[][];
    expect((cells[0] as number) * (80 - (cells[2] as number))).toBeCloseTo(cells[1] as number, 8);
  });

  test("a tolerance widens the bounds and leaves the value", () => {
    const [exact = []] = film("FREE.PLATE", plate, row("h", "h low", "h high")) as number[][];
    const [loose = []] = film("FREE.PLATE", ["air", "80 ± 20 °C", 20, "0.3 m ± 10 %"], row("h", "h low", "h high")) as number[][];
    expect(loose[0]).toBe(exact[0]);
    expect(loose[1]).toBeLessThan(exact[1] as number);
    expect(loose[2]).toBeGreaterThan(exact[2] as number);
    const [worst = []] = film(
      "FREE.PLATE",
      ["air", "80 ± 20 °C", 20, "0.3 m ± 10 %"],
      row("h low", "h high"),
      "bounds=worst",
    ) as number[][];
    expect(worst[0]).toBeLessThan(loose[1] as number);
    expect(worst[1]).toBeGreaterThan(loose[2] as number);
  });

  test("water near 4 °C: the direction follows the densities, the bounds widen and a caution tells", () => {
    // Water is densest at 4 °C (3.98 °C, common knowledge of the trade): a wall at 1 °C in a bulk at 6 °C has lighter water at it.
    const [cells = []] = film("FREE.PLATE", ["water", 1, 6, 0.2], row("h", "h low", "h high", "cautions")) as (number | string)[][];
    const [warm = []] = film("FREE.PLATE", ["water", 25, 20, 0.2], row("h", "h low", "h high", "cautions")) as (number | string)[][];
    const width = (list: readonly (number | string)[]): number => ((list[2] as number) - (list[1] as number)) / (list[0] as number);
    expect(cells[3]).toMatch(/density of water has an extreme between surface and bulk/);
    expect(warm[3]).not.toMatch(/extreme/);
    expect(width(cells)).toBeGreaterThan(2 * width(warm));
    // On an upper face the colder but lighter water leaves the face as if it were hot.
    expect(one("FREE.TOPFACE", ["water", 1, 6, 0.3, 0.3], "regime")).toMatch(/plumes leave/);
    expect(one("FREE.TOPFACE", ["water", 20, 25, 0.3, 0.3], "regime")).toMatch(/held against/);
  });

  test("conservative bounds follow the concern", () => {
    const [heated = []] = film("FREE.PLATE", ["air", 20, 80, 0.3], row("h conservative", "h high", "h low"), "concern=too hot");
    expect(heated[0]).toBe(heated[1]);
    const [cooled = []] = film("FREE.PLATE", ["air", 80, 20, 0.3], row("h conservative", "h high", "h low"), "concern=too hot");
    expect(cooled[0]).toBe(cooled[2]);
  });
});

describe("blocks", () => {
  test("trace, compare and all spill rectangles with heads", () => {
    for (const word of ["trace", "compare", "all"]) {
      const cells = film("FREE.PLATE", plate, word);
      expect(cells.length).toBeGreaterThan(3);
      for (const line of cells) expect(line).toHaveLength(cells[0]?.length as number);
    }
    expect(sentence(one("FREE.PLATE", ["air", column(60, 80), 20, 0.3], "trace"))).toMatch(/takes one case, but the cases are 2 × 1/);
  });

  test("compare holds the equation taken, with the same h", () => {
    const taken = film("FREE.PLATE", plate, "compare")
      .slice(1)
      .find((line) => line[5] === "taken");
    expect(taken?.[1]).toBe(h);
  });
});
