/** A published work from which a number or a formula was taken. */
export interface Source {
  readonly authors: string;
  readonly title: string;
  readonly year: number;
  /** Journal with volume and page, report number, or publisher. */
  readonly published: string;
  readonly doi?: string;
}

/** A number, or a set of numbers, with the work it comes from. Leaving out the source does not compile. */
export interface Sourced<T> {
  readonly value: T;
  readonly source: SourceId;
  /** Table, equation or page; "from memory" where it could not be looked up. */
  readonly where?: string;
  /** Relative expanded uncertainty, 95 %. */
  readonly uncertainty?: number;
}

/** A published work, or the file that is being read, where that states a molecule of its own. */
export type SourceId = keyof typeof sources | 'the file';

export const sources = {
  'CIAAW 2021': {
    authors: 'Prohaska, T. et al.',
    title: 'Standard atomic weights of the elements 2021 (IUPAC Technical Report)',
    year: 2022,
    published: 'Pure Appl. Chem. 94, 573',
    doi: '10.1515/pac-2019-0603',
  },
  'Wang 2021': {
    authors: 'Wang, M.; Huang, W. J.; Kondev, F. G.; Audi, G.; Naimi, S.',
    title: 'The AME 2020 atomic mass evaluation (II)',
    year: 2021,
    published: 'Chin. Phys. C 45, 030003',
    doi: '10.1088/1674-1137/abddaf',
  },
  'Lemmon 2000': {
    authors: 'Lemmon, E. W.; Jacobsen, R. T.; Penoncello, S. G.; Friend, D. G.',
    title: 'Thermodynamic properties of air and mixtures of nitrogen, argon, and oxygen from 60 to 2000 K',
    year: 2000,
    published: 'J. Phys. Chem. Ref. Data 29, 331',
    doi: '10.1063/1.1285884',
  },
  'Lemmon & Jacobsen 2004': {
    authors: 'Lemmon, E. W.; Jacobsen, R. T.',
    title: 'Viscosity and thermal conductivity equations for nitrogen, oxygen, argon, and air',
    year: 2004,
    published: 'Int. J. Thermophys. 25, 21',
    doi: '10.1023/B:IJOT.0000022327.04529.f3',
  },
  'IAPWS R12-08': {
    authors: 'International Association for the Properties of Water and Steam',
    title: 'Release on the IAPWS Formulation 2008 for the Viscosity of Ordinary Water Substance',
    year: 2008,
    published: 'IAPWS R12-08',
  },
  'IAPWS R15-11': {
    authors: 'International Association for the Properties of Water and Steam',
    title: 'Release on the IAPWS Formulation 2011 for the Thermal Conductivity of Ordinary Water Substance',
    year: 2011,
    published: 'IAPWS R15-11',
  },
  'Huber 2016': {
    authors: 'Huber, M. L.; Sykioti, E. A.; Assael, M. J.; Perkins, R. A.',
    title:
      'Reference correlation of the thermal conductivity of carbon dioxide from the triple point to 1100 K and up to 200 MPa',
    year: 2016,
    published: 'J. Phys. Chem. Ref. Data 45, 013102',
    doi: '10.1063/1.4940892',
  },
  'Assael 2011': {
    authors: 'Assael, M. J.; Assael, J.-A. M.; Huber, M. L.; Perkins, R. A.; Takata, Y.',
    title:
      'Correlation of the thermal conductivity of normal and parahydrogen from the triple point to 1000 K and up to 100 MPa',
    year: 2011,
    published: 'J. Phys. Chem. Ref. Data 40, 033101',
    doi: '10.1063/1.3606499',
  },
  'Monogenidou 2018': {
    authors: 'Monogenidou, S. A.; Assael, M. J.; Huber, M. L.',
    title:
      'Reference correlation for the thermal conductivity of ammonia from the triple-point temperature to 680 K and pressures up to 80 MPa',
    year: 2018,
    published: 'J. Phys. Chem. Ref. Data 47, 043101',
    doi: '10.1063/1.5053087',
  },
  'Fenghour 1998': {
    authors: 'Fenghour, A.; Wakeham, W. A.; Vesovic, V.',
    title: 'The viscosity of carbon dioxide',
    year: 1998,
    published: 'J. Phys. Chem. Ref. Data 27, 31',
    doi: '10.1063/1.556013',
  },
  'Muzny 2013': {
    authors: 'Muzny, C. D.; Huber, M. L.; Kazakov, A. F.',
    title: 'Correlation for the viscosity of normal hydrogen obtained from symbolic regression',
    year: 2013,
    published: 'J. Chem. Eng. Data 58, 969',
    doi: '10.1021/je301273j',
  },
  'Quiñones-Cisneros 2012': {
    authors: 'Quiñones-Cisneros, S. E.; Huber, M. L.; Deiters, U. K.',
    title:
      'Correlation for the viscosity of sulfur hexafluoride (SF6) from the triple point to 1000 K and pressures to 50 MPa',
    year: 2012,
    published: 'J. Phys. Chem. Ref. Data 41, 023102',
    doi: '10.1063/1.3702441',
  },
  'Friend 1989': {
    authors: 'Friend, D. G.; Ely, J. F.; Ingham, H.',
    title: 'Thermophysical properties of methane',
    year: 1989,
    published: 'J. Phys. Chem. Ref. Data 18, 583',
    doi: '10.1063/1.555828',
  },
  'Fenghour 1995': {
    authors: 'Fenghour, A.; Wakeham, W. A.; Vesovic, V.; Watson, J. T. R.; Millat, J.; Vogel, E.',
    title: 'The viscosity of ammonia',
    year: 1995,
    published: 'J. Phys. Chem. Ref. Data 24, 1649',
    doi: '10.1063/1.555961',
  },
  'Svehla 1995': {
    authors: 'Svehla, R. A.',
    title: 'Transport coefficients for the NASA Lewis chemical equilibrium program',
    year: 1995,
    published: 'NASA TM-4647',
  },
  'Bich 1990': {
    authors: 'Bich, E.; Millat, J.; Vogel, E.',
    title:
      'The viscosity and thermal conductivity of pure monatomic gases from their normal boiling point up to 5000 K',
    year: 1990,
    published: 'J. Phys. Chem. Ref. Data 19, 1289',
    doi: '10.1063/1.555846',
  },
  'Boushehri 1987': {
    authors: 'Boushehri, A.; Bzowski, J.; Kestin, J.; Mason, E. A.',
    title: 'Equilibrium and transport properties of eleven polyatomic gases at low density',
    year: 1987,
    published: 'J. Phys. Chem. Ref. Data 16, 445',
    doi: '10.1063/1.555800',
  },
  'Kestin 1984': {
    authors: 'Kestin, J.; Knierim, K.; Mason, E. A.; Najafi, B.; Ro, S. T.; Waldman, M.',
    title: 'Equilibrium and transport properties of the noble gases and their mixtures at low density',
    year: 1984,
    published: 'J. Phys. Chem. Ref. Data 13, 229',
    doi: '10.1063/1.555703',
  },
  'Arp 1998': {
    authors: 'Arp, V. D.; McCarty, R. D.; Friend, D. G.',
    title: 'Thermophysical properties of helium-4 from 0.8 to 1500 K with pressures to 2000 MPa',
    year: 1998,
    published: 'NIST Technical Note 1334 (revised)',
  },
  'McBride 2002': {
    authors: 'McBride, B. J.; Zehe, M. J.; Gordon, S.',
    title: 'NASA Glenn coefficients for calculating thermodynamic properties of individual species',
    year: 2002,
    published: 'NASA/TP-2002-211556',
  },
  'Huber & Herzberg 1979': {
    authors: 'Huber, K. P.; Herzberg, G.',
    title: 'Molecular Spectra and Molecular Structure IV. Constants of Diatomic Molecules',
    year: 1979,
    published: 'Van Nostrand Reinhold',
    doi: '10.1007/978-1-4757-0961-2',
  },
  'Svehla 1962': {
    authors: 'Svehla, R. A.',
    title: 'Estimated viscosities and thermal conductivities of gases at high temperatures',
    year: 1962,
    published: 'NASA TR R-132',
  },
  'Neufeld 1972': {
    authors: 'Neufeld, P. D.; Janzen, A. R.; Aziz, R. A.',
    title:
      'Empirical equations to calculate 16 of the transport collision integrals Ω(l,s)* for the Lennard-Jones (12-6) potential',
    year: 1972,
    published: 'J. Chem. Phys. 57, 1100',
    doi: '10.1063/1.1678363',
  },
  'Hirschfelder 1954': {
    authors: 'Hirschfelder, J. O.; Curtiss, C. F.; Bird, R. B.',
    title: 'Molecular Theory of Gases and Liquids',
    year: 1954,
    published: 'Wiley',
  },
  'Chapman & Cowling 1970': {
    authors: 'Chapman, S.; Cowling, T. G.',
    title: 'The Mathematical Theory of Non-Uniform Gases, 3rd ed.',
    year: 1970,
    published: 'Cambridge University Press',
  },
  'Mason & Saxena 1958': {
    authors: 'Mason, E. A.; Saxena, S. C.',
    title: 'Approximate formula for the thermal conductivity of gas mixtures',
    year: 1958,
    published: 'Phys. Fluids 1, 361',
    doi: '10.1063/1.1724352',
  },
  'Marrero & Mason 1972': {
    authors: 'Marrero, T. R.; Mason, E. A.',
    title: 'Gaseous diffusion coefficients',
    year: 1972,
    published: 'J. Phys. Chem. Ref. Data 1, 3',
    doi: '10.1063/1.3253094',
  },
  'Nelson 1967': {
    authors: 'Nelson, R. D.; Lide, D. R.; Maryott, A. A.',
    title: 'Selected values of electric dipole moments for molecules in the gas phase',
    year: 1967,
    published: 'NSRDS-NBS 10',
  },
  'Poling 2001': {
    authors: 'Poling, B. E.; Prausnitz, J. M.; O’Connell, J. P.',
    title: 'The Properties of Gases and Liquids, 5th ed.',
    year: 2001,
    published: 'McGraw-Hill',
  },
  'Span 2000': {
    authors: 'Span, R.; Lemmon, E. W.; Jacobsen, R. T.; Wagner, W.; Yokozeki, A.',
    title:
      'A reference equation of state for the thermodynamic properties of nitrogen for temperatures from 63.151 to 1000 K and pressures to 2200 MPa',
    year: 2000,
    published: 'J. Phys. Chem. Ref. Data 29, 1361',
    doi: '10.1063/1.1349047',
  },
  'Stewart 1991': {
    authors: 'Stewart, R. B.; Jacobsen, R. T.; Wagner, W.',
    title: 'Thermodynamic properties of oxygen from the triple point to 300 K with pressures to 80 MPa',
    year: 1991,
    published: 'J. Phys. Chem. Ref. Data 20, 917',
    doi: '10.1063/1.555897',
  },
  'Tegeler 1999': {
    authors: 'Tegeler, C.; Span, R.; Wagner, W.',
    title:
      'A new equation of state for argon covering the fluid region for temperatures from the melting line to 700 K at pressures up to 1000 MPa',
    year: 1999,
    published: 'J. Phys. Chem. Ref. Data 28, 779',
    doi: '10.1063/1.556037',
  },
  'Span & Wagner 1996': {
    authors: 'Span, R.; Wagner, W.',
    title:
      'A new equation of state for carbon dioxide covering the fluid region from the triple-point temperature to 1100 K at pressures up to 800 MPa',
    year: 1996,
    published: 'J. Phys. Chem. Ref. Data 25, 1509',
    doi: '10.1063/1.555991',
  },
  'Setzmann & Wagner 1991': {
    authors: 'Setzmann, U.; Wagner, W.',
    title:
      'A new equation of state and tables of thermodynamic properties for methane covering the range from the melting line to 625 K at pressures up to 1000 MPa',
    year: 1991,
    published: 'J. Phys. Chem. Ref. Data 20, 1061',
    doi: '10.1063/1.555898',
  },
  'Wagner & Pruss 2002': {
    authors: 'Wagner, W.; Pruß, A.',
    title:
      'The IAPWS formulation 1995 for the thermodynamic properties of ordinary water substance for general and scientific use',
    year: 2002,
    published: 'J. Phys. Chem. Ref. Data 31, 387',
    doi: '10.1063/1.1461829',
  },
  'Murphy & Koop 2005': {
    authors: 'Murphy, D. M.; Koop, T.',
    title: 'Review of the vapour pressures of ice and supercooled water for atmospheric applications',
    year: 2005,
    published: 'Q. J. R. Meteorol. Soc. 131, 1539',
    doi: '10.1256/qj.04.94',
  },
  'Tillner-Roth 1993': {
    authors: 'Tillner-Roth, R.; Harms-Watzenberg, F.; Baehr, H. D.',
    title: 'Eine neue Fundamentalgleichung für Ammoniak',
    year: 1993,
    published: 'DKV-Tagungsbericht 20, 167',
  },
  'Guder & Wagner 2009': {
    authors: 'Guder, C.; Wagner, W.',
    title:
      'A reference equation of state for the thermodynamic properties of sulfur hexafluoride for temperatures from the melting line to 625 K and pressures up to 150 MPa',
    year: 2009,
    published: 'J. Phys. Chem. Ref. Data 38, 33',
    doi: '10.1063/1.3037344',
  },
  'Leachman 2009': {
    authors: 'Leachman, J. W.; Jacobsen, R. T.; Penoncello, S. G.; Lemmon, E. W.',
    title: 'Fundamental equations of state for parahydrogen, normal hydrogen, and orthohydrogen',
    year: 2009,
    published: 'J. Phys. Chem. Ref. Data 38, 721',
    doi: '10.1063/1.3160306',
  },
  'Richardson 2014': {
    authors: 'Richardson, I. A.; Leachman, J. W.; Lemmon, E. W.',
    title: 'Fundamental equation of state for deuterium',
    year: 2014,
    published: 'J. Phys. Chem. Ref. Data 43, 013103',
    doi: '10.1063/1.4864752',
  },
  'Lemmon & Span 2006': {
    authors: 'Lemmon, E. W.; Span, R.',
    title: 'Short fundamental equations of state for 20 industrial fluids',
    year: 2006,
    published: 'J. Chem. Eng. Data 51, 785',
    doi: '10.1021/je050186n',
  },
  'IPTS 1968': {
    authors: 'Comité International des Poids et Mesures',
    title: 'The International Practical Temperature Scale of 1968, amended edition of 1975',
    year: 1976,
    published: 'Metrologia 12, 7',
  },
  'Preston-Thomas 1990': {
    authors: 'Preston-Thomas, H.',
    title: 'The International Temperature Scale of 1990',
    year: 1990,
    published: 'Metrologia 27, 3',
    doi: '10.1088/0026-1394/27/1/002',
  },
  'Ambrose & Walton 1989': {
    authors: 'Ambrose, D.; Walton, J.',
    title: 'Vapour pressures up to their critical temperatures of normal alkanes and 1-alkanols',
    year: 1989,
    published: 'Pure Appl. Chem. 61, 1395',
    doi: '10.1351/pac198961081395',
  },
  'Fray & Schmitt 2009': {
    authors: 'Fray, N.; Schmitt, B.',
    title: 'Sublimation of ices of astrophysical interest: a bibliographic review',
    year: 2009,
    published: 'Planet. Space Sci. 57, 2053',
    doi: '10.1016/j.pss.2009.09.011',
  },
  'Giauque & Johnston 1929': {
    authors: 'Giauque, W. F.; Johnston, H. L.',
    title: 'The heat capacity of oxygen from 12 K to its boiling point and its heat of vaporization',
    year: 1929,
    published: 'J. Am. Chem. Soc. 51, 2300',
  },
  'Clusius & Riccoboni 1937': {
    authors: 'Clusius, K.; Riccoboni, L.',
    title: 'Atomwärmen, Schmelz- und Verdampfungswärme sowie Entropie des Xenons',
    year: 1937,
    published: 'Z. phys. Chem. B 38, 81',
  },
  'CRC 2014': {
    authors: 'Haynes, W. M. (ed.)',
    title: 'CRC Handbook of Chemistry and Physics, 95th ed.',
    year: 2014,
    published: 'CRC Press',
  },
  'Tsonopoulos 1974': {
    authors: 'Tsonopoulos, C.',
    title: 'An empirical correlation of second virial coefficients',
    year: 1974,
    published: 'AIChE J. 20, 263',
    doi: '10.1002/aic.690200209',
  },
  'Gunn 1966': {
    authors: 'Gunn, R. D.; Chueh, P. L.; Prausnitz, J. M.',
    title: 'Prediction of thermodynamic properties of dense gas mixtures containing one or more of the quantum gases',
    year: 1966,
    published: 'AIChE J. 12, 937',
    doi: '10.1002/aic.690120519',
  },
  'Chueh & Prausnitz 1967': {
    authors: 'Chueh, P. L.; Prausnitz, J. M.',
    title:
      'Vapor-liquid equilibria at high pressures. Vapor-phase fugacity coefficients in nonpolar and quantum-gas mixtures',
    year: 1967,
    published: 'Ind. Eng. Chem. Fundam. 6, 492',
    doi: '10.1021/i160024a003',
  },
  'Harvey & Lemmon 2004': {
    authors: 'Harvey, A. H.; Lemmon, E. W.',
    title: 'Correlation for the second virial coefficient of water',
    year: 2004,
    published: 'J. Phys. Chem. Ref. Data 33, 369',
    doi: '10.1063/1.1587731',
  },
  'Chase 1998': {
    authors: 'Chase, M. W.',
    title: 'NIST-JANAF thermochemical tables, 4th ed.',
    year: 1998,
    published: 'J. Phys. Chem. Ref. Data, Monograph 9',
  },
  'Laubengayer 1941': {
    authors: 'Laubengayer, A. W.; Gilliam, W. F.',
    title:
      'The alkyls of the third group elements. I. Vapor phase studies of the alkyls of aluminum, gallium and indium',
    year: 1941,
    published: 'J. Am. Chem. Soc. 63, 477',
    doi: '10.1021/ja01847a031',
  },
  'Muckenfuss & Curtiss 1958': {
    authors: 'Muckenfuss, C.; Curtiss, C. F.',
    title: 'Thermal conductivity of multicomponent gas mixtures',
    year: 1958,
    published: 'J. Chem. Phys. 29, 1273',
    doi: '10.1063/1.1744707',
  },
  'Hirschfelder 1957': {
    authors: 'Hirschfelder, J. O.',
    title: 'Heat conductivity in polyatomic or electronically excited gases. II',
    year: 1957,
    published: 'J. Chem. Phys. 26, 282',
    doi: '10.1063/1.1743285',
  },
  'Fuller 1966': {
    authors: 'Fuller, E. N.; Schettler, P. D.; Giddings, J. C.',
    title: 'New method for prediction of binary gas-phase diffusion coefficients',
    year: 1966,
    published: 'Ind. Eng. Chem. 58, 18',
    doi: '10.1021/ie50677a007',
  },
  'CLP 2008': {
    authors: 'European Parliament and Council',
    title: 'Regulation (EC) No 1272/2008 on classification, labelling and packaging of substances and mixtures',
    year: 2008,
    published: 'Annex VI, table 3',
  },
  'OSHA HCS 2012': {
    authors: 'Occupational Safety and Health Administration',
    title: 'Hazard Communication Standard',
    year: 2012,
    published: '29 CFR 1910.1200',
  },
  'Chung 1988': {
    authors: 'Chung, T. H.; Ajlan, M.; Lee, L. L.; Starling, K. E.',
    title: 'Generalized multiparameter correlation for nonpolar and polar fluid transport properties',
    year: 1988,
    published: 'Ind. Eng. Chem. Res. 27, 671',
    doi: '10.1021/ie00076a024',
  },
  'ECHA inventory': {
    authors: 'European Chemicals Agency',
    title: 'Classification and Labelling Inventory: classifications notified by industry',
    year: 2023,
    published: 'ECHA',
  },
  'Monchick & Mason 1961': {
    authors: 'Monchick, L.; Mason, E. A.',
    title: 'Transport properties of polar gases',
    year: 1961,
    published: 'J. Chem. Phys. 35, 1676',
    doi: '10.1063/1.1732130',
  },
  'Brokaw 1969': {
    authors: 'Brokaw, R. S.',
    title: 'Predicting transport properties of dilute gases',
    year: 1969,
    published: 'Ind. Eng. Chem. Process Des. Dev. 8, 240',
    doi: '10.1021/i260030a015',
  },
  'Reid 1987': {
    authors: 'Reid, R. C.; Prausnitz, J. M.; Poling, B. E.',
    title: 'The Properties of Gases and Liquids, 4th ed.',
    year: 1987,
    published: 'McGraw-Hill',
  },
  'Dean 1999': {
    authors: 'Dean, J. A. (ed.)',
    title: 'Lange’s Handbook of Chemistry, 15th ed.',
    year: 1999,
    published: 'McGraw-Hill',
  },
  'Stull 1947': {
    authors: 'Stull, D. R.',
    title: 'Vapor pressure of pure substances. Organic and inorganic compounds',
    year: 1947,
    published: 'Ind. Eng. Chem. 39, 517',
    doi: '10.1021/ie50448a022',
  },
  'Huber 2006': {
    authors: 'Huber, M. L.; Laesecke, A.; Friend, D. G.',
    title: 'Correlation for the vapor pressure of mercury',
    year: 2006,
    published: 'Ind. Eng. Chem. Res. 45, 7351',
    doi: '10.1021/ie060560s',
  },
  'Harvey & Lemmon 2002': {
    authors: 'Harvey, A. H.; Lemmon, E. W.',
    title: 'Correlation for the vapor pressure of heavy water from the triple point to the critical point',
    year: 2002,
    published: 'J. Phys. Chem. Ref. Data 31, 173',
    doi: '10.1063/1.1430231',
  },
  'IAPWS R17-20': {
    authors: 'International Association for the Properties of Water and Steam',
    title: 'Release on the IAPWS Formulation 2020 for the Viscosity of Heavy Water',
    year: 2020,
    published: 'IAPWS R17-20',
  },
  'Shakhov 1968': {
    authors: 'Shakhov, E. M.',
    title: 'Generalization of the Krook kinetic relaxation equation',
    year: 1968,
    published: 'Fluid Dyn. 3(5), 95',
    doi: '10.1007/BF01029546',
  },
  'Sharipov & Seleznev 1998': {
    authors: 'Sharipov, F.; Seleznev, V.',
    title: 'Data on internal rarefied gas flows',
    year: 1998,
    published: 'J. Phys. Chem. Ref. Data 27, 657',
    doi: '10.1063/1.556019',
  },
  'Dagan 1982': {
    authors: 'Dagan, Z.; Weinbaum, S.; Pfeffer, R.',
    title: 'An infinite-series solution for the creeping motion through an orifice of finite length',
    year: 1982,
    published: 'J. Fluid Mech. 115, 505',
    doi: '10.1017/S0022112082000883',
  },
  'Hasimoto 1958': {
    authors: 'Hasimoto, H.',
    title: 'On the flow of a viscous fluid past a thin screen at small Reynolds numbers',
    year: 1958,
    published: 'J. Phys. Soc. Jpn. 13, 633',
    doi: '10.1143/JPSJ.13.633',
  },
  'Allen & Raabe 1985': {
    authors: 'Allen, M. D.; Raabe, O. G.',
    title: 'Slip correction measurements of spherical solid aerosol particles in an improved Millikan apparatus',
    year: 1985,
    published: 'Aerosol Sci. Technol. 4, 269',
    doi: '10.1080/02786828508959055',
  },
  'Clausing 1932': {
    authors: 'Clausing, P.',
    title: 'Über die Strömung sehr verdünnter Gase durch Röhren von beliebiger Länge',
    year: 1932,
    published: 'Ann. Phys. (Leipzig) 12, 961',
    doi: '10.1002/andp.19324040804',
  },
  'Cole 1977': {
    authors: 'Cole, R. J.',
    title: 'Complementary variational principles for Knudsen flow rates',
    year: 1977,
    published: 'J. Inst. Math. Appl. 20, 107',
    doi: '10.1093/imamat/20.1.107',
  },
  'Cole 1979': {
    authors: 'Cole, R. J.',
    title: 'Complementary variational principles for free molecular channel flow',
    year: 1979,
    published: 'Proc. R. Soc. Edinburgh A 82, 211',
  },
  'Davis 1960': {
    authors: 'Davis, D. H.',
    title: 'Monte Carlo calculation of molecular flow rates through a cylindrical elbow and pipes of other shapes',
    year: 1960,
    published: 'J. Appl. Phys. 31, 1169',
    doi: '10.1063/1.1735797',
  },
  'Oatley 1957': {
    authors: 'Oatley, C. W.',
    title: 'The flow of gas through composite systems at very low pressures',
    year: 1957,
    published: 'Br. J. Appl. Phys. 8, 15',
  },
  'Füstöss & Tóth 1972': {
    authors: 'Füstöss, L.; Tóth, G.',
    title: 'The problem of the compounding of transmission probabilities for composite systems',
    year: 1972,
    published: 'J. Vac. Sci. Technol. 9, 1214',
  },
  'Mason & Malinauskas 1983': {
    authors: 'Mason, E. A.; Malinauskas, A. P.',
    title: 'Gas Transport in Porous Media: The Dusty-Gas Model',
    year: 1983,
    published: 'Elsevier',
  },
  'Knudsen 1911': {
    authors: 'Knudsen, M.',
    title: 'Die molekulare Wärmeleitung der Gase und der Akkommodationskoeffizient',
    year: 1911,
    published: 'Ann. Phys. 339, 593',
    doi: '10.1002/andp.19113390402',
  },
  'Welander 1954': {
    authors: 'Welander, P.',
    title: 'On the temperature jump in a rarefied gas',
    year: 1954,
    published: 'Ark. Fys. 7, 507',
  },
  'Barichello & Siewert 2000': {
    authors: 'Barichello, L. B.; Siewert, C. E.',
    title: 'The temperature-jump problem in rarefied-gas dynamics',
    year: 2000,
    published: 'Eur. J. Appl. Math. 11, 353',
  },
  'Bassanini 1967': {
    authors: 'Bassanini, P.; Cercignani, C.; Pagani, C. D.',
    title: 'Comparison of kinetic theory analyses of linearized heat transfer between parallel plates',
    year: 1967,
    published: 'Int. J. Heat Mass Transfer 10, 447',
  },
} as const satisfies Record<string, Source>;
