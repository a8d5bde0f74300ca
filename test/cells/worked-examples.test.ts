// Worked examples of published textbooks, run through the cell functions with a property table of one row that holds
// the example's own property values. Each row names its book; fails where an equation, a group or a unit is wrong.
import { expect, test } from "vitest";
import { answer } from "../../src/cells/answer.js";

interface Properties {
  readonly k: number;
  readonly nu?: number;
  readonly mu?: number;
  readonly rho?: number;
  readonly cp?: number;
  readonly Pr?: number;
  readonly alpha?: number;
  readonly beta?: number;
}

const heads: Readonly<Record<keyof Properties, string>> = {
  k: "conductivity [W/(m·K)]",
  nu: "kinematic viscosity [m²/s]",
  mu: "viscosity [Pa·s]",
  rho: "density [kg/m³]",
  cp: "cp [J/(kg·K)]",
  Pr: "Pr",
  alpha: "diffusivity [m²/s]",
  beta: "expansivity [1/K]",
};

function table(properties: Properties): unknown[][] {
  const keys = Object.keys(properties) as (keyof Properties)[];
  return [
    ["temperature [°C]", ...keys.map((key) => heads[key])],
    ["", ...keys.map((key) => properties[key])],
  ];
}

interface Example {
  readonly id: string;
  readonly source: string;
  readonly call: string;
  readonly fluid: Properties;
  readonly args: Readonly<Record<string, unknown>>;
  readonly give: string;
  readonly settings?: string;
  /** What the book prints follows from the word by this factor, such as an area. */
  readonly times?: number;
  readonly expected: number;
  readonly within: number;
  readonly origin: "published" | "from memory";
}

const incropera = "Incropera, DeWitt, Bergman & Lavine, Fundamentals of Heat and Mass Transfer, 6th ed.";
const holman = "Holman, Heat Transfer (SI)";
const cengel = "Cengel, Heat and Mass Transfer: A Practical Approach";
const lienhard = "Lienhard & Lienhard, A Heat Transfer Textbook";
const kreith = "Kreith, Manglik & Bohn, Principles of Heat Transfer, 7th ed.";
const sukhatme = "Sukhatme, A Textbook on Heat Transfer";
const geankoplis = "Geankoplis, Transport Processes and Unit Operations";

const f01: Properties = { k: 0.0338, nu: 26.4e-6, alpha: 38.3e-6, beta: 0.0025, rho: 1 };
const f01Args = { surface: 232, bulk: 23, height: 0.71 };
const f08: Properties = { k: 0.0313, nu: 22.8e-6, alpha: 32.8e-6, beta: 0.002725, rho: 1 };
const f18: Properties = { k: 0.02808, nu: 1.896e-5, Pr: 0.7202, beta: 1 / 333, rho: 1 };
const f23: Properties = { k: 0.0263, nu: 2.062e-5, alpha: 2.92e-5, beta: 1 / 300, rho: 1 };
const f24: Properties = { k: 0.032, nu: 2.7e-5, Pr: 0.71, beta: 1 / 400, rho: 1 };
const e03: Properties = { k: 0.0338, nu: 26.41e-6, Pr: 0.69, rho: 1 };
const e24: Properties = { k: 0.02808, nu: 1.896e-5, Pr: 0.7202, rho: 1 };
const water30: Properties = { k: 0.5927, nu: 1.085e-6, Pr: 7.66, rho: 998.8 };
const any = "beyond range=flag; ";
const n17: Properties = { k: 15.6, mu: 1.34e-3, Pr: 0.013, rho: 1e4 };

