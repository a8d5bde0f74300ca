/** Gas mixtures with a name of the trade: typical compositions by mole. */

export interface NamedMixture {
  readonly name: string;
  readonly synonyms: readonly string[];
  readonly composition: Readonly<Record<string, number>>;
}

export const namedMixtures: readonly NamedMixture[] = [
  {
    name: "flue gas, natural gas lean",
    synonyms: ["flue gas", "flue gas natural gas", "natural gas flue gas", "combustion gas"],
    composition: { N2: 0.715, CO2: 0.085, H2O: 0.165, O2: 0.035 },
  },
  { name: "flue gas, oil", synonyms: ["oil flue gas"], composition: { N2: 0.74, CO2: 0.125, H2O: 0.105, O2: 0.029, SO2: 0.001 } },
  { name: "flue gas, coal dry", synonyms: ["flue gas coal", "coal flue gas"], composition: { N2: 0.8, CO2: 0.145, O2: 0.05, SO2: 0.005 } },
  { name: "shielding gas", synonyms: ["argon-carbon dioxide", "welding gas"], composition: { Ar: 0.82, CO2: 0.18 } },
  { name: "hydrogen-nitrogen", synonyms: ["cracked ammonia", "dissociated ammonia"], composition: { H2: 0.75, N2: 0.25 } },
  { name: "synthesis gas", synonyms: ["syngas"], composition: { CO: 0.4, H2: 0.4, CO2: 0.1, N2: 0.1 } },
  { name: "helium-argon", synonyms: ["argon-helium"], composition: { He: 0.5, Ar: 0.5 } },
  { name: "oxyfuel", synonyms: ["oxyfuel gas", "oxyfuel flue gas"], composition: { CO2: 0.65, H2O: 0.3, O2: 0.05 } },
];
