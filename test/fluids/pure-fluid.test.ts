import { describe, expect, test } from "vitest";
import type { Fluid, State } from "../../src/fluids/fluid.js";
import { pureFluid } from "../../src/fluids/pure-fluid.js";
import { pureModel } from "../../src/fluids/pure-model.js";
import { pureRecord, pureRecords } from "../../src/fluids/records/pure/index.js";
import { isProblem, type Problem } from "../../src/quantities/problems.js";
import { numberIn, readCsv } from "../data/read-csv.js";

type Row = Readonly<Record<string, string>>;

const fluids = new Map(pureRecords().map((record) => [record.name, pureFluid(record, pureRecord)] as const));

function fluidOf(name: string): Fluid {
  const known = fluids.get(name === "dry air" ? "air" : name);
  if (!known) throw new Error(`no fluid ${name}`);
  return known;
}

function byFluid(file: string): readonly (readonly [string, readonly Row[]])[] {
  const groups = new Map<string, Row[]>();
  for (const row of readCsv(file)) {
    const name = row.fluid as string;
    groups.set(name, [...(groups.get(name) ?? []), row]);
  }
  return [...groups];
}

function sure<T>(found: T | Problem): T {
  if (isProblem(found)) throw new Error(found.sentence);
  return found;
}

/** "viscosity 1.2e-5 for 1.3e-5", or nothing where the value is within the tolerance or the row is blank. */
function miss(what: string, value: number | undefined, row: Row, column: string, tolerance: number): readonly string[] {
  const expected = numberIn(row, column);
  if (expected === undefined) return [];
  const off = value === undefined ? Number.NaN : Math.abs(value / expected - 1);
  return off <= tolerance ? [] : [`${what} ${value} for ${expected}`];
}

/** Same formulation, properties.md: 1e-5 and 1e-4; near-critical rows 1 %. */
const exact = 1e-5;
const transported = 1e-4;
const nearCritical = 1e-2;
/**
 * In a thin, cold gas no state of the reference fluid is quite conformal (the two equations for it have no common root), and what two searches take
 * instead differs; the method itself claims 5 to 10 %.
 */
const predictedGas = 5e-3;

describe("values at temperature and density, from an independent evaluation of each formulation", () => {
  test.each(byFluid("pure-check-states.csv"))("%s", (name, rows) => {
    const record = pureRecord(name === "dry air" ? "air" : name);
    // The evaluation knows no limit of the viscosity; here the equation is looked at, not the range.
    const model = pureModel({ ...record, viscosityT: record.T }, pureRecord);
    const wrong = rows.flatMap((row) => {
      const T = numberIn(row, "T_K") as number;
      const rho = (numberIn(row, "rho_kg_m3") as number) / record.molarMass;
      const p = model.pressure(T, rho);
      const found = model.state(T, p, rho, "gas");
      // A liquid's pressure is a small difference: it is held to what a part in 1e8 of the density would change.
      const stiff = (found?.speedOfSound ?? 0) ** 2 * rho * record.molarMass;
      const pressure = numberIn(row, "p_Pa") as number;
      return [
        ...(Math.abs(p - pressure) < 1e-6 * pressure + 1e-8 * stiff ? [] : [`p ${p} for ${pressure}`]),
        ...miss("cp", found?.cp, row, "cp", exact),
        ...miss("speed of sound", found?.speedOfSound, row, "speed_of_sound", exact),
        ...miss("expansivity", found?.expansivity, row, "expansivity", exact),
        ...miss("viscosity", found?.viscosity, row, "viscosity", transported),
        ...miss("conductivity", found?.conductivity, row, "conductivity", transported),
      ].map((text) => `${T} K, ${row.rho_kg_m3} kg/m³: ${text}`);
    });
    expect(wrong).toEqual([]);
  });
});

