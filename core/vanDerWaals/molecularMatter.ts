import { AVOGADRO_per_mol, ELEMENTARY_CHARGE_C, REDUCED_PLANCK_J_s } from '../constants';
import type { Material } from '../materials/material';
import { bodyOf } from './dielectricBody';
import { polarizabilityDensity } from './lorentzLorenz';

/** What pairwise summation needs of one kind of molecule in bulk. */
export interface MolecularMatter {
  readonly name: string;
  /** ρ α: polarizability volume per volume of matter; all that counts of density and molecule. */
  readonly polarizabilityDensity: number;
  /** Ionization energy, or ħω_UV where that is not known. */
  readonly characteristicEnergy_J: number;
  /** Plain words for each datum that had to be replaced. */
  readonly replaced: readonly string[];
}

/** One cubic ångström. */
const A3_m3 = 1e-30;

/** The molecular data of a material, or in words the datum that is missing. */
export function molecularMatter(material: Material): MolecularMatter | string {
  if (material.conductor) return `${material.name} is a conductor: its free charges do not belong to molecules`;
  const replaced: string[] = [];
  const density = densityOfPolarizability(material, replaced);
  if (density === null) return `no polarizability is known for ${material.name}, nor a refractive index to get it from`;
  const energy_J = characteristicEnergy(material, replaced);
  if (energy_J === null) return `the ionization energy of ${material.name} is not known`;
  return { name: material.name, polarizabilityDensity: density, characteristicEnergy_J: energy_J, replaced };
}

function densityOfPolarizability(material: Material, replaced: string[]): number | null {
  const { polarizabilityVolume_A3, molarMass_kg_mol, density_kg_m3 } = material;
  if (polarizabilityVolume_A3 !== null && molarMass_kg_mol !== null) {
    const numberDensity_per_m3 = (density_kg_m3.value * AVOGADRO_per_mol) / molarMass_kg_mol.value;
    return numberDensity_per_m3 * polarizabilityVolume_A3.value * A3_m3;
  }
  const optical = bodyOf(material, 1, 'single-uv').opticalLimit?.refractiveIndex;
  const sodium = material.refractiveIndexIsOpticalLimit ? material.refractiveIndex?.value : undefined;
  const refractiveIndex = optical ?? sodium;
  if (refractiveIndex === undefined) return null;
  replaced.push(`polarizability of ${material.name} from its refractive index`);
  return polarizabilityDensity(refractiveIndex);
}

function characteristicEnergy(material: Material, replaced: string[]): number | null {
  if (material.ionizationEnergy_eV !== null) return material.ionizationEnergy_eV.value * ELEMENTARY_CHARGE_C;
  // A liquid without a measured value stays without: only in a solid is there no molecule to ionize.
  if (material.kind === 'solvent') return null;
  const optical = bodyOf(material, 1, 'single-uv').opticalLimit;
  if (optical === null) return null;
  replaced.push(`energy ħω of the ultraviolet band of ${material.name} for its ionization energy`);
  return REDUCED_PLANCK_J_s * optical.frequency_rad_s;
}
