/** Every work that a correlation, a table or a fluid record cites: full citation text under a short key, keys in alphabetical order. */

export interface Work {
  readonly cite: string;
}

export const bibliography = {
  "iapws-r1-76": {
    cite: "IAPWS R1-76(2014), Revised Release on Surface Tension of Ordinary Water Substance, International Association for the Properties of Water and Steam, 2014",
  },
  "iapws-r12-08": {
    cite: "IAPWS R12-08, Release on the IAPWS Formulation 2008 for the Viscosity of Ordinary Water Substance, International Association for the Properties of Water and Steam, 2008",
  },
  "iapws-r15-11": {
    cite: "IAPWS R15-11, Release on the IAPWS Formulation 2011 for the Thermal Conductivity of Ordinary Water Substance, International Association for the Properties of Water and Steam, 2011",
  },
  "iapws-r7-97": {
    cite: "IAPWS R7-97(2012), Revised Release on the IAPWS Industrial Formulation 1997 for the Thermodynamic Properties of Water and Steam, International Association for the Properties of Water and Steam, 2012",
  },
} as const satisfies Record<string, Work>;

export type WorkKey = keyof typeof bibliography;
