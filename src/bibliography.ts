/** Every work that a correlation, a table or a fluid record cites: full citation text under a short key, keys in alphabetical order. */

export interface Work {
  readonly cite: string;
}

export const bibliography = {
  "achenbach-1978": {
    cite: "Achenbach, E. Proc. 6th Int. Heat Transfer Conf., Toronto 5 (1978) 341-346",
  },
  "al-arabi-1982": {
    cite: "Al-Arabi, M. Heat Transfer Engineering 3 (1982) 76-83",
  },
  "al-arabi-khamis-1982": {
    cite: "Al-Arabi, M.; Khamis, M. Int. J. Heat Mass Transfer 25 (1982) 45-51",
  },
  "amato-tien-1972": {
    cite: "Amato, W.S.; Tien, C. Int. J. Heat Mass Transfer 15 (1972) 327-339",
  },
  "ameel-1997": {
    cite: "Ameel, T.A. Int. Comm. Heat Mass Transfer 24 (1997) 1113-1120",
  },
  "aoki-nohira-1967": {
    cite: "Aoki, H.; Nohira, H.; Arai, H. Bull. JSME 10 (1967) 523-532",
  },
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
  "astm-c680-1989": {
    cite: "ASTM C680-89, Standard Practice for Determination of Heat Gain or Loss and the Surface Temperatures of Insulated Pipe and Equipment Systems",
  },
  "astm-d2270": {
    cite: "ASTM D2270, Standard Practice for Calculating Viscosity Index from Kinematic Viscosity at 40 °C and 100 °C (coefficients from memory)",
  },
  "astm-d341": {
    cite: "ASTM D341, Standard Practice for Viscosity-Temperature Equations and Charts for Liquid Petroleum or Hydrocarbon Products",
  },
  "baehr-stephan": {
    cite: "Baehr, H.D.; Stephan, K. Heat and Mass Transfer, Springer",
  },
  "bayley-1955": {
    cite: "Bayley, F.J. Proc. Inst. Mech. Engrs 169 (1955) 361-370",
  },
  "beattie-1941": {
    cite: "J. A. Beattie et al., The thermal expansion and compressibility of vitreous silica and the thermal dilation of mercury, Proc. Am. Acad. Arts Sci. 74 (1941) 371",
  },
  "becker-1963": {
    cite: "Becker, K.M. Int. J. Heat Mass Transfer 6 (1963) 1053-1062",
  },
  "becker-kaye-1962": {
    cite: "Becker, K.M.; Kaye, J. J. Heat Transfer 84 (1962) 97-105",
  },
  "bhatti-shah-1987": {
    cite: "Bhatti, M.S.; Shah, R.K. in Handbook of Single-Phase Convective Heat Transfer (Kakac, Shah, Aung), Wiley (1987), ch. 4",
  },
  "blasius-1913": {
    cite: "Blasius, H. Forsch. Ing.-Wes. 131 (1913)",
  },
  "brown-thomas-1965": {
    cite: "Brown, A.R.; Thomas, M.A. J. Mech. Eng. Science 7 (1965) 440-448",
  },
  "chang-2015": {
    cite: "Z. Chang et al., The design and numerical study of a 2 MWh molten salt thermocline tank, Energy Procedia 69 (2015) 779-789",
  },
  "chen-armaly-1987": {
    cite: "Chen, T.S.; Armaly, B.F. in Handbook of Single-Phase Convective Heat Transfer (Kakac, Shah, Aung), Wiley (1987), ch. 14",
  },
  "chen-chiou-1981": {
    cite: "Chen, C.J.; Chiou, J.S. Int. J. Heat Mass Transfer 24 (1981) 1179-1189",
  },
  "cheng-tak-2006": {
    cite: "Cheng, X.; Tak, N. Nuclear Eng. Design 236 (2006) 385-393",
  },
  "churchill-1976": {
    cite: "Churchill, S.W. AIChE Journal 22 (1976) 264-268",
  },
  "churchill-1977-friction": {
    cite: "Churchill, S.W. Chem. Engineering 84 (24) (1977) 91-92",
  },
  "churchill-1977-mixed": {
    cite: "Churchill, S.W. AIChE Journal 23 (1977) 10-16",
  },
  "churchill-1977-tube": {
    cite: "Churchill, S.W. Ind. Eng. Chem. Fundamentals 16 (1977) 109-116",
  },
  "churchill-1983-hedh": {
    cite: "Churchill, S.W. Heat Exchanger Design Handbook, sect. 2.5.7, Hemisphere (1983)",
  },
  "churchill-bernstein-1977": {
    cite: "Churchill, S.W.; Bernstein, M. J. Heat Transfer 99 (1977) 300-306",
  },
  "churchill-chu-1975-cylinder": {
    cite: "Churchill, S.W.; Chu, H.H.S. Int. J. Heat Mass Transfer 18 (1975) 1049-1053",
  },
  "churchill-chu-1975-plate": {
    cite: "Churchill, S.W.; Chu, H.H.S. Int. J. Heat Mass Transfer 18 (1975) 1323-1329",
  },
  "churchill-ozoe-1973-forced": {
    cite: "Churchill, S.W.; Ozoe, H. J. Heat Transfer 95 (1973) 416-419",
  },
  "churchill-ozoe-1973-free": {
    cite: "Churchill, S.W.; Ozoe, H. J. Heat Transfer 95 (1973) 540-541",
  },
  "churchill-usagi-1972": {
    cite: "Churchill, S.W.; Usagi, R. AIChE Journal 18 (1972) 1121-1128",
  },
  "clift-1978": {
    cite: "Clift, R.; Grace, J.R.; Weber, M.E. Bubbles, Drops and Particles, Academic Press (1978)",
  },
  "cobb-saunders-1956": {
    cite: "Cobb, E.C.; Saunders, O.A. Proc. Royal Society A 236 (1956) 343-351",
  },
  "colburn-1933": {
    cite: "Colburn, A.P. Trans. AIChE 29 (1933) 174-210; Chilton, T.H.; Colburn, A.P. Ind. Eng. Chem. 26 (1934) 1183-1187",
  },
  "colebrook-1939": {
    cite: "Colebrook, C.F. J. Inst. Civil Engrs 11 (1939) 133-156",
  },
  "cragoe-1929": {
    cite: "C. S. Cragoe, Thermal Properties of Petroleum Products, Miscellaneous Publication 97, National Bureau of Standards, 1929",
  },
  "depew-august-1971": {
    cite: "Depew, C.A.; August, S.E. J. Heat Transfer 93 (1971) 380-386",
  },
  "dipprey-sabersky-1963": {
    cite: "Dipprey, D.F.; Sabersky, R.H. Int. J. Heat Mass Transfer 6 (1963) 329-353",
  },
  "dittus-boelter-1930": {
    cite: "Dittus, F.W.; Boelter, L.M.K. Univ. California Publ. Eng. 2 (1930) 443-461; McAdams, W.H. Heat Transmission, 2nd ed., McGraw-Hill (1942)",
  },
  "dorfman-1963": {
    cite: "Dorfman, L.A. Hydrodynamic Resistance and Heat Loss of Rotating Solids, Oliver & Boyd (1963)",
  },
  "dropkin-carmi-1957": {
    cite: "Dropkin, D.; Carmi, A. Trans. ASME 79 (1957) 741-749",
  },
  "eckert-1942": {
    cite: "Eckert, E.R.G. VDI-Forschungsheft 416 (1942)",
  },
  "eckert-1955": {
    cite: "Eckert, E.R.G. J. Aeronautical Sciences 22 (1955) 585-587",
  },
  "eckert-1956": {
    cite: "Eckert, E.R.G. Trans. ASME 78 (1956) 1273-1283",
  },
  "eckert-drake-1972": {
    cite: "Eckert, E.R.G.; Drake, R.M. Analysis of Heat and Mass Transfer, McGraw-Hill (1972)",
  },
  "eckert-jackson-1951": {
    cite: "Eckert, E.R.G.; Jackson, T.W. NACA Report 1015 (1951)",
  },
  "ede-1967": {
    cite: "Ede, A.J. Advances in Heat Transfer 4 (1967) 1-64",
  },
  "ergun-1952": {
    cite: "Ergun, S. Chem. Eng. Progress 48 (1952) 89-94",
  },
  "etemad-anderson-1955": {
    cite: "Etemad, G.A. Trans. ASME 77 (1955) 1283-1289; Anderson, J.T.; Saunders, O.A. Proc. Royal Society A 217 (1953) 555-562",
  },
  "eubank-proctor-1951": {
    cite: "Eubank, C.C.; Proctor, W.S. S.M. thesis, Massachusetts Institute of Technology (1951)",
  },
  "fand-1965": {
    cite: "Fand, R.M. Int. J. Heat Mass Transfer 8 (1965) 995-1010",
  },
  "fand-brucker-1983": {
    cite: "Fand, R.M.; Brucker, J. Int. J. Heat Mass Transfer 26 (1983) 723-726",
  },
  "fand-morris-1977": {
    cite: "Fand, R.M.; Morris, E.W.; Lum, M. Int. J. Heat Mass Transfer 20 (1977) 1173-1184",
  },
  "fink-leibowitz-1995": {
    cite: "J. K. Fink, L. Leibowitz, Thermodynamic and transport properties of sodium liquid and vapor, ANL/RE-95/2, Argonne National Laboratory, 1995",
  },
  "foust-1972": {
    cite: "O. J. Foust (ed.), Sodium-NaK Engineering Handbook, vol. 1, Gordon and Breach, New York, 1972",
  },
  "fujii-fujii-1976": {
    cite: "Fujii, T.; Fujii, M. Int. J. Heat Mass Transfer 19 (1976) 121-122; solution: Sparrow, E.M.; Gregg, J.L. Trans. ASME 78 (1956) 435-440",
  },
  "fujii-imura-1972": {
    cite: "Fujii, T.; Imura, H. Int. J. Heat Mass Transfer 15 (1972) 755-767",
  },
  "gaddis-gnielinski-1985": {
    cite: "Gaddis, E.S.; Gnielinski, V. Int. Chem. Eng. 25 (1985) 1-15",
  },
  "garcia-vicente-2005": {
    cite: "Garcia, A.; Vicente, P.G.; Viedma, A. Int. J. Heat Mass Transfer 48 (2005) 4640-4651",
  },
  "gnielinski-1975-bodies": {
    cite: "Gnielinski, V. Forsch. Ing.-Wes. 41 (1975) 145-153",
  },
  "gnielinski-1976": {
    cite: "Gnielinski, V. Int. Chem. Eng. 16 (1976) 359-368 (Forsch. Ing.-Wes. 41 (1975) 8-16)",
  },
  "gnielinski-1978": {
    cite: "Gnielinski, V. Forsch. Ing.-Wes. 44 (1978) 15-25",
  },
  "gnielinski-1982": {
    cite: "Gnielinski, V. Verfahrenstechnik 16 (1982) 36-39",
  },
  "gnielinski-1986": {
    cite: "Gnielinski, V. Proc. 8th Int. Heat Transfer Conf., San Francisco 6 (1986) 2847-2854",
  },
  "gnielinski-2009": {
    cite: "Gnielinski, V. Heat Transfer Engineering 30 (2009) 431-436",
  },
  "gnielinski-2013": {
    cite: "Gnielinski, V. Int. J. Heat Mass Transfer 63 (2013) 134-140",
  },
  "goldstein-sparrow-1973": {
    cite: "Goldstein, R.J.; Sparrow, E.M.; Jones, D.C. Int. J. Heat Mass Transfer 16 (1973) 1025-1035",
  },
  "grimison-1937": {
    cite: "Grimison, E.D. Trans. ASME 59 (1937) 583-594",
  },
  "gupta-1974": {
    cite: "Gupta, S.N.; Chaube, R.B.; Upadhyay, S.N. Chem. Eng. Science 29 (1974) 839-843",
  },
  "haaland-1983": {
    cite: "Haaland, S.E. J. Fluids Engineering 105 (1983) 89-90",
  },
  "hagen-poiseuille": {
    cite: "Hagen, G. Poggendorff's Annalen 46 (1839) 423-442; Poiseuille, J.L.M. Comptes rendus 11 (1840) 961-967",
  },
  "hallman-1956": {
    cite: "Hallman, T.M. Trans. ASME 78 (1956) 1831-1841; Aung, W. in Handbook of Single-Phase Convective Heat Transfer (Kakac, Shah, Aung), Wiley (1987), ch. 15",
  },
  "handbook-from-memory": {
    cite: "Usual handbook value, from memory",
  },
  "hatfield-edwards-1981": {
    cite: "Hatfield, D.W.; Edwards, D.K. Int. J. Heat Mass Transfer 24 (1981) 1019-1024",
  },
  "hausen-1943": {
    cite: "Hausen, H. Z. VDI Beih. Verfahrenstechnik 4 (1943) 91-98",
  },
  "hausen-1959": {
    cite: "Hausen, H. Allg. Wärmetechnik 9 (1959) 75-79",
  },
  "hausen-1983": {
    cite: "Hausen, H. Heat Transfer in Counterflow, Parallel Flow and Cross Flow, McGraw-Hill (1983)",
  },
  "hilpert-1933": {
    cite: "Hilpert, R. Forsch. Ing.-Wes. 4 (1933) 215-224",
  },
  "hyland-wexler-1983": {
    cite: "R. W. Hyland, A. Wexler, Formulations for the thermodynamic properties of dry air and of moist air in equilibrium with liquid water, ASHRAE Trans. 89 (1983) 520-535",
  },
  "hyman-bonilla-1953": {
    cite: "Hyman, S.C.; Bonilla, C.F.; Ehrlich, S.W. Chem. Eng. Progress Symp. Ser. 49 (1953) No. 5, 21-33",
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
  "iso-12241": {
    cite: "EN ISO 12241 (ISO 12241:2008), Thermal insulation for building equipment and industrial installations, Calculation rules",
  },
  "iso-3448": {
    cite: "ISO 3448, Industrial liquid lubricants: ISO viscosity classification",
  },
  "iso-6946": {
    cite: "ISO 6946:2017, Building components and building elements, Thermal resistance and thermal transmittance, Calculation methods",
  },
  "ito-1959": {
    cite: "Ito, H. J. Basic Engineering 81 (1959) 123-134",
  },
  "ito-1960": {
    cite: "Ito, H. J. Basic Engineering 82 (1960) 131-143",
  },
  "jackson-2013": {
    cite: "Jackson, J.D. Nuclear Eng. Design 264 (2013) 24-40; Jackson, J.D.; Hall, W.B. in Turbulent Forced Convection in Channels and Bundles, Hemisphere (1979)",
  },
  "jackson-cotton-1989": {
    cite: "Jackson, J.D.; Cotton, M.A.; Axcell, B.P. Int. J. Heat and Fluid Flow 10 (1989) 2-15",
  },
  "jakob-1949": {
    cite: "Jakob, M. Heat Transfer, vol. 1, Wiley (1949)",
  },
  "jamieson-1969": {
    cite: "D. T. Jamieson et al., Physical properties of sea water solutions: heat capacity, Desalination 7 (1969) 23-30",
  },
  "jamieson-tudhope-1970": {
    cite: "D. T. Jamieson, J. S. Tudhope, Physical properties of sea water solutions: thermal conductivity, Desalination 8 (1970) 393-401",
  },
  "jeschke-1925": {
    cite: "Jeschke, D. Z. VDI Ergänzungsheft 24 (1925) 1-10",
  },
  "jones-1976": {
    cite: "Jones, O.C. J. Fluids Engineering 98 (1976) 173-181",
  },
  "juerges-1924": {
    cite: "Jürges, W. Beihefte zum Gesundheits-Ingenieur 1 (19) (1924); McAdams, W.H. Heat Transmission, 3rd ed., McGraw-Hill (1954)",
  },
  "karman-1921": {
    cite: "von Kármán, T. Z. angew. Math. Mech. 1 (1921) 233-252; Cochran, W.G. Proc. Cambridge Phil. Soc. 30 (1934) 365-375",
  },
  "kays-crawford": {
    cite: "Kays, W.M.; Crawford, M.E. Convective Heat and Mass Transfer, McGraw-Hill",
  },
  "king-1932": {
    cite: "King, W.J. Mechanical Engineering 54 (1932) 347-353; doubt: Sparrow, E.M.; Ansari, M.A. Int. J. Heat Mass Transfer 26 (1983) 1357-1364",
  },
  "kirillov-ushakov-2001": {
    cite: "Kirillov, P.L.; Ushakov, P.A. Thermal Engineering 48 (2001) 50-59, 127-133",
  },
  "konakov-1946": {
    cite: "Konakov, P.K. Dokl. Akad. Nauk SSSR 51 (1946) 503-506",
  },
  "kramers-1946": {
    cite: "Kramers, H. Physica 12 (1946) 61-80",
  },
  "kuehn-goldstein-1976": {
    cite: "Kuehn, T.H.; Goldstein, R.J. Int. J. Heat Mass Transfer 19 (1976) 1127-1134",
  },
  "le-fevre-1956": {
    cite: "Le Fevre, E.J. Proc. 9th Int. Congress of Applied Mechanics, Brussels 4 (1956) 168-174",
  },
  "le-fevre-ede-1956": {
    cite: "Le Fevre, E.J.; Ede, A.J. Proc. 9th Int. Congress of Applied Mechanics, Brussels 4 (1956) 175-183",
  },
  "lienhard-1973": {
    cite: "Lienhard, J.H. Int. J. Heat Mass Transfer 16 (1973) 2121-2123",
  },
  "lienhard-2020": {
    cite: "Lienhard, J.H. J. Heat Transfer 142 (2020) 061805",
  },
  "lloyd-moran-1974": {
    cite: "Lloyd, J.R.; Moran, W.R. J. Heat Transfer 96 (1974) 443-447",
  },
  "lubarsky-kaufman-1955": {
    cite: "Lubarsky, B.; Kaufman, S.J. NACA TN 3336 (1955), Report 1270 (1956)",
  },
  "lundberg-1963": {
    cite: "Lundberg, R.E.; McCuen, P.A.; Reynolds, W.C. Int. J. Heat Mass Transfer 6 (1963) 495-529",
  },
  "lyon-1951": {
    cite: "Lyon, R.N. Chem. Eng. Progress 47 (1951) 75-79",
  },
  "manglik-bergles-1993-laminar": {
    cite: "Manglik, R.M.; Bergles, A.E. J. Heat Transfer 115 (1993) 881-889",
  },
  "manglik-bergles-1993-turbulent": {
    cite: "Manglik, R.M.; Bergles, A.E. J. Heat Transfer 115 (1993) 890-896",
  },
  "manlapaz-churchill-1980": {
    cite: "Manlapaz, R.L.; Churchill, S.W. Chem. Eng. Communications 7 (1980) 57-78",
  },
  "manlapaz-churchill-1981": {
    cite: "Manlapaz, R.L.; Churchill, S.W. Chem. Eng. Communications 9 (1981) 185-200",
  },
  "mas-de-les-valls-2008": {
    cite: "I. Mas de les Valls et al., Lead-lithium eutectic material database for nuclear fusion technology, J. Nucl. Mater. 376 (2008) 353-357",
  },
  "mason-saxena-1958": {
    cite: "E. A. Mason, S. C. Saxena, Approximate formula for the thermal conductivity of gas mixtures, Phys. Fluids 1 (1958) 361-369",
  },
  "mcadams-1954": {
    cite: "McAdams, W.H. Heat Transmission, 3rd ed., McGraw-Hill (1954)",
  },
  "mcbride-2002": {
    cite: "B. J. McBride, M. J. Zehe, S. Gordon, NASA Glenn Coefficients for Calculating Thermodynamic Properties of Individual Species, NASA/TP-2002-211556, 2002",
  },
  "mceligot-magee-1965": {
    cite: "McEligot, D.M.; Magee, P.M.; Leppert, G. J. Heat Transfer 87 (1965) 67-76",
  },
  "melinder-2010": {
    cite: "Å. Melinder, Properties of Secondary Working Fluids for Indirect Systems, International Institute of Refrigeration, 2nd ed., Paris, 2010",
  },
  "merk-prins-1953": {
    cite: "Merk, H.J.; Prins, J.A. Appl. Sci. Res. A4 (1953-54) 11-24, 195-206, 207-221",
  },
  "metais-eckert-1964": {
    cite: "Metais, B.; Eckert, E.R.G. J. Heat Transfer 86 (1964) 295-296",
  },
  "millero-1978": {
    cite: "F. J. Millero, Freezing point of sea water, in Eighth report of the joint panel on oceanographic tables and standards, UNESCO Technical Papers in Marine Science 28, 1978 (coefficients from memory)",
  },
  "mills-hang-1983": {
    cite: "Mills, A.F.; Hang, X. J. Fluids Engineering 105 (1983) 364-365",
  },
  "mogahed-1995": {
    cite: "E. A. Mogahed, G. L. Kulcinski, Bibliography of a promising tritium breeding material Pb83Li17, UWFDM-994, University of Wisconsin, 1995",
  },
  "mokry-pioro-2011": {
    cite: "Mokry, S.; Pioro, I.; Farah, A.; King, K.; Gupta, S.; Peiman, W.; Kirillov, P. Nuclear Eng. Design 241 (2011) 1126-1136",
  },
  "morgan-1975": {
    cite: "Morgan, V.T. Advances in Heat Transfer 11 (1975) 199-264",
  },
  "mori-nakayama-1967": {
    cite: "Mori, Y.; Nakayama, W. Int. J. Heat Mass Transfer 10 (1967) 37-59",
  },
  "nakai-okazaki-1975": {
    cite: "Nakai, S.; Okazaki, T. Int. J. Heat Mass Transfer 18 (1975) 387-396",
  },
  "nayar-2016": {
    cite: "K. G. Nayar, M. H. Sharqawy, L. D. Banchik, J. H. Lienhard V, Thermophysical properties of seawater: a review and new correlations that include pressure dependence, Desalination 390 (2016) 1-24",
  },
  "norris-1971": {
    cite: "Norris, R.H. Augmentation of Convective Heat and Mass Transfer, ASME (1971) 16-26",
  },
  "notter-sleicher-1972": {
    cite: "Notter, R.H.; Sleicher, C.A. Chem. Eng. Science 27 (1972) 2073-2093",
  },
  "nusselt-1931": {
    cite: "Nusselt, W. Forsch. Ing.-Wes. 2 (1931) 309",
  },
  "oecd-nea-2015": {
    cite: "OECD/NEA, Handbook on Lead-bismuth Eutectic Alloy and Lead Properties, Materials Compatibility, Thermal-hydraulics and Technologies, 2015 edition",
  },
  "oliver-1962": {
    cite: "Oliver, D.R. Chem. Eng. Science 17 (1962) 335-350",
  },
  "oosthuizen-madan-1970": {
    cite: "Oosthuizen, P.H.; Madan, S. J. Heat Transfer 92 (1970) 194-196",
  },
  "open-metal-data": {
    cite: "Polynomials of an open data collection for mercury, source not stated there",
  },
  "perkins-leppert-1962": {
    cite: "Perkins, H.C.; Leppert, G. J. Heat Transfer 84 (1962) 257-261",
  },
  "perkins-leppert-1964": {
    cite: "Perkins, H.C.; Leppert, G. Int. J. Heat Mass Transfer 7 (1964) 143-158",
  },
  "petukhov-1970": {
    cite: "Petukhov, B.S. Advances in Heat Transfer 6 (1970) 503-564",
  },
  "petukhov-popov-1963": {
    cite: "Petukhov, B.S.; Popov, V.N. High Temperature 1 (1963) 69-83",
  },
  "petukhov-roizen-1964": {
    cite: "Petukhov, B.S.; Roizen, L.I. High Temperature 2 (1964) 65-68",
  },
  "pimenta-1975": {
    cite: "Pimenta, M.M.; Moffat, R.J.; Kays, W.M. Stanford University report HMT-21 (1975)",
  },
  "pohlhausen-1921": {
    cite: "Pohlhausen, E. Z. angew. Math. Mech. 1 (1921) 115-121",
  },
  "popiel-2007": {
    cite: "Popiel, C.O.; Wojtkowiak, J.; Bober, K. Exp. Thermal and Fluid Science 32 (2007) 607-613; solution: Cebeci, T. Proc. 5th Int. Heat Transfer Conf., Tokyo 3 (1974) 15-19",
  },
  "popiel-boguslawski-1975": {
    cite: "Popiel, C.O.; Boguslawski, L. Int. J. Heat Mass Transfer 18 (1975) 170-173",
  },
  "quench-oil-typical-values": {
    cite: "Published typical values of quenching oils, common practice, from memory",
  },
  "radziemska-lewandowski-2001": {
    cite: "Radziemska, E.; Lewandowski, W.M. Applied Energy 68 (2001) 347-366",
  },
  "raithby-hollands-1975": {
    cite: "Raithby, G.D.; Hollands, K.G.T. Advances in Heat Transfer 11 (1975) 265-315",
  },
  "raithby-hollands-1998": {
    cite: "Raithby, G.D.; Hollands, K.G.T. in Handbook of Heat Transfer, 3rd ed. (Rohsenow, Hartnett, Cho), McGraw-Hill (1998), ch. 4",
  },
  "ranz-marshall-1952": {
    cite: "Ranz, W.E.; Marshall, W.R. Chem. Eng. Progress 48 (1952) 141-146, 173-180",
  },
  "reynolds-kays-1958": {
    cite: "Reynolds, W.C.; Kays, W.M.; Kline, S.J. NASA Memo 12-3-58W (1958)",
  },
  "rich-1953": {
    cite: "Rich, B.R. Trans. ASME 75 (1953) 489-499",
  },
  "rohsenow-1998": {
    cite: "Rohsenow, W.M.; Hartnett, J.P.; Cho, Y.I. (eds.) Handbook of Heat Transfer, 3rd ed., McGraw-Hill (1998)",
  },
  "romatoski-hu-2017": {
    cite: "R. R. Romatoski, L. W. Hu, Fluoride salt coolant properties for nuclear reactor applications: a review, Annals of Nuclear Energy 109 (2017) 635-647",
  },
  "rotem-claassen-1969": {
    cite: "Rotem, Z.; Claassen, L. J. Fluid Mechanics 39 (1969) 173-192; Stewartson, K. Z. angew. Math. Phys. 9a (1958) 276-282 with the sign put right by Gill, Zeh and del Casal",
  },
  "sandall-hanna-1980": {
    cite: "Sandall, O.C.; Hanna, O.T.; Mazet, P.R. Can. J. Chem. Eng. 58 (1980) 443-447",
  },
  "sanitjai-goldstein-2004": {
    cite: "Sanitjai, S.; Goldstein, R.J. Int. J. Heat Mass Transfer 47 (2004) 4795-4805",
  },
  schlichting: {
    cite: "Schlichting, H. Boundary-Layer Theory, McGraw-Hill",
  },
  "schmidt-1967": {
    cite: "Schmidt, E.F. Chem.-Ing.-Techn. 39 (1967) 781-789",
  },
  "schultz-grunow-1940": {
    cite: "Schultz-Grunow, F. Luftfahrtforschung 17 (1940) 239 (NACA TM 986)",
  },
  "schulz-1991": {
    cite: "B. Schulz, Thermophysical properties of the Li(17)Pb(83) alloy, Fusion Eng. Des. 14 (1991) 199-205",
  },
  "seban-mclaughlin-1963": {
    cite: "Seban, R.A.; McLaughlin, E.F. Int. J. Heat Mass Transfer 6 (1963) 387-395",
  },
  "seban-shimazaki-1951": {
    cite: "Seban, R.A.; Shimazaki, T.T. Trans. ASME 73 (1951) 803-809",
  },
  "shah-1975": {
    cite: "Shah, R.K. Proc. 3rd Nat. Heat Mass Transfer Conf., Bombay (1975), paper HMT-11-75; Shah, R.K.; London, A.L. Laminar Flow Forced Convection in Ducts, Academic Press (1978)",
  },
  "shah-1978": {
    cite: "Shah, R.K. J. Fluids Engineering 100 (1978) 177-179",
  },
  "shah-london-1978": {
    cite: "Shah, R.K.; London, A.L. Laminar Flow Forced Convection in Ducts, Academic Press (1978)",
  },
  "sharqawy-2010": {
    cite: "M. H. Sharqawy, J. H. Lienhard V, S. M. Zubair, Thermophysical properties of seawater: a review of existing correlations and data, Desalination and Water Treatment 16 (2010) 354-380",
  },
  "sieder-tate-1936": {
    cite: "Sieder, E.N.; Tate, G.E. Ind. Eng. Chem. 28 (1936) 1429-1435",
  },
  "silicone-typical-values": {
    cite: "Suppliers' typical values for polydimethylsiloxane by viscosity grade, common practice, from memory",
  },
  "skupinski-tortel-1965": {
    cite: "Skupinski, E.; Tortel, J.; Vautrey, L. Int. J. Heat Mass Transfer 8 (1965) 937-951",
  },
  "sleicher-1973": {
    cite: "Sleicher, C.A.; Awad, A.S.; Notter, R.H. Int. J. Heat Mass Transfer 16 (1973) 1565-1575",
  },
  "sleicher-rouse-1975": {
    cite: "Sleicher, C.A.; Rouse, M.W. Int. J. Heat Mass Transfer 18 (1975) 677-683",
  },
  "sohal-2010": {
    cite: "M. S. Sohal et al., Engineering Database of Liquid Salt Thermophysical and Thermochemical Properties, INL/EXT-10-18297, Idaho National Laboratory, 2010",
  },
  "sparrow-2004": {
    cite: "Sparrow, E.M.; Abraham, J.P.; Tong, J.C.K. Int. J. Heat Mass Transfer 47 (2004) 5285-5296",
  },
  "sparrow-gregg-1956-cylinder": {
    cite: "Sparrow, E.M.; Gregg, J.L. Trans. ASME 78 (1956) 1823-1829; Minkowycz, W.J.; Sparrow, E.M. J. Heat Transfer 96 (1974) 178-183",
  },
  "srinivasan-nandapurkar-1970": {
    cite: "Srinivasan, P.S.; Nandapurkar, S.S.; Holland, F.A. Trans. Inst. Chem. Engrs 48 (1970) T156-T161",
  },
  "stephan-1959": {
    cite: "Stephan, K. Chem.-Ing.-Techn. 31 (1959) 773-778",
  },
  "stephan-1962": {
    cite: "Stephan, K. Chem.-Ing.-Techn. 34 (1962) 207-212",
  },
  sukhatme: {
    cite: "Sukhatme, S.P. A Textbook on Heat Transfer, Universities Press",
  },
  "supplier-typical-values": {
    cite: "Suppliers' typical values for heat-transfer liquids of this chemistry, fitted by an open property library; no product is meant",
  },
  "svehla-1995": {
    cite: "R. A. Svehla, Transport Coefficients for the NASA Lewis Chemical Equilibrium Program, NASA TM-4647, 1995",
  },
  "swamee-jain-1976": {
    cite: "Swamee, P.K.; Jain, A.K. J. Hydraulics Div. ASCE 102 (1976) 657-664",
  },
  "tachibana-fukui-1960": {
    cite: "Tachibana, F.; Fukui, S.; Mitsumura, H. Bull. JSME 3 (1960) 119-123",
  },
  "taylor-1923": {
    cite: "Taylor, G.I. Phil. Trans. Royal Society A 223 (1923) 289-343",
  },
  "taylor-1968": {
    cite: "Taylor, M.F. NASA TN D-4332 (1968)",
  },
  "vliet-1969": {
    cite: "Vliet, G.C. J. Heat Transfer 91 (1969) 511-516; Vliet, G.C.; Ross, D.C. J. Heat Transfer 97 (1975) 549-555",
  },
  "vliet-leppert-1961": {
    cite: "Vliet, G.C.; Leppert, G. J. Heat Transfer 83 (1961) 163-175",
  },
  "vliet-liu-1969": {
    cite: "Vliet, G.C.; Liu, C.K. J. Heat Transfer 91 (1969) 517-531",
  },
  "vliet-ross-1975": {
    cite: "Vliet, G.C.; Ross, D.C. J. Heat Transfer 97 (1975) 549-555",
  },
  "wakao-kaguei-1979": {
    cite: "Wakao, N.; Kaguei, S.; Funazkri, T. Chem. Eng. Science 34 (1979) 325-336",
  },
  "warner-arpaci-1968": {
    cite: "Warner, C.Y.; Arpaci, V.S. Int. J. Heat Mass Transfer 11 (1968) 397-406",
  },
  "watmuff-charters-1977": {
    cite: "Watmuff, J.H.; Charters, W.W.S.; Proctor, D. COMPLES Rev. Int. Heliotechnique 2 (1977) 56",
  },
  "webb-1971": {
    cite: "Webb, R.L. Wärme- und Stoffübertragung 4 (1971) 197-204",
  },
  "whitaker-1972": {
    cite: "Whitaker, S. AIChE Journal 18 (1972) 361-371",
  },
  "white-1929": {
    cite: "White, C.M. Proc. Royal Society A 123 (1929) 645-663",
  },
  "white-viscous-flow": {
    cite: "White, F.M. Viscous Fluid Flow, McGraw-Hill",
  },
  "wilke-1950": {
    cite: "C. R. Wilke, A viscosity equation for gas mixtures, J. Chem. Phys. 18 (1950) 517-519",
  },
  "witte-1968": {
    cite: "Witte, L.C. J. Heat Transfer 90 (1968) 9-12",
  },
  "yang-1985": {
    cite: "Yang, S.M. Proc. 8th Int. Heat Transfer Conf., San Francisco (1985)",
  },
  "yazdanian-klems-1994": {
    cite: "Yazdanian, M.; Klems, J.H. ASHRAE Trans. 100 (1) (1994) 1087-1096",
  },
  "yovanovich-1987": {
    cite: "Yovanovich, M.M. AIAA paper 87-1643 (1987)",
  },
  "yuge-1960": {
    cite: "Yuge, T. J. Heat Transfer 82 (1960) 214-220",
  },
  "zavoico-2001": {
    cite: "A. B. Zavoico, Solar Power Tower Design Basis Document, SAND2001-2100, Sandia National Laboratories, 2001",
  },
  "zhukauskas-ambrazyavichyus-1961": {
    cite: "Zhukauskas, A.A.; Ambrazyavichyus, A.B. Int. J. Heat Mass Transfer 3 (1961) 305-309",
  },
  "zukauskas-1972": {
    cite: "Zukauskas, A. Advances in Heat Transfer 8 (1972) 93-160",
  },
  "zukauskas-1987": {
    cite: "Zukauskas, A. in Handbook of Single-Phase Convective Heat Transfer (Kakac, Shah, Aung), Wiley (1987), ch. 6",
  },
  "zukauskas-ulinskas-1988": {
    cite: "Zukauskas, A.; Ulinskas, R. Heat Transfer in Tube Banks in Crossflow, Hemisphere (1988); Heat Exchanger Design Handbook, sect. 2.2.4",
  },
} as const satisfies Record<string, Work>;

export type WorkKey = keyof typeof bibliography;
