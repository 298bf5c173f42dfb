/**
 * Provenance of the tables that many materials were read from, so that an entry names its row by its own CAS number
 * or name. Entries read elsewhere state their source in full.
 */
import type { Provenance } from './provenance';

const row = 'row of this substance';

export const crcPermittivity: Provenance = {
  source: 'CRC2014',
  where: `permittivity of liquids, ${row}, columns A–D, Tmin, Tmax`,
  read: 'transcription',
};

export const crcIndex: Provenance = {
  source: 'CRC2014',
  where: `physical constants of organic compounds, ${row}, refractive index`,
  read: 'transcription',
};

/** The open tables keep the citation of each row; it was not carried over. */
export const tableDensity: Provenance = {
  source: 'ChemicalsTables',
  where: `liquid density correlations, ${row}, evaluated at 298.15 K`,
  read: 'transcription',
};

export const tableViscosity: Provenance = {
  source: 'ChemicalsTables',
  where: `liquid viscosity correlations, ${row}, evaluated at 298.15 K`,
  read: 'transcription',
};

export const tableDipole: Provenance = {
  source: 'ChemicalsTables',
  where: `dipole moments, ${row}`,
  read: 'transcription',
};

export const tableMolarMass: Provenance = {
  source: 'ChemicalsTables',
  where: `molar masses from standard atomic weights, ${row}`,
  read: 'transcription',
};

export const formulaMass: Provenance = {
  source: 'AtomicWeights',
  where: 'formula mass; for polymers that of the repeat unit',
  read: 'memory',
};

export const lorentzLorenz: Provenance = {
  source: 'Israelachvili2011',
  where: 'Lorentz–Lorenz relation applied to refractive index, density and molar mass of this entry',
  read: 'derived',
};

export const textbookPolarizability: Provenance = {
  source: 'Israelachvili2011',
  where: `table of electronic polarizabilities, ${row}; also CRC handbook`,
  read: 'memory',
};

export const webBookIonization: Provenance = {
  source: 'NistWebBook',
  where: `ionization energy, ${row}`,
  read: 'memory',
};

/** Which of the three compilations each digit stems from is not known. */
export const solidPermittivity: Provenance = {
  source: 'YoungFrederikse1973',
  where: `static permittivity of inorganic solids, ${row}; also CRC handbook and Bergström 1997`,
  read: 'memory',
};

export const handbook: Provenance = {
  source: 'HandbookFigure',
  where: `handbook value, ${row}`,
  read: 'memory',
};

export const tradeFigure: Provenance = {
  source: 'TradeFigure',
  where: 'middle of the range usual in the trade',
  read: 'memory',
};