describe("random states, from an independent evaluation of the same formulations", () => {
  const table = byFluid("pure-states.csv");

  test.each(table)("%s", (name, rows) => {
    const fluid = fluidOf(name);
    const predicted = pureRecord(name).predictive ?? "";
    const wrong = rows.flatMap((row) => {
      const T = (numberIn(row, "t_C") as number) + 273.15;
      const p = numberIn(row, "p_Pa") as number;
      const found = fluid.state(T, p);
      if (isProblem(found)) return T > fluid.range.T[1] && /above its published range/.test(found.sentence) ? [] : [found.sentence];
      const near = row.note?.includes("near-critical") === true;
      const thermal = near ? nearCritical : exact;
      return [
        ...miss("density", found.density, row, "density", thermal),
        ...miss("cp", found.cp, row, "cp", thermal),
        ...miss("expansivity", found.expansivity, row, "expansivity", thermal),
        ...miss("viscosity", found.viscosity, row, "viscosity", toleranceOf("viscosity", predicted, found, near)),
        ...miss("conductivity", found.conductivity, row, "conductivity", toleranceOf("conductivity", predicted, found, near)),
      ].map((text) => `${row.t_C} °C, ${row.p_Pa} Pa: ${text}`);
    });
    expect(wrong).toEqual([]);
  });

  test("few rows lie beyond a published range, and all of these are refused", () => {
    const beyond = table.flatMap(([name, rows]) =>
      rows.filter((row) => (numberIn(row, "t_C") as number) + 273.15 > fluidOf(name).range.T[1]),
    );
    expect(beyond.length).toBe(8);
  });

  test("ammonia's newer transport meets the newer values beside its rows", () => {
    const newer = pureFluid(pureRecord("ammonia, 2018 transport"), pureRecord);
    const rows = readCsv("pure-states.csv").filter((row) => row.fluid === "ammonia" && row.note?.includes("newer"));
    expect(rows.length).toBeGreaterThan(10);
    const wrong = rows.flatMap((row) => {
      const [, viscosity, conductivity] = /newer (\S+) (\S+)/.exec(row.note as string) as unknown as readonly [string, string, string];
      const found = sure(newer.state((numberIn(row, "t_C") as number) + 273.15, numberIn(row, "p_Pa") as number));
      const near = row.note?.includes("near-critical") === true ? nearCritical : transported;
      return [
        ...miss("viscosity", found.viscosity, { v: viscosity }, "v", near),
        ...miss("conductivity", found.conductivity, { k: conductivity }, "k", near),
      ];
    });
    expect(wrong).toEqual([]);
  });
});

function toleranceOf(quantity: string, predicted: string, { density, phase, T }: State, near: boolean): number {
  if (near) return nearCritical;
  const thin = phase !== "liquid" && density < 50;
  return predicted.includes(quantity) && thin && T < 700 ? predictedGas : transported;
}

describe("saturated liquid and vapour, from an independent evaluation of the same formulations", () => {
  test.each(byFluid("pure-saturation.csv"))("%s", (name, rows) => {
    const fluid = fluidOf(name);
    const predicted = pureRecord(name).predictive ?? "";
    const wrong = rows.flatMap((row) => {
      const T = (numberIn(row, "t_C") as number) + 273.15;
      const found = sure((fluid.saturationAtTemperature as NonNullable<Fluid["saturationAtTemperature"]>)(T));
      const near = row.note === "near-critical";
      const thermal = near ? nearCritical : exact;
      const dew = name === "propylene" && T < 91 ? lowPressureSlip : thermal;
      const { liquid, vapour } = found;
      return [
        ...miss("pressure", found.p, row, "psat_Pa", dew),
        ...miss("dew pressure", vapour.p, row, "pdew_Pa", thermal),
        ...miss("liquid density", liquid.density, row, "rho_liq", thermal),
        ...miss("vapour density", vapour.density, row, "rho_vap", dew),
        ...miss("latent heat", found.latentHeat, row, "h_fg", thermal),
        ...miss("surface tension", found.surfaceTension, row, "sigma", exact),
        ...miss("liquid cp", liquid.cp, row, "cp_liq", thermal),
        ...miss("vapour cp", vapour.cp, row, "cp_vap", thermal),
        ...miss("liquid expansivity", liquid.expansivity, row, "beta_liq", thermal),
        ...miss("vapour expansivity", vapour.expansivity, row, "beta_vap", thermal),
        ...miss("liquid viscosity", liquid.viscosity, row, "mu_liq", near ? nearCritical : transported),
        ...miss("liquid conductivity", liquid.conductivity, row, "k_liq", near ? nearCritical : transported),
        ...miss("vapour viscosity", vapour.viscosity, row, "mu_vap", toleranceOf("viscosity", predicted, vapour, near)),
        ...miss("vapour conductivity", vapour.conductivity, row, "k_vap", toleranceOf("conductivity", predicted, vapour, near)),
      ].map((text) => `${row.t_C} °C: ${text}`);
    });
    expect(wrong).toEqual([]);
  });

  /**
   * Propylene at 90.48 K boils at 0.0019096833194 Pa by 40-digit arithmetic on the equation of state (independent); the row has 0.00190986856.
   * At so low a pressure the library's search stops early.
   */
  const lowPressureSlip = 1.1e-4;

  test("propylene close to its triple point, by 40-digit arithmetic", () => {
    const found = sure((fluidOf("propylene").saturationAtTemperature as NonNullable<Fluid["saturationAtTemperature"]>)(90.48));
    expect(Math.abs(found.p / 0.001909683319406791 - 1)).toBeLessThan(1e-10);
  });
});

