/** A publication, or an honest statement that none has been traced. */
export interface Source {
  readonly key: string;
  readonly citation: string;
}

/** Every source that a number in core/ or test/published/ refers to, once, in alphabetical order of the key. */
export const sources: readonly Source[] = [
  {
    key: 'Akerlof1932',
    citation:
      'Åkerlöf, Dielectric constants of some organic solvent–water mixtures at various temperatures, J. Am. Chem. Soc. 54 (1932) 4125.',
  },
  {
    key: 'AtomicWeights',
    citation: 'Prohaska et al., Standard atomic weights of the elements 2021, Pure Appl. Chem. 94 (2022) 573.',
  },
  {
    key: 'Beadie2015',
    citation:
      'Beadie, Brindza, Flynn, Rosenberg & Shirk, Refractive index measurements of poly(methyl methacrylate), Appl. Opt. 54 (2015) F139.',
  },
  {
    key: 'Bergstrom1997',
    citation: 'Bergström, Hamaker constants of inorganic materials, Adv. Colloid Interface Sci. 70 (1997) 125.',
  },
  {
    key: 'Bergstrom1999',
    citation:
      'Bergström, Stemme, Dahlfors, Arwin & Ödberg, Spectroscopic ellipsometry characterisation of cellulose, Cellulose 6 (1999) 1.',
  },
  {
    key: 'Bond1965',
    citation: 'Bond, Measurement of the refractive indices of several crystals, J. Appl. Phys. 36 (1965) 1674.',
  },
  {
    key: 'CRC2014',
    citation:
      'Haynes (ed.), CRC Handbook of Chemistry and Physics, 95th edition, CRC Press 2014; tables of liquids as carried in the open data files of the chemicals library, version 1.5.2.',
  },
  {
    key: 'ChemicalsTables',
    citation:
      'Bell and contributors, chemicals, version 1.5.2, open data files: Perry 8th ed., VDI Heat Atlas 2nd ed., Viswanath & Natarajan 1989, Dutt & Prasad, CCCBDB and others.',
  },
  {
    key: 'ClassDefault',
    citation:
      'Estimate of this project: strength from the refractive index of the material, ultraviolet frequency typical of its chemical class.',
  },
  {
    key: 'Daimon2007',
    citation: 'Daimon & Masumura, Measurement of the refractive index of distilled water, Appl. Opt. 46 (2007) 3811.',
  },
  {
    key: 'DeVore1951',
    citation: 'DeVore, Refractive indices of rutile and sphalerite, J. Opt. Soc. Am. 41 (1951) 416.',
  },
  {
    key: 'Din38409',
    citation: 'DIN 38409-6, German standard methods for the examination of water: hardness of water, 1986.',
  },
  { key: 'DjurisicLi1999', citation: 'Djurišić & Li, Optical properties of graphite, J. Appl. Phys. 85 (1999) 7404.' },
  {
    key: 'Faure2011',
    citation:
      'Faure, Salazar-Alvarez & Bergström, Hamaker constants of iron oxide nanoparticles, Langmuir 27 (2011) 8659.',
  },
  {
    key: 'Franta2016',
    citation:
      'Franta, Nečas, Ohlídal & Giglia, Optical characterization of SiO2 thin films using universal dispersion model over wide spectral range, Proc. SPIE 9890 (2016) 989014.',
  },
  {
    key: 'Ghosh1999',
    citation: 'Ghosh, Dispersion-equation coefficients for calcite and quartz crystals, Opt. Commun. 163 (1999) 95.',
  },
  {
    key: 'Hagemann1975',
    citation:
      'Hagemann, Gudat & Kunz, Optical constants from the far infrared to the x-ray region, J. Opt. Soc. Am. 65 (1975) 742.',
  },
  { key: 'HandbookFigure', citation: 'General handbook value, recalled; edition and table not yet traced.' },
  {
    key: 'Harned1958',
    citation: 'Harned & Owen, The Physical Chemistry of Electrolytic Solutions, 3rd edition, Reinhold 1958.',
  },
  {
    key: 'HoughWhite1980',
    citation:
      'Hough & White, The calculation of Hamaker constants from Lifshitz theory, Adv. Colloid Interface Sci. 14 (1980) 3.',
  },
  {
    key: 'Israelachvili2011',
    citation: 'Israelachvili, Intermolecular and Surface Forces, 3rd edition, Academic Press 2011.',
  },
  {
    key: 'Kell1975',
    citation:
      'Kell, Density, thermal expansivity, and compressibility of liquid water from 0 to 150 °C, J. Chem. Eng. Data 20 (1975) 97.',
  },
  {
    key: 'KerlVarchmin1995',
    citation: 'Kerl & Varchmin, Refractive index dispersion of some liquids, J. Mol. Struct. 349 (1995) 257.',
  },
  {
    key: 'Kestin1978',
    citation:
      'Kestin, Sokolov & Wakeham, Viscosity of liquid water in the range −8 °C to 150 °C, J. Phys. Chem. Ref. Data 7 (1978) 941.',
  },
  {
    key: 'Kozma2005',
    citation:
      'Kozma, Krok & Riedle, Direct measurement of the group-velocity mismatch and derivation of the refractive-index dispersion, J. Opt. Soc. Am. B 22 (2005) 1479.',
  },
  {
    key: 'Li2022',
    citation:
      'Li, Wang, Ma & Liu, Ellipsometry-transmission measurement of the complex refractive indices for a series of organic solvents, Infrared Phys. Technol. 125 (2022) 104313.',
  },
  {
    key: 'Malitson1965',
    citation:
      'Malitson, Interspecimen comparison of the refractive index of fused silica, J. Opt. Soc. Am. 55 (1965) 1205.',
  },
  {
    key: 'MalitsonDodge1972',
    citation:
      'Malitson & Dodge, Refractive index and birefringence of synthetic sapphire, J. Opt. Soc. Am. 62 (1972) 1405.',
  },
  {
    key: 'MalmbergMaryott1956',
    citation:
      'Malmberg & Maryott, Dielectric constant of water from 0 to 100 °C, J. Res. Natl. Bur. Stand. 56 (1956) 1.',
  },
  { key: 'MartellSmith1976', citation: 'Martell & Smith, Critical Stability Constants, volumes 3 and 4, Plenum 1976.' },
  {
    key: 'Moutzouris2014',
    citation:
      'Moutzouris, Papamichael, Betsis, Stavrakas, Hloupis & Triantis, Refractive, dispersive and thermo-optic properties of twelve organic solvents, Appl. Phys. B 116 (2014) 617.',
  },
  { key: 'NistWebBook', citation: 'NIST Chemistry WebBook, Standard Reference Database 69.' },
  {
    key: 'ParsegianWeiss1981',
    citation:
      'Parsegian & Weiss, Spectroscopic parameters for computation of van der Waals forces, J. Colloid Interface Sci. 81 (1981) 285.',
  },
  {
    key: 'Philipp1973',
    citation: 'Philipp, Optical properties of silicon nitride, J. Electrochem. Soc. 120 (1973) 295.',
  },
  {
    key: 'Rheims1997',
    citation:
      'Rheims, Köser & Wriedt, Refractive-index measurements in the near-IR using an Abbe refractometer, Meas. Sci. Technol. 8 (1997) 601.',
  },
  { key: 'Riddick1986', citation: 'Riddick, Bunger & Sakano, Organic Solvents, 4th edition, Wiley 1986.' },
  {
    key: 'RodriguezDeMarcosAlumina',
    citation:
      'Rodríguez de Marcos et al., Self-consistent optical properties of PEALD-Al2O3 thin films, Opt. Mater. Express, doi 10.1364/OME.562660.',
  },
  {
    key: 'Segelstein1981',
    citation:
      'Segelstein, The complex refractive index of water, M.S. thesis, University of Missouri, Kansas City 1981.',
  },
  {
    key: 'StephensMalitson1952',
    citation: 'Stephens & Malitson, Index of refraction of magnesium oxide, J. Res. Natl. Bur. Stand. 49 (1952) 249.',
  },
  {
    key: 'Sultanova2009',
    citation:
      'Sultanova, Kasarova & Nikolov, Dispersion properties of optical polymers, Acta Phys. Pol. A 116 (2009) 585.',
  },
  {
    key: 'SynowickiTiwald2004',
    citation:
      'Synowicki & Tiwald, Optical properties of bulk c-ZrO2, c-MgO and a-As2S3 determined by variable angle spectroscopic ellipsometry, Thin Solid Films 455 (2004) 248.',
  },
  { key: 'TradeFigure', citation: 'Range usual in suppliers’ data sheets, recalled; no single document behind it.' },
  {
    key: 'Wang2013',
    citation:
      'Wang, Zhan, Xu, Wu & Zhuo, Sellmeier equations for 4H-SiC and 6H-SiC, Laser Photonics Rev. 7 (2013) 831.',
  },
  {
    key: 'Wemple1968',
    citation:
      'Wemple, Didomenico & Camlibel, Dielectric and optical properties of melt-grown BaTiO3, J. Phys. Chem. Solids 29 (1968) 1797.',
  },
  {
    key: 'YoungFrederikse1973',
    citation:
      'Young & Frederikse, Compilation of the static dielectric constant of inorganic solids, J. Phys. Chem. Ref. Data 2 (1973) 313.',
  },
  {
    key: 'Zhang2020',
    citation:
      'Zhang, Qiu, Li, Zhao & Liu, Complex refractive indices measurements of polymers in visible and near-infrared bands, Appl. Opt. 59 (2020) 2337.',
  },
  {
    key: 'Zhao2010',
    citation:
      'Zhao, Ng, Hanson, Dong, Corti & Franses, Hamaker constant of copper phthalocyanine, J. Chem. Theory Comput. 6 (2010) 491.',
  },
];
