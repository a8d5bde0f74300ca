/** One row of an own table completed: density, cp, conductivity and viscosity from whichever sufficient set it holds. */

export interface GivenRow {
  readonly density: number | undefined;
  readonly cp: number | undefined;
  readonly conductivity: number | undefined;
  readonly viscosity: number | undefined;
  readonly kinematicViscosity: number | undefined;
  readonly Pr: number | undefined;
  readonly diffusivity: number | undefined;
  readonly expansivity: number | undefined;
}

export interface PropertyRow {
  readonly density: number;
  readonly cp: number;
  readonly conductivity: number;
  readonly viscosity: number;
  readonly expansivity: number | undefined;
  /** False where 1 kg/m³ was put in the place of a density that the row does not give. */
  readonly densityGiven: boolean;
  /** Largest relative disagreement between a given value and what the others yield, and which value that is. */
  readonly contradiction: number;
  readonly contradicting: string;
}

type Name = "density" | "cp" | "conductivity" | "viscosity" | "kinematicViscosity" | "Pr" | "diffusivity";
type Values = Partial<Record<Name, number>>;

/** left = product of `times` over product of `over`, whichever one is unknown. */
interface Relation {
  readonly left: Name;
  readonly times: readonly Name[];
  readonly over: readonly Name[];
}

const relations: readonly Relation[] = [
  { left: "viscosity", times: ["kinematicViscosity", "density"], over: [] },
  { left: "conductivity", times: ["diffusivity", "density", "cp"], over: [] },
  { left: "kinematicViscosity", times: ["Pr", "diffusivity"], over: [] },
  { left: "viscosity", times: ["Pr", "conductivity"], over: ["cp"] },
];

/** The completed row, or a phrase that says what it lacks. */
export function completeRow(given: GivenRow): PropertyRow | string {
  const known = fill(definedOf(given));
  const densityGiven = known.density !== undefined;
  if (!densityGiven && (known.viscosity !== undefined || known.cp !== undefined)) {
    return known.conductivity === undefined ? lackOf(known) : "density is missing";
  }
  // Of a fluid known by ν, α and k alone, everything but mass follows: density may be anything, so it is 1.
  const full = densityGiven ? known : fill({ ...known, density: 1 });
  const { density, cp, conductivity, viscosity } = full;
  if (density === undefined || cp === undefined || conductivity === undefined || viscosity === undefined) return lackOf(full);
  const worst = contradictionIn(given, { density, cp, conductivity, viscosity });
  return { density, cp, conductivity, viscosity, expansivity: given.expansivity, densityGiven, ...worst };
}

function definedOf(given: GivenRow): Values {
  const names: readonly Name[] = ["density", "cp", "conductivity", "viscosity", "kinematicViscosity", "Pr", "diffusivity"];
  return Object.fromEntries(names.flatMap((name) => (given[name] === undefined ? [] : [[name, given[name]]])));
}

function fill(start: Values): Values {
  const values: Values = { ...start };
  for (let settled = false; !settled; ) {
    settled = true;
    for (const relation of relations) {
      const unknown = [relation.left, ...relation.times, ...relation.over].filter((name) => values[name] === undefined);
      if (unknown.length !== 1) continue;
      values[unknown[0] as Name] = solve(relation, unknown[0] as Name, values);
      settled = false;
    }
  }
  return values;
}

function solve(relation: Relation, wanted: Name, values: Values): number {
  const product = (names: readonly Name[]): number =>
    names.filter((name) => name !== wanted).reduce((all, name) => all * (values[name] as number), 1);
  if (relation.left === wanted) return product(relation.times) / product(relation.over);
  const left = values[relation.left] as number;
  if (relation.times.includes(wanted)) return (left * product(relation.over)) / product(relation.times);
  return product(relation.times) / (left * product(relation.over));
}

function lackOf(values: Values): string {
  if (values.conductivity === undefined) return "conductivity is missing";
  if (values.viscosity === undefined && values.kinematicViscosity === undefined) return "viscosity (or kinematic viscosity) is missing";
  return "cp (or Pr, or diffusivity) is missing";
}

/** Where more is given than needed, the derived groups must agree with it. */
function contradictionIn(
  given: GivenRow,
  full: Required<Pick<PropertyRow, "density" | "cp" | "conductivity" | "viscosity">>,
): Pick<PropertyRow, "contradiction" | "contradicting"> {
  const derived: readonly (readonly [string, number | undefined, number])[] = [
    ["kinematic viscosity", given.kinematicViscosity, full.viscosity / full.density],
    ["Pr", given.Pr, (full.viscosity * full.cp) / full.conductivity],
    ["diffusivity", given.diffusivity, full.conductivity / (full.density * full.cp)],
  ];
  let contradiction = 0;
  let contradicting = "";
  for (const [name, value, expected] of derived) {
    if (value === undefined) continue;
    const off = Math.abs(value / expected - 1);
    if (off > contradiction) {
      contradiction = off;
      contradicting = name;
    }
  }
  return { contradiction, contradicting };
}