describe("values printed in the papers", () => {
  const rows = readCsv("pure-official.csv");

  test.each(
    rows.map(
      (row) => [row.work as string, row.fluid as string, row.quantity as string, row.T_K as string, row.rho as string, row] as const,
    ),
  )("%s: %s %s at %s K, %s", (work, name, quantity, _T, _rho, row) => {
    const value = printedQuantity(name, quantity, row);
    const expected = Number(row.value);
    expect(Math.abs(value / expected - 1)).toBeLessThanOrEqual(printedTolerance(work, name, quantity, row.value as string));
  });
});

function printedQuantity(name: string, quantity: string, row: Row): number {
  const record = pureRecord(name);
  const T = numberIn(row, "T_K") as number;
  const given = numberIn(row, "rho");
  if (given === undefined) return saturationQuantity(name, quantity, T);
  const model = pureModel(record, pureRecord);
  const molar = row.rho_unit === "mol/dm3" ? 1000 * given : given / record.molarMass;
  // The dilute gas: a density at which no density term is left.
  const rho = molar === 0 ? 1e-9 : molar;
  const p = model.pressure(T, rho);
  const found = model.state(T, p, rho, "gas") as State;
  switch (quantity) {
    case "viscosity":
      return (found.viscosity as number) * 1e6;
    case "conductivity":
      return (found.conductivity as number) * 1e3;
    case "cp":
      return found.cp * record.molarMass;
    case "speed of sound":
      return found.speedOfSound as number;
    case "pressure":
      return p / (row.unit === "kPa" ? 1e3 : 1e6);
    default:
      throw new Error(quantity);
  }
}

function saturationQuantity(name: string, quantity: string, T: number): number {
  const found = sure((fluidOf(name).saturationAtTemperature as NonNullable<Fluid["saturationAtTemperature"]>)(T));
  if (quantity === "saturation pressure") return found.p / 1e6;
  return quantity === "saturated liquid density" ? found.liquid.density : found.vapour.density;
}

/**
 * Half a unit of the last printed digit, or what properties.md allows for transport of the same formulation. Thermodynamic values: the papers' gas
 * constants are rounded.
 */
function printedTolerance(work: string, name: string, quantity: string, text: string): number {
  const decimals = text.split(".")[1]?.length ?? 0;
  const half = (0.5 * 10 ** -decimals) / Number(text);
  const transport = quantity === "viscosity" || quantity === "conductivity";
  const wider = widerTolerances.find((one) => work.startsWith(one.work) && one.name === name && one.quantity === quantity);
  return Math.max(half * 1.02, wider?.tolerance ?? (transport ? transported : 1e-7));
}

/**
 * The critical term of these papers was worked out with the equation of state, the viscosity and the Boltzmann constant of their day; n-heptane's
 * viscosity is printed from coefficients with more digits than the paper has.
 */
const widerTolerances: readonly { readonly work: string; readonly name: string; readonly quantity: string; readonly tolerance: number }[] =
  [
    { work: "Assael et al. 2012", name: "benzene", quantity: "conductivity", tolerance: 1.5e-4 },
    { work: "Assael et al. 2013", name: "n-hexane", quantity: "conductivity", tolerance: 2.4e-4 },
    { work: "Sykioti et al. 2013", name: "methanol", quantity: "conductivity", tolerance: 1.6e-4 },
    { work: "Michailidou et al. 2014", name: "n-heptane", quantity: "viscosity", tolerance: 1.1e-4 },
  ];
