/** Records held against solutions of the governing equations, within the scatter that the records themselves state. */
import { describe, expect, test } from "vitest";
import { correlationById } from "../../src/correlations/index.js";
import { compiled, type Inputs, inRange, readData } from "./evaluation.js";

interface Exact {
  readonly family: string;
  readonly quantity: string;
  readonly condition: string;
  readonly value: number;
  readonly uncertainty: string;
  readonly method: string;
  readonly compare: string;
}

const exact = readData<readonly Exact[]>("exact-solutions.json");

/** Numbers of a condition such as "Pr=0.7 x*=0.05". */
function numbersOf(condition: string): Readonly<Record<string, number>> {
  return Object.fromEntries([...condition.matchAll(/(\S+?)=([-\d.e+]+)/g)].map(([, name, value]) => [name as string, Number(value)]));
}

/** A record, the exact rows it should meet, its inputs there, and its expected value. */
interface Pairing {
  readonly ids: readonly string[];
  readonly family: string;
  readonly quantity: string;
  readonly inputs: (given: Readonly<Record<string, number>>) => Inputs;
  readonly expected: (value: number, given: Readonly<Record<string, number>>) => number;
  readonly of?: string;
}

const Re = 1e5;
const Ra = 1e8;
const RaStar = 1e9;
const same = (value: number): number => value;
const atX = (given: Readonly<Record<string, number>>): Inputs => ({ xs: given["x*"] as number });
const tube = (given: Readonly<Record<string, number>>): Inputs => ({ Re: 100, Pr: 5, D_L: 1 / (500 * (given["x*"] as number)) });
const entry = (given: Readonly<Record<string, number>>): Inputs => {
  const Pr = given["Pr"] as number;
  return { xs: given["x*"] as number, Pr, Re: 1000, D_L: 1 / (1000 * Pr * (given["x*"] as number)) };
};
const side = (given: Readonly<Record<string, number>>): Inputs => ({
  a: given["short/long"] ?? given["r*"] ?? Number.NaN,
  ba: given["b/a"] ?? Number.NaN,
  apex: given["apex"] ?? Number.NaN,
  Re: 1000,
});
const duct = "fully developed laminar duct:";