const examples: readonly Example[] = [
  {
    id: "F01",
    source: `${incropera}, ex. 9.2`,
    call: "FREE.PLATE",
    fluid: f01,
    args: f01Args,
    give: "Ra",
    settings: "gravity=9.81",
    expected: 1.8144e9,
    within: 0.005,
    origin: "published",
  },
  {
    id: "F02",
    source: `${incropera}, ex. 9.2`,
    call: "FREE.PLATE",
    fluid: f01,
    args: f01Args,
    give: "Nu",
    settings: "equation=Churchill & Chu; gravity=9.81",
    expected: 147.15,
    within: 0.005,
    origin: "from memory",
  },
  {
    id: "F03",
    source: `${incropera}, ex. 9.2`,
    call: "FREE.PLATE",
    fluid: f01,
    args: f01Args,
    give: "heat rate",
    settings: "equation=Churchill & Chu; area=0.7242 m2; gravity=9.81",
    expected: 1060.3,
    within: 0.01,
    origin: "published",
  },
  {
    id: "F08",
    source: `${incropera}, ex. 9.4`,
    call: "FREE.CYLINDER",
    fluid: f08,
    args: { surface: 165, bulk: 23, diameter: 0.1 },
    give: "h",
    settings: "equation=Churchill & Chu all Ra",
    expected: 7.2287,
    within: 0.005,
    origin: "published",
  },
  {
    id: "F09",
    source: `${incropera}, ex. 9.4`,
    call: "FREE.CYLINDER",
    fluid: f08,
    args: { surface: 165, bulk: 23, diameter: 0.1 },
    give: "q total",
    settings: "equation=Churchill & Chu all Ra; emissivity=0.85; surroundings=23",
    times: Math.PI * 0.1,
    expected: 763.49,
    within: 0.007,
    origin: "published",
  },
  {
    id: "F12",
    source: `${holman}, ex. 7.2`,
    call: "FREE.PLATE",
    fluid: { k: 0.02685, nu: 16.5e-6, Pr: 0.7, beta: 1 / 308, rho: 1 },
    args: { surface: 60, bulk: 10, height: 4 },
    give: "q",
    settings: "equation=Churchill & Chu; gravity=9.8",
    times: 40,
    expected: 9603,
    within: 0.006,
    origin: "published",
  },
  {
    id: "F14",
    source: `${holman}, ex. 7.3`,
    call: "FREE.CYLINDER",
    fluid: { k: 0.63, alpha: Math.sqrt((9.80665 * 1e-3) / (2.48e10 * 5)), Pr: 5, beta: 1e-3, rho: 1 },
    args: { surface: 31, bulk: 20, diameter: 0.02 },
    give: "q",
    settings: "equation=McAdams",
    times: Math.PI * 0.02,
    expected: 443.5,
    within: 0.01,
    origin: "published",
  },
  {
    id: "F16",
    source: `${holman}, ex. 7.5`,
    call: "FREE.CYLINDER",
    fluid: { k: 0.03406, nu: 26.54e-6, Pr: 0.687, beta: 1 / 405.5, rho: 1 },
    args: { surface: 250, bulk: 15, diameter: 0.3048 },
    give: "q",
    settings: "equation=McAdams",
    times: Math.PI * 0.3048,
    expected: 1491.5,
    within: 0.01,
    origin: "published",
  },
  {
    id: "F18",
    source: `${cengel}, ex. 9.2`,
    call: "FREE.PLATE",
    fluid: f18,
    args: { surface: 90, bulk: 30, height: 0.6 },
    give: "Nu",
    settings: "equation=Churchill & Chu; gravity=9.81",
    expected: 113.34,
    within: 0.001,
    origin: "published",
  },
  {
    id: "F19",
    source: `${cengel}, ex. 9.2`,
    call: "FREE.PLATE",
    fluid: f18,
    args: { surface: 90, bulk: 30, height: 0.6 },
    give: "q",
    settings: "equation=Churchill & Chu; gravity=9.81",
    times: 0.36,
    expected: 114.58,
    within: 0.003,
    origin: "published",
  },
  {
    id: "F21",
    source: `${cengel}, ex. 9.2c`,
    call: "FREE.UNDERSIDE",
    fluid: f18,
    args: { surface: 90, bulk: 30, length: 0.6, width: 0.6 },
    give: "q",
    settings: "equation=McAdams",
    times: 0.36,
    expected: 64.192,
    within: 0.01,
    origin: "from memory",
  },
  {
    id: "F23a",
    source: `${lienhard}, ex. 8.4`,
    call: "FREE.CYLINDER",
    fluid: f23,
    args: { surface: "400 K", bulk: "300 K", diameter: "5 mm" },
    give: "Nu",
    settings: `${any}equation=Churchill & Chu all Ra; gravity=9.8e-6`,
    expected: 0.48329,
    within: 0.01,
    origin: "published",
  },
  {
    id: "F23c",
    source: `${lienhard}, ex. 8.4`,
    call: "FREE.CYLINDER",
    fluid: f23,
    args: { surface: "400 K", bulk: "300 K", diameter: "5 mm" },
    give: "Nu",
    settings: `${any}equation=Churchill & Chu all Ra; gravity=9.8e-4`,
    expected: 0.64815,
    within: 0.01,
    origin: "published",
  },
  {
    id: "F24",
    source: `${kreith}, ex. 5.3`,
    call: "FREE.TOPFACE",
    fluid: f24,
    args: { surface: 227, bulk: 27, length: 1, width: 1 },
    give: "Nu",
    settings: "equation=Lloyd & Moran turbulent",
    expected: 63.157,
    within: 0.02,
    origin: "published",
  },
  {
    id: "F25",
    source: `${kreith}, ex. 5.3`,
    call: "FREE.UNDERSIDE",
    fluid: f24,
    args: { surface: 227, bulk: 27, length: 1, width: 1 },
    give: "Nu",
    settings: "equation=McAdams",
    expected: 25.096,
    within: 0.02,
    origin: "published",
  },
  {
    id: "F32",
    source: `${sukhatme}, ex. 6.4`,
    call: "FREE.CYLINDER",
    fluid: { k: 0.0763, nu: 155.1e-6, Pr: 0.717, beta: 1 / 1173, rho: 1 },
    args: { surface: 1000, bulk: 800, diameter: "6 mm" },
    give: "q",
    settings: "equation=Churchill & Chu laminar; gravity=9.81",
    expected: 2722.9,
    within: 0.001,
    origin: "published",
  },
  {
    id: "E03",
    source: `${incropera}, ex. 7.2`,
    call: "FORCED.PLATE",
    fluid: e03,
    args: { surface: 230, bulk: 25, speed: 60, length: 0.05 },
    give: "q",
    settings: "equation=Pohlhausen",
    times: 0.05,
    expected: 1370.2,
    within: 0.003,
    origin: "published",
  },
  {
    id: "E07",
    source: `${incropera}, ex. 7.4`,
    call: "FORCED.CYLINDER",
    fluid: { k: 0.03, nu: 20.92e-6, Pr: 0.7, rho: 1 },
    args: { surface: 128.4, bulk: 26.2, speed: 10, diameter: "12.7 mm" },
    give: "Nu",
    expected: 40.636,
    within: 0.005,
    origin: "from memory",
  },
  {
    id: "E13a",
    source: `${holman}, ex. 5.5 (first pass, properties of the free stream)`,
    call: "FORCED.PLATE",
    fluid: { k: 0.02624, nu: 15.69e-6, Pr: 0.7, rho: 1 },
    args: { surface: `${1000 / 0.36} W/m2`, bulk: "0 °C", speed: 5, length: 0.6 },
    give: "Ts",
    expected: 240.76,
    within: 0.003,
    origin: "published",
  },
  {
    id: "E15",
    source: `${holman}, ex. 5.7`,
    call: "FORCED.PLATE",
    fluid: { k: 0.144, nu: 2.4e-4, Pr: 2870, rho: 876 },
    args: { surface: 60, bulk: 20, speed: 1.2, length: 0.2 },
    give: "h",
    settings: "equation=Churchill & Ozoe",
    expected: 219.15,
    within: 0.001,
    origin: "published",
  },
  {
    id: "E17",
    source: `${holman}, ex. 6.7`,
    call: "FORCED.CYLINDER",
    fluid: { k: 0.0312, mu: 2.14e-5, rho: 0.966, Pr: 0.695 },
    args: { surface: 150, bulk: 35, speed: 50, diameter: 0.05 },
    give: "q",
    settings: `${any}equation=Hilpert revised`,
    times: Math.PI * 0.05,
    expected: 3100.7,
    within: 0.03,
    origin: "published",
  },
  {
    id: "E22",
    source: `${cengel}, ex. 7.2a`,
    call: "FORCED.PLATE",
    fluid: { k: 0.02953, nu: 2.097e-5 / 0.823, Pr: 0.7154, rho: 1 },
    args: { surface: 140, bulk: 20, speed: 8, length: 6 },
    give: "Nu",
    settings: "equation=Colburn laminar then turbulent at 5e5",
    expected: 2686.4,
    within: 0.005,
    origin: "from memory",
  },
  {
    id: "E24",
    source: `${cengel}, ex. 7.5`,
    call: "FORCED.CYLINDER",
    fluid: e24,
    args: { surface: 110, bulk: 10, speed: 8, diameter: 0.1 },
    give: "Nu",
    expected: 124.45,
    within: 0.003,
    origin: "published",
  },
  {
    id: "E25",
    source: `${cengel}, ex. 7.5`,
    call: "FORCED.CYLINDER",
    fluid: e24,
    args: { surface: 110, bulk: 10, speed: 8, diameter: 0.1 },
    give: "q",
    times: Math.PI * 0.1,
    expected: 1097.9,
    within: 0.006,
    origin: "published",
  },
  {
    id: "E31",
    source: `${lienhard}, ex. 6.9`,
    call: "FORCED.PLATE",
    fluid: water30,
    args: { surface: 40, bulk: 20, speed: 2.572, length: 2 },
    give: "h",
    settings: "equation=Zhukauskas & Ambrazyavichyus; position=1",
    expected: 5729,
    within: 0.001,
    origin: "published",
  },
  {
    id: "E32",
    source: `${lienhard}, ex. 6.9`,
    call: "FORCED.PLATE",
    fluid: water30,
    args: { surface: 40, bulk: 20, speed: 2.572, length: 2 },
    give: "h",
    settings: "equation=White earlier editions; position=1",
    expected: 6843.2,
    within: 0.001,
    origin: "published",
  },
  {
    id: "E37",
    source: `${sukhatme}, ex. 5.6`,
    call: "FORCED.CYLINDER",
    fluid: { k: 0.029, nu: 18.97e-6, Pr: 0.696, rho: 1 },
    args: { surface: 100, bulk: 20, speed: 1.2, diameter: 0.075 },
    give: "q",
    times: 3.14 * 0.075 /* as the book takes it */,
    expected: 258.88,
    within: 0.0005,
    origin: "published",
  },
  {
    id: "N09",
    source: `${incropera}, ex. 8.6`,
    call: "DUCT.TUBE",
    fluid: { k: 0.03, mu: 20.82e-6, Pr: 0.7, rho: 1 },
    args: { wall: 20, bulk: 77, flow: "0.05 kg/s", diameter: 0.15 },
    give: "h",
    settings: "equation=Dittus-Boelter",
    expected: 11.581,
    within: 0.01,
    origin: "published",
  },
  {
    id: "N14",
    source: `${holman}, ex. 6.1`,
    call: "DUCT.TUBE",
    fluid: { k: 0.0386, mu: 2.57e-5, Pr: 0.681, rho: 1.493 },
    args: { wall: 220, bulk: 200, flow: 10, diameter: "25.4 mm" },
    give: "h",
    settings: `${any}equation=Dittus-Boelter`,
    expected: 64.827,
    within: 0.003,
    origin: "published",
  },
  {
    id: "N15",
    source: `${holman}, ex. 6.1`,
    call: "DUCT.TUBE",
    fluid: { k: 0.0386, mu: 2.57e-5, Pr: 0.681, rho: 1.493 },
    args: { wall: 220, bulk: 200, flow: 10, diameter: "25.4 mm" },
    give: "q",
    settings: `${any}equation=Dittus-Boelter`,
    times: Math.PI * 0.0254,
    expected: 103.46,
    within: 0.002,
    origin: "published",
  },
  {
    id: "N17",
    source: `${holman}, ex. 6.12`,
    call: "DUCT.TUBE",
    fluid: n17,
    args: { wall: "1000 W/m2", bulk: 427, flow: "4.5 kg/s", diameter: 0.05 },
    give: "h",
    settings: "equation=Skupinski",
    expected: 3410.9,
    within: 0.004,
    origin: "published",
  },
  {
    id: "N24",
    source: `${kreith}, ex. 6.5`,
    call: "DUCT.TUBE",
    fluid: { k: 1, mu: 1 / 82237, Pr: 4.64, rho: 1 },
    args: { wall: 30, bulk: 40, flow: 1, diameter: 1 },
    give: "Nu",
    settings: "equation=Sleicher & Rouse",
    expected: 410.12,
    within: 0.005,
    origin: "published",
  },
  {
    id: "N26",
    source: `${geankoplis}, ex. 4.5-3`,
    call: "DUCT.TUBE",
    fluid: { k: 13, mu: 7.1e-4, cp: 120, rho: 1e4 },
    args: { wall: "1000 W/m2", bulk: 450, flow: "4 kg/s", diameter: 0.05 },
    give: "h",
    settings: `${any}equation=Lubarsky & Kaufman`,
    expected: 2512.7,
    within: 0.0005,
    origin: "published",
  },
  {
    id: "N29",
    source: `${sukhatme}, ex. 5.4`,
    call: "DUCT.TUBE",
    fluid: { k: 68.34, nu: 0.2937e-6, Pr: 0.00468, rho: 846.7 },
    args: { wall: "1000 W/m2", bulk: 400, flow: "5 kg/s", diameter: 0.05 },
    give: "Nu",
    settings: "equation=Sleicher uniform flux",
    expected: 14.408,
    within: 0.003,
    origin: "published",
  },
];

