/** Every work that a correlation, a table or a fluid record cites: full citation text under a short key, keys in alphabetical order. */

export interface Work {
  readonly cite: string;
}

export const bibliography = {
  "api-mpms-11.1": {
    cite: "API Manual of Petroleum Measurement Standards, chapter 11.1, thermal expansion of lubricating oils (constant from memory)",
  },
  "ashrae-2001": {
    cite: "ASHRAE Handbook of Fundamentals, Physical properties of secondary coolants, American Society of Heating, Refrigerating and Air-Conditioning Engineers, Atlanta, 2001",
  },
  "assael-2010-metals": {
    cite: "M. J. Assael et al., Reference data for the density and viscosity of liquid copper and tin, J. Phys. Chem. Ref. Data 39 (2010) 033105",
  },
  "assael-2012-metals": {
    cite: "M. J. Assael et al., Reference data for the density and viscosity of liquid cadmium, cobalt, gallium, indium, mercury, silicon, thallium, and zinc, J. Phys. Chem. Ref. Data 41 (2012) 033101",
  },
  "astm-d2270": {
    cite: "ASTM D2270, Standard Practice for Calculating Viscosity Index from Kinematic Viscosity at 40 °C and 100 °C (coefficients from memory)",
  },
  "astm-d341": {
    cite: "ASTM D341, Standard Practice for Viscosity-Temperature Equations and Charts for Liquid Petroleum or Hydrocarbon Products",
  },
  "beattie-1941": {
    cite: "J. A. Beattie et al., The thermal expansion and compressibility of vitreous silica and the thermal dilation of mercury, Proc. Am. Acad. Arts Sci. 74 (1941) 371",
  },
  "chang-2015": {
    cite: "Z. Chang et al., The design and numerical study of a 2 MWh molten salt thermocline tank, Energy Procedia 69 (2015) 779-789",
  },
  "cragoe-1929": {
    cite: "C. S. Cragoe, Thermal Properties of Petroleum Products, Miscellaneous Publication 97, National Bureau of Standards, 1929",
  },
  "fink-leibowitz-1995": {
    cite: "J. K. Fink, L. Leibowitz, Thermodynamic and transport properties of sodium liquid and vapor, ANL/RE-95/2, Argonne National Laboratory, 1995",
  },
  "foust-1972": {
    cite: "O. J. Foust (ed.), Sodium-NaK Engineering Handbook, vol. 1, Gordon and Breach, New York, 1972",
  },
  "handbook-from-memory": {
    cite: "Usual handbook value, from memory",
  },
  "hyland-wexler-1983": {
    cite: "R. W. Hyland, A. Wexler, Formulations for the thermodynamic properties of dry air and of moist air in equilibrium with liquid water, ASHRAE Trans. 89 (1983) 520-535",
  },
  "iapws-r1-76": {
    cite: "IAPWS R1-76(2014), Revised Release on Surface Tension of Ordinary Water Substance, International Association for the Properties of Water and Steam, 2014",
  },
  "iapws-r12-08": {
    cite: "IAPWS R12-08, Release on the IAPWS Formulation 2008 for the Viscosity of Ordinary Water Substance, International Association for the Properties of Water and Steam, 2008",
  },
  "iapws-r13-08": {
    cite: "IAPWS R13-08, Release on the IAPWS Formulation 2008 for the Thermodynamic Properties of Seawater, International Association for the Properties of Water and Steam, 2008",
  },
  "iapws-r14-08": {
    cite: "IAPWS R14-08(2011), Revised Release on the Pressure along the Melting and Sublimation Curves of Ordinary Water Substance, International Association for the Properties of Water and Steam, 2011",
  },
  "iapws-r15-11": {
    cite: "IAPWS R15-11, Release on the IAPWS Formulation 2011 for the Thermal Conductivity of Ordinary Water Substance, International Association for the Properties of Water and Steam, 2011",
  },
  "iapws-r7-97": {
    cite: "IAPWS R7-97(2012), Revised Release on the IAPWS Industrial Formulation 1997 for the Thermodynamic Properties of Water and Steam, International Association for the Properties of Water and Steam, 2012",
  },
  "incropera-a5": {
    cite: "F. P. Incropera, D. P. DeWitt, T. L. Bergman, A. S. Lavine, Fundamentals of Heat and Mass Transfer, table A.5 (from memory)",
  },
  "iso-3448": {
    cite: "ISO 3448, Industrial liquid lubricants: ISO viscosity classification",
  },
  "jamieson-1969": {
    cite: "D. T. Jamieson et al., Physical properties of sea water solutions: heat capacity, Desalination 7 (1969) 23-30",
  },
  "jamieson-tudhope-1970": {
    cite: "D. T. Jamieson, J. S. Tudhope, Physical properties of sea water solutions: thermal conductivity, Desalination 8 (1970) 393-401",
  },
  "mas-de-les-valls-2008": {
    cite: "I. Mas de les Valls et al., Lead-lithium eutectic material database for nuclear fusion technology, J. Nucl. Mater. 376 (2008) 353-357",
  },
  "mason-saxena-1958": {
    cite: "E. A. Mason, S. C. Saxena, Approximate formula for the thermal conductivity of gas mixtures, Phys. Fluids 1 (1958) 361-369",
  },
  "mcbride-2002": {
    cite: "B. J. McBride, M. J. Zehe, S. Gordon, NASA Glenn Coefficients for Calculating Thermodynamic Properties of Individual Species, NASA/TP-2002-211556, 2002",
  },
  "melinder-2010": {
    cite: "Å. Melinder, Properties of Secondary Working Fluids for Indirect Systems, International Institute of Refrigeration, 2nd ed., Paris, 2010",
  },
  "mogahed-1995": {
    cite: "E. A. Mogahed, G. L. Kulcinski, Bibliography of a promising tritium breeding material Pb83Li17, UWFDM-994, University of Wisconsin, 1995",
  },
  "nayar-2016": {
    cite: "K. G. Nayar, M. H. Sharqawy, L. D. Banchik, J. H. Lienhard V, Thermophysical properties of seawater: a review and new correlations that include pressure dependence, Desalination 390 (2016) 1-24",
  },
  "oecd-nea-2015": {
    cite: "OECD/NEA, Handbook on Lead-bismuth Eutectic Alloy and Lead Properties, Materials Compatibility, Thermal-hydraulics and Technologies, 2015 edition",
  },
  "open-metal-data": {
    cite: "Polynomials of an open data collection for mercury, source not stated there",
  },
  "quench-oil-typical-values": {
    cite: "Published typical values of quenching oils, common practice, from memory",
  },
  "romatoski-hu-2017": {
    cite: "R. R. Romatoski, L. W. Hu, Fluoride salt coolant properties for nuclear reactor applications: a review, Annals of Nuclear Energy 109 (2017) 635-647",
  },
  "schulz-1991": {
    cite: "B. Schulz, Thermophysical properties of the Li(17)Pb(83) alloy, Fusion Eng. Des. 14 (1991) 199-205",
  },
  "sharqawy-2010": {
    cite: "M. H. Sharqawy, J. H. Lienhard V, S. M. Zubair, Thermophysical properties of seawater: a review of existing correlations and data, Desalination and Water Treatment 16 (2010) 354-380",
  },
  "silicone-typical-values": {
    cite: "Suppliers' typical values for polydimethylsiloxane by viscosity grade, common practice, from memory",
  },
  "sohal-2010": {
    cite: "M. S. Sohal et al., Engineering Database of Liquid Salt Thermophysical and Thermochemical Properties, INL/EXT-10-18297, Idaho National Laboratory, 2010",
  },
  "supplier-typical-values": {
    cite: "Suppliers' typical values for heat-transfer liquids of this chemistry, fitted by an open property library; no product is meant",
  },
  "svehla-1995": {
    cite: "R. A. Svehla, Transport Coefficients for the NASA Lewis Chemical Equilibrium Program, NASA TM-4647, 1995",
  },
  "wilke-1950": {
    cite: "C. R. Wilke, A viscosity equation for gas mixtures, J. Chem. Phys. 18 (1950) 517-519",
  },
  "zavoico-2001": {
    cite: "A. B. Zavoico, Solar Power Tower Design Basis Document, SAND2001-2100, Sandia National Laboratories, 2001",
  },
} as const satisfies Record<string, Work>;

export type WorkKey = keyof typeof bibliography;