const pairings: readonly Pairing[] = [
  {
    ids: ["pohlhausen-1921-local", "churchill-ozoe-1973-local"],
    family: "flat plate isothermal",
    quantity: "Nu_x/Re_x^0.5",
    inputs: ({ Pr }) => ({ Re, Pr: Pr as number }),
    expected: (v) => v * Re ** 0.5,
  },
  {
    ids: ["pohlhausen-1921-mean", "churchill-ozoe-1973-mean"],
    family: "flat plate isothermal",
    quantity: "Nu_x/Re_x^0.5",
    inputs: ({ Pr }) => ({ Re, Pr: Pr as number }),
    expected: (v) => 2 * v * Re ** 0.5,
  },
  {
    ids: ["churchill-ozoe-1973-flux-local", "kays-flux-local-0453"],
    family: "flat plate isoflux",
    quantity: "Nu_x/Re_x^0.5",
    inputs: ({ Pr }) => ({ Re, Pr: Pr as number }),
    expected: (v) => v * Re ** 0.5,
  },
  {
    ids: ["churchill-ozoe-1973-flux-mean"],
    family: "flat plate isoflux",
    quantity: "Nu_x/Re_x^0.5",
    inputs: ({ Pr }) => ({ Re, Pr: Pr as number }),
    expected: (v) => 1.5 * v * Re ** 0.5,
  },
  {
    ids: [
      "churchill-usagi-1972-plate-laminar",
      "lefevre-1956-plate-laminar",
      "ede-1967-plate-laminar",
      "churchill-chu-1975-plate-laminar",
      "raithby-hollands-1998-plate",
      "mcadams-1954-plate-laminar",
    ],
    family: "vertical plate free isothermal",
    quantity: "Nu_avg/Ra_L^0.25",
    inputs: ({ Pr }) => ({ Ra, Pr: Pr as number }),
    expected: (v) => v * Ra ** 0.25,
  },
  {
    ids: [
      "churchill-ozoe-1973-plate-free-flux-local",
      "fujii-fujii-1976-plate-flux-local",
      "vliet-liu-1969-plate-flux-laminar",
      "vliet-ross-1975-plate-flux-laminar",
    ],
    family: "vertical plate free isoflux (n=1/5)",
    quantity: "Nu_x/(Ra*_x)^0.2",
    inputs: ({ Pr }) => ({ RaStar, Pr: Pr as number }),
    expected: (v) => v * RaStar ** 0.2,
  },
  // The difference grows as x^(1/5): q over its mean is 6/5 of the value at the end.
  {
    ids: ["fujii-fujii-1976-plate-flux-mean", "raithby-hollands-1998-plate-flux"],
    family: "vertical plate free isoflux (n=1/5)",
    quantity: "Nu_x/(Ra*_x)^0.2",
    inputs: ({ Pr }) => ({ RaStar, Pr: Pr as number }),
    expected: (v) => 1.2 * v * RaStar ** 0.2,
  },
  {
    ids: ["shah-1975-tube-T-mean", "hausen-1943-tube-T-mean", "gnielinski-tube-T-mean-thermal"],
    family: "Graetz circular tube uniform T",
    quantity: "Nu_mean,Dh",
    inputs: atX,
    expected: same,
  },
  {
    ids: ["baehr-stephan-tube-T-mean"],
    of: "Nuth",
    family: "Graetz circular tube uniform T",
    quantity: "Nu_mean,Dh",
    inputs: (given) => ({ ...atX(given), Pr: 1 }),
    expected: same,
  },
  { ids: ["tube-default-T-mean"], family: "Graetz circular tube uniform T", quantity: "Nu_mean,Dh", inputs: tube, expected: same },
  {
    ids: ["shah-1975-tube-T-local", "gnielinski-tube-T-local"],
    family: "Graetz circular tube uniform T",
    quantity: "Nu_x,Dh",
    inputs: atX,
    expected: same,
  },
  { ids: ["tube-default-T-local"], family: "Graetz circular tube uniform T", quantity: "Nu_x,Dh", inputs: tube, expected: same },
  {
    ids: ["shah-1975-tube-H-local", "gnielinski-tube-H-local"],
    family: "Graetz circular tube uniform flux",
    quantity: "Nu_x,Dh",
    inputs: atX,
    expected: same,
  },
  {
    ids: ["churchill-ozoe-1973-tube-H-local"],
    family: "Graetz circular tube uniform flux",
    quantity: "Nu_x,Dh",
    inputs: (given) => ({ ...atX(given), Pr: 1000 }),
    expected: same,
  },
  { ids: ["tube-default-H-local"], family: "Graetz circular tube uniform flux", quantity: "Nu_x,Dh", inputs: tube, expected: same },
  {
    ids: ["leveque-tube-H-mean"],
    family: "Graetz circular tube uniform flux",
    quantity: "Nu_mean,Dh (q over mean dT)",
    inputs: atX,
    expected: same,
  },
  {
    ids: ["tube-default-H-mean"],
    family: "Graetz circular tube uniform flux",
    quantity: "Nu_mean,Dh (q over mean dT)",
    inputs: tube,
    expected: same,
  },
  {
    ids: ["shah-1975-tube-H-mean", "gnielinski-tube-H-mean"],
    family: "Graetz circular tube uniform flux",
    quantity: "Nu_avg (length average of local Nu_x)",
    inputs: atX,
    expected: same,
  },
  {
    ids: ["shah-1975-plates-T-mean"],
    family: "Graetz parallel plates both walls uniform T",
    quantity: "Nu_mean,Dh",
    inputs: atX,
    expected: same,
  },
  {
    ids: ["shah-1975-plates-T-local"],
    family: "Graetz parallel plates both walls uniform T",
    quantity: "Nu_x,Dh",
    inputs: atX,
    expected: same,
  },
  {
    ids: ["shah-1975-plates-H-local"],
    family: "Graetz parallel plates both walls uniform flux",
    quantity: "Nu_x,Dh",
    inputs: atX,
    expected: same,
  },
  {
    ids: ["shah-1975-plates-H-mean"],
    family: "Graetz parallel plates both walls uniform flux",
    quantity: "Nu_avg (length average of local Nu_x)",
    inputs: atX,
    expected: same,
  },
  {
    ids: ["gnielinski-tube-T-mean-simultaneous", "stephan-1959-tube-T-mean", "baehr-stephan-tube-T-mean"],
    family: "combined entry tube (flat velocity & temperature at inlet)",
    quantity: "Nu_m uniform T",
    inputs: entry,
    expected: same,
  },
  {
    ids: ["churchill-ozoe-1973-tube-H-local"],
    family: "combined entry tube (flat velocity & temperature at inlet)",
    quantity: "Nu_x uniform flux",
    inputs: entry,
    expected: same,
  },
  {
    ids: ["shah-london-fapp-tube"],
    family: "hydrodynamic entry tube",
    quantity: "f_app*Re (Fanning)",
    inputs: (given) => ({ xp: given["x+"] as number }),
    expected: same,
  },
  {
    ids: ["stephan-1962-annulus-inner"],
    family: "annulus laminar developed",
    quantity: "Nu_i T-inner/outer insulated",
    inputs: side,
    expected: same,
  },
  {
    ids: ["stephan-1962-annulus-outer"],
    family: "annulus laminar developed",
    quantity: "Nu_o T-outer/inner insulated",
    inputs: side,
    expected: same,
  },
  {
    ids: ["stephan-1962-annulus-both"],
    family: "annulus laminar developed",
    quantity: "Nu both walls same T (overall)",
    inputs: side,
    expected: same,
  },
  {
    ids: ["table-annulus-Nu_ii"],
    family: "annulus laminar developed",
    quantity: "Nu_ii (flux on inner, outer insulated)",
    inputs: side,
    expected: same,
  },
  {
    ids: ["table-annulus-Nu_oo"],
    family: "annulus laminar developed",
    quantity: "Nu_oo (flux on outer, inner insulated)",
    inputs: side,
    expected: same,
  },
  { ids: ["table-annulus-fRe"], family: "annulus laminar developed", quantity: "f*Re (Fanning,Dh)", inputs: side, expected: same },
  ...["rectangle", "isosceles triangle", "ellipse"].flatMap((shape): Pairing[] => {
    const name = shape.replace("isosceles ", "");
    const polynomial = (what: string): string[] => (name === "rectangle" && what !== "Nu_H2" ? [`shah-london-rectangle-${what}`] : []);
    return [
      ...["Nu_T", "Nu_H1", "Nu_H2"].map(
        (what): Pairing => ({
          ids: [`table-${name}-${what}`, ...polynomial(what)],
          family: `${duct} ${shape}`,
          quantity: what,
          inputs: side,
          expected: same,
        }),
      ),
      {
        ids: [`table-${name}-fRe`, ...polynomial("fRe")],
        family: `${duct} ${shape}`,
        quantity: "f*Re (Fanning)",
        inputs: side,
        expected: same,
      },
    ];
  }),
  { ids: ["tube-laminar-developed-H"], family: `${duct} circle`, quantity: "Nu_H1", inputs: () => ({ Re: 1000 }), expected: same },
  {
    ids: ["tube-laminar-friction"],
    family: `${duct} circle`,
    quantity: "f*Re (Fanning)",
    inputs: () => ({ Re: 1000 }),
    expected: (v) => (4 * v) / 1000,
  },
  {
    ids: ["rotating-disc-laminar-exact", "rotating-disc-fit", "cobb-saunders-1956-disc-laminar"],
    family: "rotating disk isothermal",
    quantity: "Nu/(w r^2/nu)^0.5",
    inputs: ({ Pr }) => ({ Rew: 1e4, Pr: Pr as number }),
    expected: (v) => v * 100,
  },
  {
    ids: ["recovery-factor-laminar"],
    family: "flat plate laminar recovery factor",
    quantity: "r",
    inputs: ({ Pr }) => ({ Pr: Pr as number }),
    expected: same,
  },
];

