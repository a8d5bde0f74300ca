/** What the symbols of the lines mean, with their SI unit, and how they are typeset. */
import { plainSymbol } from "../equations/mathml.js";
import type { Correlation } from "./correlation.js";

export interface SymbolMeaning {
  readonly meaning: string;
  /** SI unit, "" for pure numbers. */
  readonly unit: string;
  /** Presentation MathML where the trade does not write the name itself. */
  readonly mathml?: string;
}

const greek = (letter: string): string => `<mi>${letter}</mi>`;
const upright = (text: string): string => `<mi mathvariant="normal">${text}</mi>`;
const below = (base: string, index: string): string => `<msub>${base}${index.length === 1 ? `<mi>${index}</mi>` : upright(index)}</msub>`;
const ratio = (above: string, under: string): string => `<mrow><mo>(</mo><mrow>${above}<mo>/</mo>${under}</mrow><mo>)</mo></mrow>`;

/** Symbols that many records and surfaces share. A record explains its own in `symbols`. */
export const symbolMeaning: Readonly<Record<string, SymbolMeaning>> = {
  // Results and groups
  Nu: { meaning: "Nusselt number, h·L/k", unit: "" },
  h: { meaning: "film coefficient", unit: "W/(m²·K)" },
  q: { meaning: "heat flux from the surface into the fluid", unit: "W/m²" },
  q_wall: { meaning: "heat flux given at the wall", unit: "W/m²", mathml: below("<mi>q</mi>", "w") },
  Re: { meaning: "Reynolds number", unit: "" },
  Pr: { meaning: "Prandtl number", unit: "" },
  Prw: { meaning: "Prandtl number at the wall", unit: "", mathml: below(upright("Pr"), "w") },
  Prb: { meaning: "Prandtl number of the bulk", unit: "", mathml: below(upright("Pr"), "b") },
  Gr: { meaning: "Grashof number", unit: "" },
  Ra: { meaning: "Rayleigh number", unit: "" },
  RaStar: { meaning: "modified Rayleigh number from the flux, Ra·Nu", unit: "", mathml: `<msup>${upright("Ra")}<mo>*</mo></msup>` },
  RaS: { meaning: "Rayleigh number on the shorter side", unit: "", mathml: below(upright("Ra"), "S") },
  RaM: { meaning: "Rayleigh number on the mean of the sides", unit: "", mathml: below(upright("Ra"), "M") },
  RaP: { meaning: "Rayleigh number on the flow length π·D/2", unit: "", mathml: below(upright("Ra"), "P") },
  ReP: { meaning: "Reynolds number on the flow length π·D/2", unit: "", mathml: below(upright("Re"), "P") },
  NuS: { meaning: "Nusselt number on the shorter side", unit: "", mathml: below(upright("Nu"), "S") },
  NuM: { meaning: "Nusselt number on the mean of the sides", unit: "", mathml: below(upright("Nu"), "M") },
  NuP: { meaning: "Nusselt number on the flow length π·D/2", unit: "", mathml: below(upright("Nu"), "P") },
  Pe: { meaning: "Péclet number, Re·Pr", unit: "" },
  Ri: { meaning: "Richardson number, Gr/Re²", unit: "" },
  Gz: { meaning: "Graetz number, Re·Pr·D/x", unit: "" },
  xs: { meaning: "dimensionless distance from the inlet, x/(D·Re·Pr)", unit: "", mathml: `<msup><mi>x</mi><mo>*</mo></msup>` },
  xp: { meaning: "dimensionless distance from the inlet, x/(D·Re)", unit: "", mathml: `<msup><mi>x</mi><mo>+</mo></msup>` },
  St: { meaning: "Stanton number, Nu/(Re·Pr)", unit: "" },
  De: { meaning: "Dean number, Re·√(d/D)", unit: "" },
  Sw: { meaning: "swirl number of a twisted tape", unit: "" },
  // State and properties
  Ts: { meaning: "surface temperature", unit: "K", mathml: below("<mi>T</mi>", "s") },
  Tb: { meaning: "bulk temperature", unit: "K", mathml: below("<mi>T</mi>", "b") },
  Tf: { meaning: "film temperature, mean of surface and bulk", unit: "K", mathml: below("<mi>T</mi>", "f") },
  Tref: { meaning: "reference temperature of h", unit: "K", mathml: below("<mi>T</mi>", "ref") },
  Taw: { meaning: "adiabatic wall temperature", unit: "K", mathml: below("<mi>T</mi>", "aw") },
  Tstar: { meaning: "temperature at which properties are taken at high speed", unit: "K", mathml: "<msup><mi>T</mi><mo>*</mo></msup>" },
  dT: { meaning: "surface minus bulk temperature", unit: "K", mathml: '<mrow><mi mathvariant="normal">Δ</mi><mi>T</mi></mrow>' },
  p: { meaning: "pressure, absolute", unit: "Pa" },
  pressure: { meaning: "pressure, absolute", unit: "Pa", mathml: "<mi>p</mi>" },
  k: { meaning: "thermal conductivity", unit: "W/(m·K)" },
  rho: { meaning: "density", unit: "kg/m³", mathml: greek("ρ") },
  cp: { meaning: "specific heat at constant pressure", unit: "J/(kg·K)", mathml: below("<mi>c</mi>", "p") },
  mu: { meaning: "dynamic viscosity", unit: "Pa·s", mathml: greek("μ") },
  nu: { meaning: "kinematic viscosity", unit: "m²/s", mathml: greek("ν") },
  alpha: { meaning: "thermal diffusivity", unit: "m²/s", mathml: greek("α") },
  beta: { meaning: "expansivity", unit: "1/K", mathml: greek("β") },
  buoyancy: {
    meaning: "relative density difference that drives the flow",
    unit: "",
    mathml: '<mrow><mi mathvariant="normal">Δ</mi><mi>ρ</mi><mo>/</mo><mi>ρ</mi></mrow>',
  },
  gravity: { meaning: "acceleration of gravity", unit: "m/s²", mathml: "<mi>g</mi>" },
  emissivity: { meaning: "emissivity of the surface", unit: "", mathml: greek("ε") },
  // Dimensions and flow
  L: { meaning: "characteristic length", unit: "m" },
  u: { meaning: "speed", unit: "m/s" },
  flow: { meaning: "flow as it was given", unit: "" },
  flowArea: { meaning: "cross-section of the flow", unit: "m²", mathml: below("<mi>A</mi>", "c") },
  height: { meaning: "height", unit: "m", mathml: "<mi>H</mi>" },
  length: { meaning: "length", unit: "m", mathml: "<mi>L</mi>" },
  width: { meaning: "width", unit: "m", mathml: "<mi>W</mi>" },
  diameter: { meaning: "diameter", unit: "m", mathml: "<mi>D</mi>" },
  position: { meaning: "distance from the leading edge or inlet", unit: "m", mathml: "<mi>x</mi>" },
  side: { meaning: "shorter side", unit: "m", mathml: "<mi>S</mi>" },
  meanSide: { meaning: "mean of the sides", unit: "m", mathml: "<mi>M</mi>" },
  wettedArea: { meaning: "wetted area", unit: "m²", mathml: "<mi>A</mi>" },
  tilt: { meaning: "angle from the vertical", unit: "°", mathml: greek("θ") },
  slender: { meaning: "height / diameter", unit: "", mathml: ratio("<mi>H</mi>", "<mi>D</mi>") },
  D_L: { meaning: "diameter / length from the inlet, 0 when developed", unit: "", mathml: ratio("<mi>D</mi>", "<mi>L</mi>") },
  L_D: { meaning: "length / diameter", unit: "", mathml: ratio("<mi>L</mi>", "<mi>D</mi>") },
  x_D: { meaning: "distance from the inlet / diameter", unit: "", mathml: ratio("<mi>x</mi>", "<mi>D</mi>") },
  S_L: { meaning: "shorter side / (area / perimeter)", unit: "", mathml: ratio("<mi>S</mi>", "<mi>L</mi>") },
  M_L: { meaning: "mean of the sides / (area / perimeter)", unit: "", mathml: ratio("<mi>M</mi>", "<mi>L</mi>") },
  e_D: { meaning: "equivalent sand roughness / diameter", unit: "", mathml: ratio("<msub><mi>k</mi><mi>s</mi></msub>", "<mi>D</mi>") },
  x_ks: {
    meaning: "distance from the edge / equivalent sand roughness",
    unit: "",
    mathml: ratio("<mi>x</mi>", "<msub><mi>k</mi><mi>s</mi></msub>"),
  },
  L_ks: { meaning: "length / equivalent sand roughness", unit: "", mathml: ratio("<mi>L</mi>", "<msub><mi>k</mi><mi>s</mi></msub>") },
  xi: { meaning: "unheated length / whole length", unit: "", mathml: greek("ξ") },
  d_D: { meaning: "tube diameter / coil diameter", unit: "", mathml: ratio("<mi>d</mi>", "<mi>D</mi>") },
  ST: { meaning: "transverse pitch", unit: "m", mathml: below("<mi>S</mi>", "T") },
  SL: { meaning: "longitudinal pitch", unit: "m", mathml: below("<mi>S</mi>", "L") },
  ST_D: { meaning: "transverse pitch / diameter", unit: "", mathml: ratio(below("<mi>S</mi>", "T"), "<mi>D</mi>") },
  SL_D: { meaning: "longitudinal pitch / diameter", unit: "", mathml: ratio(below("<mi>S</mi>", "L"), "<mi>D</mi>") },
  rows: { meaning: "number of tube rows along the flow", unit: "", mathml: "<mi>n</mi>" },
  void: { meaning: "void fraction of the bed", unit: "", mathml: greek("ε") },
  apex: { meaning: "apex angle of the triangle", unit: "°", mathml: greek("φ") },
  ba: { meaning: "short axis / long axis", unit: "", mathml: ratio("<mi>b</mi>", "<mi>a</mi>") },
  y: { meaning: "pitch of half a turn of the tape / inside diameter", unit: "" },
  t_d: { meaning: "tape thickness / inside diameter", unit: "", mathml: ratio("<mi>t</mi>", "<mi>d</mi>") },
  f_fs: { meaning: "rough over smooth friction factor", unit: "", mathml: ratio("<mi>f</mi>", below("<mi>f</mi>", "s")) },
  // Ratios of properties, bulk over wall
  Pr_Prw: {
    meaning: "Prandtl number of the bulk over that at the wall",
    unit: "",
    mathml: ratio(upright("Pr"), below(upright("Pr"), "w")),
  },
  mub_muw: {
    meaning: "viscosity of the bulk over that at the wall",
    unit: "",
    mathml: ratio(below(greek("μ"), "b"), below(greek("μ"), "w")),
  },
  Tb_Tw: { meaning: "bulk over wall temperature, absolute", unit: "", mathml: ratio(below("<mi>T</mi>", "b"), below("<mi>T</mi>", "w")) },
  Tw_Tb: { meaning: "wall over bulk temperature, absolute", unit: "", mathml: ratio(below("<mi>T</mi>", "w"), below("<mi>T</mi>", "b")) },
  heated: { meaning: "1 where the wall heats the fluid, 0 where it cools it", unit: "" },
  // Helper lines that recur
  f: { meaning: "Darcy friction factor", unit: "" },
  fRe: { meaning: "Fanning friction factor times Re", unit: "", mathml: '<mrow><mi>f</mi><mi mathvariant="normal">Re</mi></mrow>' },
  Cf: { meaning: "skin-friction coefficient", unit: "", mathml: below("<mi>C</mi>", "f") },
  CfHalf: {
    meaning: "half the skin-friction coefficient",
    unit: "",
    mathml: `<mrow>${below("<mi>C</mi>", "f")}<mo>/</mo><mn>2</mn></mrow>`,
  },
  ksp: {
    meaning: "roughness Reynolds number, friction speed times sand roughness over kinematic viscosity",
    unit: "",
    mathml: "<msubsup><mi>k</mi><mi>s</mi><mo>+</mo></msubsup>",
  },
  Rek: {
    meaning: "roughness Reynolds number, friction speed times sand roughness over kinematic viscosity",
    unit: "",
    mathml: below(upright("Re"), "k"),
  },
  Rec: { meaning: "critical Reynolds number", unit: "", mathml: below(upright("Re"), "c") },
  Rew: { meaning: "Reynolds number of rotation, ω·r²/ν", unit: "", mathml: below(upright("Re"), "ω") },
  Cl: { meaning: "laminar coefficient of free convection, a function of Pr", unit: "", mathml: below("<mi>C</mi>", "l") },
  CtV: {
    meaning: "turbulent coefficient of a vertical plate, a function of Pr",
    unit: "",
    mathml: "<msubsup><mi>C</mi><mi>t</mi><mi>V</mi></msubsup>",
  },
  Ct: { meaning: "turbulent coefficient of free convection, a function of Pr", unit: "", mathml: below("<mi>C</mi>", "t") },
  NuT: { meaning: "Nusselt number of a thin laminar layer", unit: "", mathml: `<msup>${upright("Nu")}<mi>T</mi></msup>` },
  Nul: { meaning: "laminar Nusselt number", unit: "", mathml: below(upright("Nu"), "l") },
  Nut: { meaning: "turbulent Nusselt number", unit: "", mathml: below(upright("Nu"), "t") },
  Nulam: { meaning: "laminar Nusselt number", unit: "", mathml: below(upright("Nu"), "lam") },
  Nuturb: { meaning: "turbulent Nusselt number", unit: "", mathml: below(upright("Nu"), "turb") },
  NuF: { meaning: "Nusselt number of forced convection alone", unit: "", mathml: below(upright("Nu"), "F") },
  NuN: { meaning: "Nusselt number of free convection alone", unit: "", mathml: below(upright("Nu"), "N") },
  Factor: { meaning: "factor on Nu", unit: "", mathml: "<mi>K</mi>" },
  Criterion: { meaning: "number that decides the regime", unit: "" },
  gamma: { meaning: "share of the turbulent value in the transition", unit: "", mathml: greek("γ") },
};

/** Meaning of a symbol in a record: its own words first; `Nu_V` in a part is told as `Nu`. Empty where nobody says. */
export function meaningOf(symbol: string, record?: Correlation): string {
  const own = record?.symbols?.[symbol] ?? symbolMeaning[symbol]?.meaning;
  if (own !== undefined) return own;
  const [base, part] = splitPart(symbol);
  if (part === "") return "";
  const inner = record?.parts?.[part]?.of;
  const meaning = meaningOf(base, inner ?? record);
  return meaning === "" ? "" : `${meaning}, part ${part}`;
}

/** MathML of a symbol; a part's suffix becomes a further index. */
export function symbolMath(symbol: string): string {
  const known = symbolMeaning[symbol]?.mathml;
  if (known !== undefined) return known;
  const [base, part] = splitPart(symbol);
  if (part === "" || symbolMeaning[base] === undefined) return plainSymbol(symbol);
  return `<msub><mrow>${symbolMath(base)}</mrow>${upright(part)}</msub>`;
}

function splitPart(symbol: string): readonly [base: string, part: string] {
  const at = symbol.lastIndexOf("_");
  return at <= 0 ? [symbol, ""] : [symbol.slice(0, at), symbol.slice(at + 1)];
}
