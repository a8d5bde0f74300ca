/** Every work that a correlation, a table or a fluid record cites: full citation text under a short key, keys in alphabetical order. */

export interface Work {
  readonly cite: string;
}

export const bibliography = {
  "achenbach-1978": {
    cite: "Achenbach, E. Proc. 6th Int. Heat Transfer Conf., Toronto 5 (1978) 341-346",
  },
  "akasaka-2015-jpcrd-r245fa": {
    cite: "Ryo Akasaka; Yong Zhou; Eric W. Lemmon, A Fundamental Equation of State for 1,1,1,3,3-Pentafluoropropane (R-245fa), J. Phys. Chem. Ref. Data, vol. 44, 2015, p. 013104, doi:10.1063/1.4913493",
  },
  "akasaka-2019-jced": {
    cite: "Ryo Akasaka; Eric Lemmon, New Fundamental Equations of State for cis-1,3,3,3-Tetrafluoropropene [R-1234ze(Z)] and 3,3,3-Trifluoropropene (R-1243zf), J. Chem. Eng. Data",
  },
  "akasaka-2023-ijt": {
    cite: "Ryo Akasaka; Marcia L. Huber; Luke Simoni; Eric W. Lemmon, A Helmholtz Energy Equation of State for trans-1,1,1,4,4,4-Hexafluoro-2-butene [R-1336mzz(E)], International Journal of Thermophysics, vol. 44, 2023, p. 1003-1013, doi:10.1007/s10765-022-03143-5",
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
  "arp-1998-nist": {
    cite: "V. D. Arp, R. D. McCarty, D. G. Friend, Thermophysical properties of helium-4 from 0.8 to 1500 K with pressures to 2000 MPa, NIST Technical Note 1334 (revised), 1998",
  },
  "ashrae-2001": {
    cite: "ASHRAE Handbook of Fundamentals, Physical properties of secondary coolants, American Society of Heating, Refrigerating and Air-Conditioning Engineers, Atlanta, 2001",
  },
  "assael-2010-metals": {
    cite: "M. J. Assael et al., Reference data for the density and viscosity of liquid copper and tin, J. Phys. Chem. Ref. Data 39 (2010) 033105",
  },
  "assael-2011-jpcrd-hydrogen": {
    cite: "M. J. Assael, J.-A. M. Assael, M. L. Huber, R. A. Perkins, Y. Takata, Correlation of the thermal conductivity of normal and parahydrogen from the triple point to 1000 K and up to 100 MPa, J. Phys. Chem. Ref. Data 40 (2011) 033101",
  },
  "assael-2012-jpcrd-benzene": {
    cite: "M.J. Assael; E. Mihailidou; M.L. Huber; R.A. Perkins, Reference Correlation of the Thermal Conductivity of Benzene from the Triple Point to 725 K and up to 500 MPa, J. Phys. Chem. Ref. Data, vol. 41, 2012, p. 043102-1:9, doi:10.1063/1.4755781",
  },
  "assael-2012-jpcrd-sf6": {
    cite: "M. J. Assael; I. A. Koini; K. D. Antoniadis; M. L. Huber et al., Reference Correlation of the Thermal Conductivity of Sulfur Hexafluoride from the Triple Point to 1000 K and up to 150 MPa, J. Phys. Chem. Ref. Data, vol. 41, 2012, p. 023104-1:9, doi:10.1063/1.4708620",
  },
  "assael-2012-jpcrd-toluene": {
    cite: "M. J. Assael; S. K. Mylona; M. L. Huber; R. A. Perkins, Reference Correlation of the Thermal Conductivity of Toluene from the Triple Point to 1000 K and up to 1000 MPa, J. Phys. Chem. Ref. Data, vol. 41, 2012, p. 023101-1:12, doi:10.1063/1.3700155",
  },
  "assael-2012-metals": {
    cite: "M. J. Assael et al., Reference data for the density and viscosity of liquid cadmium, cobalt, gallium, indium, mercury, silicon, thallium, and zinc, J. Phys. Chem. Ref. Data 41 (2012) 033101",
  },
  "assael-2013-jpcrd-ethanol": {
    cite: "M. J. Assael; E. A. Sykioti; M. L. Huber; R. A. Perkins, Reference Correlation of the Thermal Conductivity of Ethanol from the Triple Point to 600 K and up to 245 MPa, J. Phys. Chem. Ref. Data, vol. 42, 2013, p. 023102-1:10, doi:10.1063/1.4797368",
  },
  "assael-2013-jpcrd-heptane": {
    cite: "M. J. Assael; I. Bogdanou; S. K. Mylona; M. L. Huber et al., Reference Correlation of the Thermal Conductivity of n-Heptane from the Triple Point to 600 K and up to 250 MPa, J. Phys. Chem. Ref. Data, vol. 42, 2013, p. 023101-1:9, doi:10.1063/1.4794091",
  },
  "assael-2013-jpcrd-hexane": {
    cite: "M. J. Assael; S. K. Mylona; Ch. A. Tsiglifisi; M. L. Huber et al., Reference Correlation of the Thermal Conductivity of n-Hexane from the Triple Point to 600 K and up to 500 MPa, J. Phys. Chem. Ref. Data, vol. 42, 2013, p. 013106-1:8, doi:10.1063/1.4793335",
  },
  "assael-2016": {
    cite: "M. J. Assael et al., Reference correlations of the thermal conductivity of ethene and propene, J. Phys. Chem. Ref. Data 45 (2016) 033104",
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
  "avgeri-2014-jpcrd-benzene": {
    cite: "S. Avgeri; M. J. Assael; M. L. Huber; R. A. Perkins, Reference Correlation of the Viscosity of Benzene from the Triple Point to 675 K and up to 300 MPa, J. Phys. Chem. Ref. Data, vol. 43, 2014, p. 033103, doi:10.1063/1.4892935",
  },
  "avgeri-2015-jpcrd-toluene": {
    cite: "S. Avgeri; M. J. Assael; M. L. Huber; R. A. Perkins, Reference Correlation of the Viscosity of Toluene from the Triple Point to 675 K and up to 500 MPa, J. Phys. Chem. Ref. Data, vol. 44, 2015, p. 033101, doi:10.1063/1.4926955",
  },
  "baehr-stephan": {
    cite: "Baehr, H.D.; Stephan, K. Heat and Mass Transfer, Springer",
  },
  "barreiros-1982-jct": {
    cite: "Susane F. Barreiros; Jorge C. G. Calado; Manuel Nunes da Ponte, The Melting Curves of Carbon Monoxide, J. Chem. Thermodyn., vol. 14, 1982, p. 1197-1198, doi:10.1016/0021-9614(82)90044-1",
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
  "beckmueller-2019-ijt-octane": {
    cite: "R. Beckmueller; M. Thol; E.W. Lemmon; R. Span, Fundamental Equation of State for n-Octane, Int. J. Therrmophys.",
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
  "buecker-2006-jpcrd": {
    cite: "D. Buecker; W. Wagner, A Reference Equation of State for the Thermodynamic Properties of Ethane for Temperatures from the Melting Line to 675 K and Pressures up to 900 MPa, J. Phys. Chem. Ref. Data, vol. 35, 2006, p. 205-266, doi:10.1063/1.1859286",
  },
  "buecker-jpcrd-2006b": {
    cite: "D. Buecker; W. Wagner, Reference Equations of State for the Thermodynamic Properties of Fluid Phase n-Butane and Isobutane, J. Phys. Chem. Ref. Data, vol. 35, 2006, p. 929-1019, doi:10.1063/1.1901687",
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
  "chung-1988-iecr": {
    cite: "Chung, Ting Horng; Ajlan, Mohammad; Lee, Lloyd L; Starling, Kenneth E, Generalized multiparameter correlation for nonpolar and polar fluid transport properties, Ind. Eng. Chem. Res., vol. 27, 1988, p. 671--679, doi:10.1021/ie00076a024",
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
  "dereuck-1990-book": {
    cite: "K. M. de Reuck, Fluorine: International Thermodynamic Tables of the Fluid State - 11, Blackwell Scientific Publications, Oxford, United Kingdom, 1990",
  },
  "dereuck-1993-book": {
    cite: "K. M. de Reuck; R. J. B. Craven, Methanol: International Thermodynamic Tables of the Fluid State - 12, Blackwell Scientific Publications, Oxford, United Kingdom, 1993",
  },
  "devries-1995-icr": {
    cite: "B. de Vries; R. Tillner-Roth; H.D. Baehr, Thermodynamic Properties of HCFC 124, 19th International Congress of Refrigeration, The Hague, The Netherlands, 1995, p. 582-589",
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
  "fenghour-1995-jpcrd": {
    cite: "A. Fenghour, W. A. Wakeham, V. Vesovic, J. T. R. Watson, J. Millat, E. Vogel, The viscosity of ammonia, J. Phys. Chem. Ref. Data 24 (1995) 1649-1667",
  },
  "fink-leibowitz-1995": {
    cite: "J. K. Fink, L. Leibowitz, Thermodynamic and transport properties of sodium liquid and vapor, ANL/RE-95/2, Argonne National Laboratory, 1995",
  },
  "foust-1972": {
    cite: "O. J. Foust (ed.), Sodium-NaK Engineering Handbook, vol. 1, Gordon and Breach, New York, 1972",
  },
  "friend-1989-jpcrd": {
    cite: "D. G. Friend, J. F. Ely, H. Ingham, Thermophysical properties of methane, J. Phys. Chem. Ref. Data 18 (1989) 583-638",
  },
  "friend-1991-jpcrd": {
    cite: "Daniel G. Friend; Hepburn Ingham; James F. Ely, Thermophysical Properties of Ethane, J. Phys. Chem. Ref. Data, vol. 20, 1991, p. 275-347, doi:10.1063/1.555881",
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
  "gao-2016-jced": {
    cite: "Kehui Gao; Jiangtao Wu; Penggang Zhang; Eric W. Lemmon, A Helmholtz Energy Equation of State for Sulfur Dioxide, J. Chem. Eng. Data, 2016",
  },
  "gao-2023-jpcrd": {
    cite: "K. Gao, J. Wu, I. H. Bell, A. H. Harvey, E. W. Lemmon, A reference equation of state with an associating term for the thermodynamic properties of ammonia, J. Phys. Chem. Ref. Data 52 (2023) 013102",
  },
  "garcia-vicente-2005": {
    cite: "Garcia, A.; Vicente, P.G.; Viedma, A. Int. J. Heat Mass Transfer 48 (2005) 4640-4651",
  },
  "gedanitz-2015-jced": {
    cite: "Holger Gedanitz; Maria J. Davila; Eric W. Lemmon, Speed of sound measurements and a fundamental equation of state for cyclopentane, J. Chem. Eng. Data, vol. 60, 2015, p. 1331-1337, doi:10.1021/je5010164",
  },
  "geller-2000-purdue": {
    cite: "V. Geller, Viscosity of Mixed Refrigerants R404A, R407C, R410A, and R507A, 2000 International Refrigeration Conferences at Purdue University, 2000",
  },
  "geller-2001-ijt": {
    cite: "V.Z. Geller; B.Z. Nemzer; U.V. Cheremnykh, Thermal Conductivity of the Refrigerant mixtures R404A, R407C, R410A, and R507A, Int. J. Thermophys., vol. 22, 2001, p. 1034-1043, doi:10.1023/A:1010691504352",
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
  "guder-2009-jpcrd": {
    cite: "C. Guder; W. Wagner, A Reference Equation of State for the Thermodynamic Properties of Sulfur Hexafluoride SF6 for Temperatures from the Melting Line to 625 K and Pressures up to 150 MPa, J. Phys. Chem. Ref. Data, vol. 38, 2009, p. 33-94, doi:10.1063/1.3037344",
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
  "hands-1981-cryo": {
    cite: "B. A. Hands, V. D. Arp, A correlation of thermal conductivity data for helium, Cryogenics 21 (1981) 697-703",
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
  "herrig-2019-jpcrd": {
    cite: "S. Herrig; M. Thol; R. Span; A.H. Harvey et al., A Reference Equation of State for Heavy Water, J. Phys. Chem. Ref. Data",
  },
  "hilpert-1933": {
    cite: "Hilpert, R. Forsch. Ing.-Wes. 4 (1933) 215-224",
  },
  "huber-2003-iecr": {
    cite: "Marcia L. Huber; Arno Laesecke; Richard A. Perkins, Model for the Viscosity and Thermal Conductivity of Refrigerants, Including a New Correlation for the Viscosity of R134a, Ind. Eng. Chem. Res., vol. 42, 2003, p. 3163-3178, doi:10.1021/ie0300880",
  },
  "huber-2004-ef": {
    cite: "Marcia L. Huber; Arno Laesecke; Richard Perkins, Transport Properties of n-Dodecane, Energy & Fuels, vol. 18, 2004, p. 968-975, doi:10.1021/ef034109e",
  },
  "huber-2004-fpe": {
    cite: "Marcia L. Huber; Arno Laesecke; Hong Wei Xiang, Viscosity correlations for minor constituent fluids in natural gas: n-octane, n-nonane and n-decane, Fluid Phase Equilib., vol. 224, 2004, p. 263-270, doi:10.1016/j.fluid.2004.07.012",
  },
  "huber-2005-fpe": {
    cite: "M.L. Huber; R.A. Perkins, Thermal conductivity correlations for minor constituent fluids in natural gas: n-octane, n-nonane and n-decane, Fluid Phase Equilib., vol. 227, 2005, p. 47-55, doi:10.1016/j.fluid.2004.10.031",
  },
  "huber-2006-iecr": {
    cite: "Marcia L. Huber; Arno Laesecke, Correlation for the Viscosity of Pentafluoroethane (R125) from the Triple Point to 500 K at Pressures up to 60 MPa, Ind. Eng. Chem. Res., vol. 45, 2006, p. 4447-4453, doi:10.1021/ie051367l",
  },
  "huber-2016-jpcrd-co2": {
    cite: "M. L. Huber, E. A. Sykioti, M. J. Assael, R. A. Perkins, Reference correlation of the thermal conductivity of carbon dioxide from the triple point to 1100 K and up to 200 MPa, J. Phys. Chem. Ref. Data 45 (2016) 013102",
  },
  "huber-2018-nistir-8209": {
    cite: "M. L. Huber, Models for viscosity, thermal conductivity, and surface tension of selected pure fluids, NISTIR 8209 (2018), doi:10.6028/NIST.IR.8209",
  },
  "huber-assael-2016": {
    cite: "M. L. Huber, M. J. Assael, Int. J. Refrigeration 71 (2016) 39-45",
  },
  "huber-rp912": {
    cite: "M. L. Huber, extended corresponding states parameters, personal communication (2012); typical uncertainty 5 to 10 %",
  },
  "hyland-wexler-1983": {
    cite: "R. W. Hyland, A. Wexler, Formulations for the thermodynamic properties of dry air and of moist air in equilibrium with liquid water, ASHRAE Trans. 89 (1983) 520-535",
  },
  "hyman-bonilla-1953": {
    cite: "Hyman, S.C.; Bonilla, C.F.; Ehrlich, S.W. Chem. Eng. Progress Symp. Ser. 49 (1953) No. 5, 21-33",
  },
  "iapws-1994-surfacetension": {
    cite: "IAPWS, IAPWS Release on Surface Tension of Heavy Water Substance",
  },
  "iapws-2007-d2o-transport": {
    cite: "IAPWS, Revised Release on Viscosity and Thermal Conductivity of Heavy Water Substance, 2007",
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
  "jacobsen-1992-fpe": {
    cite: "R.T Jacobsen; S.G. Penoncello; E.W. Lemmon, A Fundamental Equation for Trichlorofluoromethane (R-11), Fluid Phase Equilib., vol. 80, 1992, p. 45-56, doi:10.1016/0378-3812(92)87054-Q",
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
  "kamei-1995-ijt": {
    cite: "A. Kamei; S. W. Beyerlein; R. T Jacobsen, Application of Nonlinear Regression in the Development of a Wide Range Formulation for HCFC-22, Int. J. Thermophys., vol. 16, 1995, p. 1155-1164, doi:10.1007/BF02081283",
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
  "kiselev-2005-iecr": {
    cite: "S. B. Kiselev; J. F. Ely; I. M. Abdulagatov; M. L. Huber, Generalized SAFT-DFT/DMT Model for the Thermodynamic, Interfacial, and Transport Properties of Associating Fluids: Application for n-Alkanols, Ind. Eng. Chem. Res., vol. 44, 2005, p. 6916-6927, doi:10.1021/ie050010e",
  },
  "klein-1997-ijr": {
    cite: "S.A. Klein; M.O. McLinden; A. Laesecke, An improved extended corresponding states method for estimation of viscosity of pure refrigerants and mixtures, Int. J. Refrig., vol. 20, 1997, p. 208-217, doi:10.1016/S0140-7007(96)00073-4",
  },
  "konakov-1946": {
    cite: "Konakov, P.K. Dokl. Akad. Nauk SSSR 51 (1946) 503-506",
  },
  "kondou-2015-ijr": {
    cite: "Chieko Kondou; Ryuichi Nagata; Noriko Nii; Shigeru Koyama et al., Surface tension of low GWP refrigerants R1243zf, R1234ze(Z), and R1233zd(E), Int. J. Refrig., vol. 53, 2015, p. 80-89, doi:10.1016/j.ijrefrig.2015.01.005",
  },
  "koutian-2017": {
    cite: "A. Koutian et al., J. Phys. Chem. Ref. Data 46 (2017) 013102",
  },
  "kramers-1946": {
    cite: "Kramers, H. Physica 12 (1946) 61-80",
  },
  "krauss-1996-ijt": {
    cite: "R. Krauss; I V. C. Weiss; T. A. Edison; J. V. Sengers et al., Transport Properties of 1,1-Difluoroethane (R152a), Int. J. Thermophys, vol. 17, 1996, p. 731-757, doi:10.1007/BF01439187",
  },
  "kuehn-goldstein-1976": {
    cite: "Kuehn, T.H.; Goldstein, R.J. Int. J. Heat Mass Transfer 19 (1976) 1127-1134",
  },
  "laesecke-1996-ijr": {
    cite: "Arno Laesecke; Richard A. Perkins; John B. Howley, An improved correlation for the thermal conductivity of HCFC123 (2,2-dichloro-1,1,1-trifluoroethane), Int. J. Refrig., vol. 19, 1996, p. 231-238, doi:10.1016/0140-7007(96)00019-9",
  },
  "laesecke-2017-jpcrd-co2": {
    cite: "A. Laesecke, C. D. Muzny, Reference correlation for the viscosity of carbon dioxide, J. Phys. Chem. Ref. Data 46 (2017) 013107",
  },
  "le-fevre-1956": {
    cite: "Le Fevre, E.J. Proc. 9th Int. Congress of Applied Mechanics, Brussels 4 (1956) 168-174",
  },
  "le-fevre-ede-1956": {
    cite: "Le Fevre, E.J.; Ede, A.J. Proc. 9th Int. Congress of Applied Mechanics, Brussels 4 (1956) 175-183",
  },
  "leachman-2009-jpcrd": {
    cite: "J.W. Leachman; R.T. Jacobsen; S.G. Penoncello; E.W. Lemmon, Fundamental Equations of State for Parahydrogen, Normal Hydrogen, and Orthohydrogen, J. Phys. Chem. Ref. Data, vol. 38, 2009, p. 721-748, doi:10.1063/1.3160306",
  },
  "lemmon-2000-jpcrd": {
    cite: "E. W. Lemmon, R. T. Jacobsen, S. G. Penoncello, D. G. Friend, Thermodynamic properties of air and mixtures of nitrogen, argon, and oxygen from 60 to 2000 K at pressures to 2000 MPa, J. Phys. Chem. Ref. Data 29 (2000) 331-385",
  },
  "lemmon-2003-ijt": {
    cite: "E.W. Lemmon, Pseudo-Pure Fluid Equations of State for the Refrigerant Blends R-410A, R-404A, R-507A, and R-407C, Int. J. Thermophys., vol. 24, 2003, p. 991-1006, doi:10.1023/A:1025048800563",
  },
  "lemmon-2004-ef": {
    cite: "Eric W. Lemmon; Marcia L. Huber, Thermodynamic Properties of n-Dodecane, Energy & Fuels, vol. 18, 2004, p. 960-967, doi:10.1021/ef0341062",
  },
  "lemmon-2004-ijt": {
    cite: "E. W. Lemmon, R. T. Jacobsen, Viscosity and thermal conductivity equations for nitrogen, oxygen, argon, and air, Int. J. Thermophys. 25 (2004) 21-69",
  },
  "lemmon-2005-jpcrd": {
    cite: "Eric W. Lemmon; Richard T Jacobsen, A New Functional Form and New Fitting Techniques for Equations of State with Application to Pentafluoroethane (HFC-125), J. Phys. Chem. Ref. Data, vol. 34, 2005, p. 69-108, doi:10.1063/1.1797813",
  },
  "lemmon-2006-jced": {
    cite: "E.W. Lemmon; R. Span, Short Fundamental Equations of State for 20 Industrial Fluids, J. Chem. Eng. Data, vol. 51, 2006, p. 785-850, doi:10.1021/je050186n",
  },
  "lemmon-2009-jced": {
    cite: "Eric W. Lemmon; Mark O. McLinden; Wolfgang Wagner, Thermodynamic Properties of Propane. III. A Reference Equation of State for Temperatures from the Melting Line to 650 K and Pressures up to 1000 MPa, J. Chem. Eng. Data, vol. 54, 2009, p. 3141-3180, doi:10.1021/je900217v",
  },
  "lemmon-2013-propylene": {
    cite: "E.W. Lemmon; U. Overhoff; M.O. McLinden; W. Wagner, Equation of state for propylene, 2010",
  },
  "lemmon-2016-jced-365227": {
    cite: "Eric W. Lemmon; Roland Span, Thermodynamic Properties of R-227ea, R-365mfc, R-115, and R13I1, J. Chem. Eng. Data, 2016, submitted, doi:10.1021/acs.jced.5b00684",
  },
  "lemmonjacobsen-2000-jpcrd": {
    cite: "Eric W. Lemmon; Richard T. Jacobsen, An International Standard Formulation for the Thermodynamic Properties of 1,1,1-Trifluoroethane (HFC-143a) for Temperatures From 161 to 450 K and Pressures to 50 MPa, J. Phys. Chem. Ref. Data, vol. 29, 2000, p. 521-552, doi:10.1063/1.1318909",
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
  "marsh-2002-jced": {
    cite: "Kenneth N. Marsh; Richard A. Perkins; Maria L. V. Ramires, Measurement and Correlation of the Thermal Conductivity of Propane from 86 K to 600 K at Pressures to 70 MPa, J. Chem. Eng. Data, vol. 47, 2002, p. 932-940, doi:10.1021/je010001m",
  },
  "marx-1992-book": {
    cite: "Volker Marx; Andreas Pruss; Wolfgang Wagner, Neue Zustandsgleichung fur R 12, R 22, R 11 und R 113 - Beschreibung des therodynamischen Zustandsverhaltens bei Temperaturen bis 525 K und Druucken bis 200 MPa, VDI Verlag, vol. 19, 1992",
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
  "mclinden-2000-ijr": {
    cite: "Mark O. McLinden; Sanford A. Klein; Richard A. Perkins, An extended corresponding states model for the thermal conductivity of refrigerants and refrigerant mixtures, Int. J. Refrig., vol. 23, 2000, p. 43-63, doi:10.1016/S0140-7007(99)00024-9",
  },
  "mclinden-2015-jced-fluoroketone": {
    cite: "Mark O. McLinden; Richard A. Perkins; Eric W. Lemmon; Tara J. Fortin, Thermodynamic Properties of 1,1,1,2,2,4,5,5,5-nonafluoro-4-(trifluoromethyl)-3-pentanone: Vapor Pressure, (p, rho, T) Behavior, and Speed of Sound Measurements, and Equation of State, J. Chem. Eng. Data, vol. 60, 2015, p. 3646-3659, doi:10.1021/acs.jced.5b00623",
  },
  "melinder-2010": {
    cite: "Å. Melinder, Properties of Secondary Working Fluids for Indirect Systems, International Institute of Refrigeration, 2nd ed., Paris, 2010",
  },
  "meng-2012-jced": {
    cite: "Xianyang Meng; Jianbo Zhang; Jiangtao Wu; Zhigang Liu, Experimental Measurement and Modeling of the Viscosity of Dimethyl Ether, J. Chem. Eng. Data, vol. 57, 2012, p. 988-993, doi:10.1021/je201297j",
  },
  "merk-prins-1953": {
    cite: "Merk, H.J.; Prins, J.A. Appl. Sci. Res. A4 (1953-54) 11-24, 195-206, 207-221",
  },
  "metais-eckert-1964": {
    cite: "Metais, B.; Eckert, E.R.G. J. Heat Transfer 86 (1964) 295-296",
  },
  "michailidou-2013-jpcrd-hexane": {
    cite: "E. K. Michailidou; M. J. Assael; M. L. Huber; R. A. Perkins, Reference Correlation of the Viscosity of n-Hexane from the Triple Point to 600 K and up to 100 MPa, J. Phys. Chem. Ref. Data, vol. 42, 2013, p. 033104:1-12, doi:10.1063/1.4818980",
  },
  "michailidou-2014-jpcrd-heptane": {
    cite: "E. K. Michailidou; M. J. Assael; M. L. Huber; I. M. Abdulagatov et al., Reference Correlation of the Viscosity of n-Heptane from the Triple Point to 600 K and up to 248 MPa, J. Phys. Chem. Ref. Data, vol. 43, 2014, p. 023103, doi:10.1063/1.4875930",
  },
  "michels-1962-physica": {
    cite: "A. Michels; C. Prins, The Melting Lines of Argon, Krypton and Xenon up to 1500 atm; Representation of the Results by a Law of Corresponding States, Physica, vol. 28, 1962, p. 101-116, doi:10.1016/0031-8914(62)90096-4",
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
  "mondejar-2015-jced-r1233zde": {
    cite: "Maria E. Mondejar; Mark O. McLinden; Eric W. Lemmon, Thermodynamic Properties of trans-1-Chloro-3,3,3-trifluoropropene (R1233zd(E)): Vapor Pressure, (p, rho, T) Behavior, and Speed of Sound Measurements, and Equation of State, J. Chem. Eng. Data, vol. 60, 2015, p. 2477-2489, doi:10.1021/acs.jced.5b00348",
  },
  "monogenidou-2018-conductivity": {
    cite: "S. A. Monogenidou, M. J. Assael, M. L. Huber, Reference correlation for the thermal conductivity of ammonia from the triple-point temperature to 680 K and pressures up to 80 MPa, J. Phys. Chem. Ref. Data 47 (2018) 043101",
  },
  "monogenidou-2018-viscosity": {
    cite: "S. A. Monogenidou, M. J. Assael, M. L. Huber, Reference correlation for the viscosity of ammonia from the triple point to 725 K and up to 50 MPa, J. Phys. Chem. Ref. Data 47 (2018) 023102",
  },
  "morgan-1975": {
    cite: "Morgan, V.T. Advances in Heat Transfer 11 (1975) 199-264",
  },
  "mori-nakayama-1967": {
    cite: "Mori, Y.; Nakayama, W. Int. J. Heat Mass Transfer 10 (1967) 37-59",
  },
  "mulero-2012-jpcrd": {
    cite: "A. Mulero; I. Cachadiña; M. I. Parra, Recommended Correlations for the Surface Tension of Common Fluids, J. Phys. Chem. Ref. Data, vol. 41, 2012, p. 043105-1:13, doi:10.1063/1.4768782",
  },
  "mulero-2014-jpcrd": {
    cite: "A. Mulero; I. Cachadiña, Recommended Correlations for the Surface Tension of Several Fluids, J. Phys. Chem. Ref. Data, vol. 43, 2014, p. 023104-1:8, doi:10.1063/1.4878755",
  },
  "muzny-2013-jced": {
    cite: "C. D. Muzny, M. L. Huber, A. F. Kazakov, Correlation for the viscosity of normal hydrogen obtained from symbolic regression, J. Chem. Eng. Data 58 (2013) 969-979",
  },
  "mylona-2014-jpcrd-xylenes": {
    cite: "S. K. Mylona; K. D. Antoniadis; M. J. Assael; M. L. Huber et al., Reference Correlations of the Thermal Conductivity of o-Xylene, m-Xylene, p-Xylene, and Ethylbenzene from the Triple Point to 700 K and Moderate Pressures, J. Phys. Chem. Ref. Data, vol. 43, 2014, p. 043104, doi:10.1063/1.4901166",
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
  "okada-1999-ijt": {
    cite: "M. Okada; T. Shibata; Y. Sato; Y. Higashi, Surface Tension of HFC Refrigerant Mixtures, Int. J. Thermophys., vol. 20, 1999, p. 119-127, doi:10.1023/A:1021482231102",
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
  "ortizvega-2023-nistir-8474": {
    cite: "D. O. Ortiz Vega, K. R. Hall, J. C. Holste, A. H. Harvey, E. W. Lemmon, An equation of state for the thermodynamic properties of helium, NISTIR 8474 (2023)",
  },
  "outcalt-1996-jpcrd-r152a": {
    cite: "Stephanie L. Outcalt; Mark O. McLinden, A Modified Benedict-Webb-Rubin Equation of State for the Thermodynamic Properties of R152a (1,1-difluoroethane), J. Phys. Chem. Ref. Data, vol. 25, 1996, p. 605-636, doi:10.1063/1.555979",
  },
  "pan-2012-fpe": {
    cite: "Jiang Pan; Xinfang Rui; Xiaodong Zhao; Liming Qiu, An equation of state for the thermodynamic properties of 1,1,1,3,3,3-hexafluoropropane (HFC-236fa), Fluid Phase Equilib., vol. 321, 2012, p. 10-16, doi:10.1016/j.fluid.2012.02.012",
  },
  "penoncello-1995-ijt": {
    cite: "S. G. Penoncello; R. T Jacobsen; A. R. H. Goodwin, A Thermodynamic Property Formulation for Cyclohexane, Int. J. Thermophys., vol. 16, 1995, p. 519-531, doi:10.1007/BF01441918",
  },
  "penoncello-2003-jpcrd": {
    cite: "Steven G. Penoncello; Eric W. Lemmon; Richard T Jacobsen; Zhengjun Shan, A Fundamental Equation for Trifluoromethane (R-23), J. Phys. Chem. Ref. Data, vol. 32, 2003, p. 1473-1499, doi:10.1063/1.1559671",
  },
  "perkins-2002-jced-isobutane": {
    cite: "R.A. Perkins, Measurement and Correlation of the Thermal Conductivity of Isobutane from 114 K to 600 K at Pressures to 70 MPa, J. Chem. Eng. Data, vol. 47, 2002, p. 1272-1279, doi:10.1021/je010121u",
  },
  "perkins-2002-jced-nbutane": {
    cite: "R.A. Perkins; M.L.V. Ramires; C.A. Nieto de Castro; L. Cusco, Measurement and Correlation of the Thermal Conductivity of Butane from 135 K to 600 K at Pressures to 70 MPa, J. Chem. Eng. Data, vol. 47, 2002., p. 1263-1271, doi:10.1021/je0101202",
  },
  "perkins-2006-jced": {
    cite: "Richard A. Perkins; Marcia L. Huber, Measurement and Correlation of the Thermal Conductivity of Pentafluoroethane (R125) from 190 K to 512 K at Pressures to 70 MPa, J. Chem. Eng. Data, vol. 51, 2006, p. 898-904, doi:10.1021/je050372t",
  },
  "perkins-2011-jced": {
    cite: "Richard A. Perkins; Marcia L. Huber, Measurement and Correlation of the Thermal Conductivity of 2,3,3,3-Tetrafluoroprop-1-ene (R1234yf) and trans-1,3,3,3-Tetrafluoropropene (R1234ze(E)), J. Chem. Eng. Data, vol. 56, 2011, p. 4868-4874, doi:10.1021/je200811n",
  },
  "perkins-2016": {
    cite: "R. A. Perkins, M. L. Huber, M. J. Assael, J. Chem. Eng. Data 61 (2016) 3286-3294",
  },
  "perkins-huber-2017": {
    cite: "R. A. Perkins, M. L. Huber, J. Chem. Eng. Data 62 (2017) 2659-2665",
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
  "piazza-2013-fpe": {
    cite: "L. Piazza; R. Span, An equation of state for methanol including the association term of SAFT, Fluid Phase Equilib., vol. 349, 2013, p. 12-24, doi:10.1016/j.fluid.2013.03.024",
  },
  "pimenta-1975": {
    cite: "Pimenta, M.M.; Moffat, R.J.; Kays, W.M. Stanford University report HMT-21 (1975)",
  },
  "platzer-1990-book": {
    cite: "B. Platzer; A. Polt; G. Maurer, Thermophysical Properties of Refrigerants, Springer-Verlag, 1990, doi:10.1007/978-3-662-02608-3",
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
  "quinonescisneros-2006-jpcb": {
    cite: "S. E. Quiñones-Cisneros, U. K. Deiters, Generalization of the friction theory for viscosity modeling, J. Phys. Chem. B 110 (2006) 12820-12834",
  },
  "quinonescisneros-2012-jced": {
    cite: "Sergio E. Quiñones-Cisneros; Kurt A. G. Schmidt; Binod R. Giri; Pierre Blais et al., Reference Correlation for the Viscosity Surface of Hydrogen Sulfide, J. Chem. Eng. Data, vol. 57, 2012, p. 3014-3018, doi:10.1021/je300601h",
  },
  "quinonescisneros-2012-jpcrd": {
    cite: "S.E. Quiñones-Cisneros; M.L. Huber; U.K. Deiters, Correlation for the Viscosity of Sulfur Hexafluoride (SF6) from the Triple Point to 1000 K and Pressures to 50 MPa, J. Phys. Chem. Ref. Data, vol. 41, 2012, p. 023102-1:11, doi:10.1063/1.3702441",
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
  "reeves-1964-jcp": {
    cite: "Larry E. Reeves; Gene J. Scott; Stanley E. Babb Jr., Melting Curves of Pressure Transmitting Fluids, J. Chem. Phys., vol. 40, 1964, p. 3662-3666, doi:10.1063/1.1725068",
  },
  "reynolds-kays-1958": {
    cite: "Reynolds, W.C.; Kays, W.M.; Kline, S.J. NASA Memo 12-3-58W (1958)",
  },
  "rich-1953": {
    cite: "Rich, B.R. Trans. ASME 75 (1953) 489-499",
  },
  "richardson-2013-jpcrd": {
    cite: "I. A. Richardson; J. W. Leachman; E. W. Lemmon, Fundamental Equation of State for Deuterium, J. Phys. Chem. Ref. Data, vol. 43, 2014, p. 013103, doi:10.1063/1.4864752",
  },
  "richter-2011-jced": {
    cite: "M. Richter; M. O. McLinden; E. W. Lemmon, Thermodynamic Properties of 2,3,3,3-Tetrafluoroprop-1-ene (R1234yf): Vapor Pressure and p-rho-T Measurements and an Equation of State, J. Chem. Eng. Data, vol. 56, 2011, p. 3254-3264, doi:10.1021/je200369m",
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
  "schmidt-1985-fpe": {
    cite: "R. Schmidt, W. Wagner, A new form of the equation of state for pure substances and its application to oxygen, Fluid Phase Equilib. 19 (1985) 175-200",
  },
  "schroeder-2014-jpcrd": {
    cite: "Schroeder, J. A.; Penoncello, S. G.; Schroeder, J. S., A Fundamental Equation of State for Ethanol, J. Phys. Chem. Ref. Data, vol. 43, 2014, p. 043102, doi:10.1063/1.4895394",
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
  "setzmann-1991-jpcrd": {
    cite: "U. Setzmann, W. Wagner, A new equation of state and tables of thermodynamic properties for methane covering the range from the melting line to 625 K at pressures up to 1000 MPa, J. Phys. Chem. Ref. Data 20 (1991) 1061-1155",
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
  "shan-2000-ashrae": {
    cite: "Shan, Zhengjun; Penoncello, Steven G; Jacobsen, Richard T, A generalized model for viscosity and thermal conductivity of trifluoromethane (R-23), ASHRAE Transactions, vol. 106, 2000, p. 757",
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
  "smukala-2000-jpcrd": {
    cite: "J. Smukala; R. Span; W. Wagner, New Equation of State for Ethylene Covering the Fluid Region for Temperatures From the Melting Line to 450 K at Pressures up to 300 MPa, J. Phys. Chem. Ref. Data, vol. 29, 2000, p. 1053-1121, doi:10.1063/1.1329318",
  },
  "sohal-2010": {
    cite: "M. S. Sohal et al., Engineering Database of Liquid Salt Thermophysical and Thermochemical Properties, INL/EXT-10-18297, Idaho National Laboratory, 2010",
  },
  "sotiriadou-2024": {
    cite: "S. Sotiriadou et al., Reference correlations of the viscosity of ethene, Int. J. Thermophys. 45 (2024) 87",
  },
  "sotiriadou-2025": {
    cite: "S. G. Sotiriadou et al., Int. J. Thermophys. 46 (2025) 3",
  },
  "span-1996-jpcrd": {
    cite: "R. Span, W. Wagner, A new equation of state for carbon dioxide covering the fluid region from the triple-point temperature to 1100 K at pressures up to 800 MPa, J. Phys. Chem. Ref. Data 25 (1996) 1509-1596",
  },
  "span-2000-jpcrd": {
    cite: "R. Span, E. W. Lemmon, R. T. Jacobsen, W. Wagner, A. Yokozeki, A reference equation of state for the thermodynamic properties of nitrogen for temperatures from 63.151 to 1000 K and pressures to 2200 MPa, J. Phys. Chem. Ref. Data 29 (2000) 1361-1433",
  },
  "span-ijt-2003b": {
    cite: "R. Span; W. Wagner, Equations of State for Technical Applications. II. Results for Nonpolar Fluids, Int. J. Thermophys., vol. 24, 2003, p. 41-109, doi:10.1023/A:1022310214958",
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
  "stewart-1991-jpcrd": {
    cite: "R. B. Stewart, R. T. Jacobsen, W. Wagner, Thermodynamic properties of oxygen from the triple point to 300 K with pressures to 80 MPa, J. Phys. Chem. Ref. Data 20 (1991) 917-1021",
  },
  sukhatme: {
    cite: "Sukhatme, S.P. A Textbook on Heat Transfer, Universities Press",
  },
  "sun-1988-bbpc": {
    cite: "T. F. Sun; J. A. Schouten; N. J. Trappeniers; S. N. Biswas, Accurate Measurement of the Melting Line of Methanol and Ethanol at Pressures up to 270 MPa, Ber. Bunsenges. Phys. Chem., vol. 92, 1988, p. 652--655, doi:10.1002/bbpc.198800153",
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
  "sykioti-2013-jpcrd-methanol": {
    cite: "E. A. Sykioti; M. J. Assael; M. L. Huber; R. A. Perkins, Reference Correlation of the Thermal Conductivity of Methanol from the Triple Point to 660 K and up to 245 MPa, J. Phys. Chem. Ref. Data, vol. 42, 2013, p. 043101, doi:10.1063/1.4829449",
  },
  "tachibana-fukui-1960": {
    cite: "Tachibana, F.; Fukui, S.; Mitsumura, H. Bull. JSME 3 (1960) 119-123",
  },
  "tanaka-1996-ijt": {
    cite: "Y. Tanaka; T. Sotani, Thermal Conductivity and Viscosity of 2,2-Dichloro-1,1,1-Trifluoroethane (HCFC-123), Int. J. Thermophys., vol. 17, 1996, p. 293-328, doi:10.1007/BF01443394",
  },
  "tariq-2014-jpcrd-cyclohexane": {
    cite: "U. Tariq; A. R. B. Jusoh; N. Riesco; V. Vesovic, Reference Correlation of the Viscosity of Cyclohexane from the Triple Point to 700 K and up to 110 MPa, J. Phys. Chem. Ref. Data, vol. 43, 2014, p. 033101-1:18, doi:10.1063/1.4891103",
  },
  "taylor-1923": {
    cite: "Taylor, G.I. Phil. Trans. Royal Society A 223 (1923) 289-343",
  },
  "taylor-1968": {
    cite: "Taylor, M.F. NASA TN D-4332 (1968)",
  },
  "tegeler-1999-jpcrd": {
    cite: "C. Tegeler, R. Span, W. Wagner, A new equation of state for argon covering the fluid region for temperatures from the melting line to 700 K at pressures up to 1000 MPa, J. Phys. Chem. Ref. Data 28 (1999) 779-850",
  },
  "thol-2012-hthp": {
    cite: "M. Thol; E.W. Lemmon; R. Span, Equation of state for benzene for temperatures from the melting line up to 725 K with pressures up to 500 MPa, High Temperatures-High Pressures, vol. 41, 2012, p. 81-97",
  },
  "thol-2015-thesis": {
    cite: "Monika Thol, Empirical Multiparameter Equations of State Based on Molecular Simulation and Hybrid Data Sets, Ruhr-Universität Bochum, 2015",
  },
  "thol-2016-fpe-mm": {
    cite: "Monika Thol, Fundamental equation of state correlation for hexamethyldisiloxane based on experimental and molecular simulation data, Fluid Phase Equilib., 2015, doi:10.1016/j.fluid.2015.09.047",
  },
  "thol-2016-ijt-r1234zee": {
    cite: "Monika Thol; Eric W. Lemmon, Equation of State for the Thermodynamic Properties of trans-1,3,3,3-Tetrafluoropropene [R-1234ze(E)], Int. J. Thermophys, vol. 37, 2016, p. 1--16, doi:10.1007/s10765-016-2040-6",
  },
  "thol-2017-jced-siloxanes": {
    cite: "Monika Thol; Frithjof H. Dubberke; Elmar Baumhögger; Jadran Vrabec et al., Speed of Sound Measurements and Fundamental Equations of State for Octamethyltrisiloxane and Decamethyltetrasiloxane, J. Chem. Eng. Data, vol. 62, 2017, p. 2633--2648, doi:10.1021/acs.jced.7b00092",
  },
  "thol-2018-jced-hcl": {
    cite: "Monika Thol; Frithjof H. Dubberke; Elmar Baumhögger; Roland Span et al., Speed of Sound Measurements and a Fundamental Equation of State for Hydrogen Chloride, J. Chem. Eng. Data, vol. 63, 2018, p. 2533--2547, doi:10.1021/acs.jced.7b01031",
  },
  "thol-2019-fpe-alkanes-hexane": {
    cite: "M. Thol; Y. Wang; E.W. Lemmon; R. Span, Fundamental Equations of State for Hydrocarbons. Part II. n-Hexane, Fluid Phase Equilib.",
  },
  "thol-2019-fpe-alkanes-pentane": {
    cite: "M. Thol; T. Uhde; E.W. Lemmon; R. Span, Fundamental Equations of State for Hydrocarbons. Part I. n-Pentane, Fluid Phase Equilib.",
  },
  "thol-2019-fpe-siloxanes": {
    cite: "M. Thol; M.A. Javed; E. Baumhoegger; R. Span et al., Thermodynamic Properties of Dodecamethylpentasiloxane, Tetradecamethylhexasiloxane, and Decamethylcyclopentasiloxane, Fluid Phase Equilib.",
  },
  "thol-2019-jpcrd-neon": {
    cite: "M. Thol; R. Beckmüller; R. Weiss; A.H. Harvey et al., Thermodynamic Properties for Neon for Temperatures from the Triple Point to 700 K at Pressures to 700 MPa, J. Phys. Chem Ref. Data",
  },
  "tillnerroth-1994-jpcrd": {
    cite: "R. Tillner-Roth, H. D. Baehr, An international standard formulation for the thermodynamic properties of 1,1,1,2-tetrafluoroethane (HFC-134a) for temperatures from 170 K to 455 K and pressures up to 70 MPa, J. Phys. Chem. Ref. Data 23 (1994) 657-729",
  },
  "tillnerroth-1997-jpcrd": {
    cite: "R. Tillner-Roth; A. Yokozeki, An international standard equation of state for difluoromethane (R-32) for temperatures from the triple point at 136.34 K to 435 K and pressures up to 70 MPa, J. Phys. Chem. Ref. Data, vol. 26, 1997, p. 1273-1328, doi:10.1063/1.556002",
  },
  "transformer-oil-typical-values": {
    cite: "Typical values of mineral insulating oils of IEC 60296, common practice, from memory",
  },
  "tufeu-1984-bbpc": {
    cite: "R. Tufeu, D. Y. Ivanov, Y. Garrabos, B. Le Neindre, Thermal conductivity of ammonia in a large temperature and pressure range including the critical region, Ber. Bunsenges. Phys. Chem. 88 (1984) 422-427",
  },
  "vassiliou-2015-jpcrd-pentanes": {
    cite: "Vassiliou, C-M; Assael, MJ; Huber, ML; Perkins, RA, Reference Correlations of the Thermal Conductivity of Cyclopentane, iso-Pentane, and n-Pentane, Journal of Physical and Chemical Reference Data, vol. 44, 2015, p. 033102",
  },
  "velliadou-2021-conductivity": {
    cite: "D. Velliadou et al., Reference correlations for the thermal conductivity of xenon, Int. J. Thermophys. 42 (2021) 51",
  },
  "velliadou-2021-viscosity": {
    cite: "D. Velliadou et al., Reference correlation for the viscosity of xenon, Int. J. Thermophys. 42 (2021) 74",
  },
  "velliadou-2022": {
    cite: "D. Velliadou et al., Reference correlation for the viscosity of difluoromethane (R-32), Int. J. Thermophys. 43 (2022) 129",
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
  "vogel-1998-jpcrd": {
    cite: "E. Vogel; C. Küchenmeister; E. Bich; A. Laesecke, Reference Correlation of the Viscosity of Propane, J. Phys. Chem. Ref. Data, vol. 27, 1998, p. 947-970, doi:10.1063/1.556025",
  },
  "vogel-1999-hthp": {
    cite: "E. Vogel; C. Kuechenmeister; E. Bich, Viscosity for n-Butane in the Fluid Region, High Temp. - High Pressures, vol. 31, 1999, p. 173-186, doi:10.1068/htrt154",
  },
  "vogel-2000-ijt": {
    cite: "E. Vogel; C. Kuechenmeister; E. Bich, Viscosity Correlation for Isobutane over Wide Ranges of the Fluid Region, Int. J. Thermophys, vol. 21, 2000, p. 343-356, doi:10.1023/A:1006623310780",
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
  "wu-2011-jpcrd": {
    cite: "Jiangtao Wu; Yong Zhou; Eric W. Lemmon, An Equation of State for the Thermodynamic Properties of Dimethyl Ether, J. Phys. Chem. Ref. Data, vol. 40, 2011, p. 023104-1:16, doi:10.1063/1.3582533",
  },
  "wu-2012-ijt": {
    cite: "Jiangtao Wu; Yong Zhou, An Equation of State for Fluoroethane (R161), Int. J. Thermophys., vol. 33, 2012, p. 220-234, doi:10.1007/s10765-011-1151-3",
  },
  "xiang-2006-jpcrd": {
    cite: "Hong Wei Xiang; Arno Laesecke; Marcia L. Huber, A New Reference Correlation for the Viscosity of Methanol, J. Phys. Chem. Ref. Data, vol. 35, 2006, p. 1597-1:24, doi:10.1063/1.2360605",
  },
  "yang-1985": {
    cite: "Yang, S.M. Proc. 8th Int. Heat Transfer Conf., San Francisco (1985)",
  },
  "yazdanian-klems-1994": {
    cite: "Yazdanian, M.; Klems, J.H. ASHRAE Trans. 100 (1) (1994) 1087-1096",
  },
  "younglove-1982-nist": {
    cite: "Younglove, Ben A, Thermophysical properties of fluids. I. Argon, ethylene, parahydrogen, nitrogen, nitrogen trifluoride, and oxygen, DTIC Document",
  },
  "younglove-1994-jpcrd": {
    cite: "Ben A. Younglove, An International Standard Equation of State for the Thermodynamic Properties of Refrigerant 123 (2,2-Dichloro-1,1,1-Trifluoroethane), J. Phys. Chem. Ref. Data, vol. 23, 1994, p. 731-779, doi:10.1063/1.555950",
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
  "zhou-2012-jpcrd": {
    cite: "Yong Zhou; Jiangtao Wu; Eric W. Lemmon, Thermodynamic Properties of o-Xylene, m-Xylene, p-Xylene, and Ethylbenzene, J. Phys. Chem. Ref. Data, vol. 41, 2012, p. 023103-1 -- 023103-26, doi:10.1063/1.3703506",
  },
  "zhou-2014-jpcrd": {
    cite: "Yong Zhou; Jun Liu; Steven G. Penoncello; Eric W. Lemmon, An Equation of State for the Thermodynamic Properties of Cyclohexane, J. Phys. Chem. Ref. Data, vol. 43, 2014, p. 043105-1:12, doi:10.1063/1.4900538",
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