/** Where a record is farther off than its scatter, and why that stands. */
const known: Readonly<Record<string, { readonly within: number; readonly why: string }>> = {
  "raithby-hollands-1998-plate": {
    within: 0.14,
    why: "its thick-layer allowance adds about 1 to Nu, which is much where Nu is 14 (Pr 0.001); the exact solution is of a thin layer",
  },
  "recovery-factor-laminar": { within: 0.08, why: "Pr^(1/2) is 7 % high at Pr 10; the note says so" },
};

describe.each(pairings.flatMap((pairing) => pairing.ids.map((id) => [id, pairing] as const)))("%s", (id, pairing) => {
  const record = correlationById(id);
  const one = compiled(record);
  const rows = exact.filter((row) => row.family === pairing.family && row.quantity === pairing.quantity);
  const inside = rows.filter((row) => inRange(one, pairing.inputs(numbersOf(row.condition))));

  test(`has rows of "${pairing.family}, ${pairing.quantity}" in its range`, () => {
    expect(inside.length).toBeGreaterThan(0);
  });

  test.each(inside.map((row) => [row.condition, row] as const))("%s", (_, row) => {
    const given = numbersOf(row.condition);
    const expected = pairing.expected(row.value, given);
    const got = one.at(pairing.inputs(given), pairing.of);
    const marching = row.uncertainty.includes("1%") ? 0.01 : 0;
    expect(Math.abs(got / expected - 1), `${got} against ${expected}`).toBeLessThanOrEqual(
      (known[id]?.within ?? record.scatter.value) + marching,
    );
  });
});
