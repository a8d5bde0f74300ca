/** Gases at low density and named mixtures of them, as lines of the shelf. */
import type { FluidRange } from "./fluid.js";
import { mixtureOf, type Part } from "./gas-mixture.js";
import { type GasComponent, lowDensityGases } from "./low-density-gas.js";
import { type NamedMixture, namedMixtures } from "./records/gas-mixtures.js";
import type { ShelfEntry } from "./shelf-entry.js";

const sources = ["svehla-1995", "mcbride-2002"] as const;
const pressures: FluidRange["p"] = [1, 1e6];

/** These have no entry of their own as pure fluids, so the plain name is theirs. */
const onlyHere: ReadonlySet<string> = new Set(["NO", "NO2"]);

function pureEntry(gas: GasComponent): ShelfEntry {
  const plain = onlyHere.has(gas.formula);
  const name = plain ? gas.name : `${gas.name}, low density`;
  const synonyms = plain ? [gas.formula, `${gas.formula}, low density`] : [`${gas.formula}, low density`, `hot ${gas.name}`];
  return {
    name,
    synonyms,
    family: "gas",
    sources,
    summary: `${gas.name.charAt(0).toUpperCase()}${gas.name.slice(1)} as an ideal gas to 4700 °C, composition frozen; for furnaces and flames.`,
    range: { T: gas.T, p: pressures },
    uncertainty: "density 0.5 % a bar, cp 1 %, viscosity 2 to 5 %, conductivity 5 to 10 %",
    fluid: () => mixtureOf([{ gas, fraction: 1 }], { name, synonyms, family: "gas", cautions: [] }),
  };
}

/** The gas of a formula; the records below name only formulas that exist, which a test holds. */
export function gasOf(formula: string): GasComponent | undefined {
  return lowDensityGases.find((gas) => gas.formula === formula);
}

function partsOf(mixture: NamedMixture): readonly Part[] {
  return Object.entries(mixture.composition).flatMap(([formula, fraction]) => {
    const gas = gasOf(formula);
    return gas ? [{ gas, fraction }] : [];
  });
}

function mixtureEntry(mixture: NamedMixture): ShelfEntry {
  const parts = partsOf(mixture);
  const percents = Object.entries(mixture.composition).map(
    ([formula, fraction]) => `${formula} ${Number((100 * fraction).toPrecision(4))} %`,
  );
  return {
    name: mixture.name,
    synonyms: mixture.synonyms,
    family: "mixture",
    sources: [...sources, "wilke-1950", "mason-saxena-1958"],
    summary: `Ideal-gas mixture by mole: ${percents.join(", ")}.`,
    range: { T: [Math.max(...parts.map((part) => part.gas.T[0])), 5000], p: pressures },
    uncertainty: "density 0.5 % a bar, cp 1 %, viscosity 4 to 7 %, conductivity 7 to 12 %",
    fluid: () => mixtureOf(parts, { name: mixture.name, synonyms: mixture.synonyms, family: "mixture", cautions: [] }),
  };
}

export const gasEntries: readonly ShelfEntry[] = [...namedMixtures.map(mixtureEntry), ...lowDensityGases.map(pureEntry)];
