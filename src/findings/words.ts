/** The words by which a cell may ask for anything of a finding. */
export interface WordEntry {
  readonly name: string;
  readonly kind: "number" | "text" | "block";
  readonly describe: string;
}

const bounded = (name: string, describe: string): readonly WordEntry[] => [
  { name, kind: "number", describe },
  { name: `${name} low`, kind: "number", describe: `lower bound of ${name}, about 95 %` },
  { name: `${name} high`, kind: "number", describe: `upper bound of ${name}, about 95 %` },
];

export const surfaceWords: readonly WordEntry[] = [
  ...bounded("h", "film coefficient, convection alone"),
  ...bounded("Nu", "Nusselt number"),
  ...bounded("q", "convective heat flux, positive from surface to fluid"),
  ...bounded("Ts", "surface temperature"),
  ...bounded("Tb", "bulk temperature"),
  { name: "h conservative", kind: "number", describe: "the bound of h that moves the part towards the setting concern" },
  { name: "Tb conservative", kind: "number", describe: "the bound of Tb that moves the part towards the setting concern" },
  { name: "Re", kind: "number", describe: "Reynolds number" },
  { name: "Gr", kind: "number", describe: "Grashof number" },
  { name: "Ra", kind: "number", describe: "Rayleigh number" },
  { name: "Pr", kind: "number", describe: "Prandtl number" },
  { name: "Ri", kind: "number", describe: "Richardson number, Gr/Re²" },
  { name: "Pe", kind: "number", describe: "Péclet number, Re·Pr" },
  { name: "heat rate", kind: "number", describe: "convective heat over the area" },
  { name: "area", kind: "number", describe: "wetted area" },
  { name: "Ts max", kind: "number", describe: "largest surface temperature under a uniform flux" },
  { name: "reference temperature", kind: "number", describe: "the temperature that h is taken against" },
  { name: "film temperature", kind: "number", describe: "mean of surface and bulk" },
  { name: "length", kind: "number", describe: "characteristic length" },
  { name: "density", kind: "number", describe: "where the equation takes its properties" },
  { name: "cp", kind: "number", describe: "specific heat, where the equation takes its properties" },
  { name: "conductivity", kind: "number", describe: "thermal conductivity, where the equation takes its properties" },
  { name: "viscosity", kind: "number", describe: "dynamic viscosity, where the equation takes its properties" },
  { name: "kinematic viscosity", kind: "number", describe: "where the equation takes its properties" },
  { name: "expansivity", kind: "number", describe: "volumetric thermal expansivity, where the equation takes its properties" },
  { name: "friction factor", kind: "number", describe: "Darcy friction factor (ducts)" },
  { name: "pressure drop", kind: "number", describe: "over the length (ducts)" },
  { name: "h radiant", kind: "number", describe: "linearised radiation coefficient" },
  { name: "h total", kind: "number", describe: "convection and radiation together" },
  { name: "q radiant", kind: "number", describe: "radiant heat flux" },
  { name: "q total", kind: "number", describe: "convective and radiant heat flux" },
  { name: "regime", kind: "text", describe: "flow regime" },
  { name: "equation", kind: "text", describe: "the equation taken" },
  { name: "source", kind: "text", describe: "its publication" },
  { name: "scatter", kind: "text", describe: "its scatter, and whose figure that is" },
  { name: "verdict", kind: "text", describe: "whether the equation may be used here" },
  { name: "cautions", kind: "text", describe: "what must be known beside the number" },
  { name: "version", kind: "text", describe: "version of Filmbook" },
  { name: "trace", kind: "block", describe: "every step from inputs to h, with units" },
  { name: "compare", kind: "block", describe: "every published equation that serves: h, bounds, range" },
  { name: "all", kind: "block", describe: "name, value, unit of every word" },
];

/** Words that are text also when the arguments are wrong. */
export const alwaysText: ReadonlySet<string> = new Set(["verdict", "cautions", "equation", "source", "regime"]);