test.each(examples)("$id $call $give ($source; $origin)", (example) => {
  const args: Record<string, unknown[][]> = { fluid: table(example.fluid) };
  for (const [key, value] of Object.entries(example.args)) args[key] = [[value]];
  const settings = example.settings === undefined ? null : [[example.settings]];
  const [[cell] = []] = answer(example.call, args, [[example.give]], settings);
  expect(typeof cell === "object" ? (cell as { message: string }).message : typeof cell).toBe("number");
  const got = (cell as number) * (example.times ?? 1);
  expect(Math.abs(got / example.expected - 1), `${got} against ${example.expected}`).toBeLessThanOrEqual(example.within);
});

// Incropera et al., ex. 7.2: six heaters of 50 mm along a plate; a heater's share is the difference of two mean values.
test.each([
  ["E04 heater 5", 0.25, 0.2, "Colburn laminar then turbulent at 5e5", "Pohlhausen", 1017.5, 0.03],
  ["E05 heater 6", 0.3, 0.25, "Colburn laminar then turbulent at 5e5", "Colburn laminar then turbulent at 5e5", 1427.6, 0.01],
] as const)("%s as the difference of two plates", (_, to, from, equationTo, equationFrom, expected, within) => {
  const heat = (length: number, equation: string): number => {
    const args = { fluid: table(e03), surface: [[230]], bulk: [[25]], speed: [[60]], length: [[length]] };
    const [[q] = []] = answer("FORCED.PLATE", args, [["q"]], [[`beyond range=flag; equation=${equation}`]]);
    return (q as number) * length;
  };
  expect(Math.abs((heat(to, equationTo) - heat(from, equationFrom)) / expected - 1)).toBeLessThanOrEqual(within);
});
