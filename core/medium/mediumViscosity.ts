import type { MediumRecipe } from '../scenario/scenario';
import type { Caveat } from '../validity';
import { grunbergNissan } from './grunbergNissan';
import { type MediumShare, mediumShares } from './mediumShares';
import { componentDensity, componentViscosity, type Property } from './solventProperties';

/** False when only a measurement can tell the viscosity: no component has one (resins alone). To be asked at the door. */
export function viscosityIsKnown(recipe: MediumRecipe): boolean {
  return (
    recipe.measuredViscosity_mPa_s !== null ||
    mediumShares(recipe).some(({ material }) => material.viscosity_Pa_s !== null && material.molarMass_kg_mol !== null)
  );
}

/**
 * Viscosity of a medium at temperature [Pa s] from its components, by mole fractions, see {@link grunbergNissan}.
 * Resins have no viscosity of their own: the liquid without them is taken, with a caveat.
 * Throws RangeError when no component has a viscosity, see {@link viscosityIsKnown}.
 */
export function mediumViscosity(shares: readonly MediumShare[], temperature_K: number): Property {
  const caveats: Caveat[] = [];
  const liquids: { readonly amount_mol_m3: number; readonly viscosity_Pa_s: number }[] = [];
  const unknown: string[] = [];
  for (const { material, volumeFraction } of shares) {
    const viscosity = componentViscosity(material, temperature_K);
    if (viscosity === null || material.molarMass_kg_mol === null) {
      unknown.push(material.name);
      continue;
    }
    const density_kg_m3 = componentDensity(material, temperature_K).value;
    liquids.push({
      amount_mol_m3: (volumeFraction * density_kg_m3) / material.molarMass_kg_mol.value,
      viscosity_Pa_s: viscosity.value,
    });
    caveats.push(...viscosity.caveats);
  }
  if (liquids.length === 0) throw new RangeError('mediumViscosity: no component of the medium has a viscosity');
  if (unknown.length > 0) {
    caveats.push({
      code: 'viscosity-without-resin',
      message: `The thickening by ${unknown.join(', ')} is not known and not counted: the medium is thicker than the ${liquids.length === 1 ? 'liquid' : 'liquids'} alone. Enter a measured viscosity.`,
    });
  }
  if (liquids.length > 1) {
    const withWater = shares.some(({ material }) => material.id === 'water');
    caveats.push({
      code: 'viscosity-mixing',
      message: withWater
        ? 'The viscosity of the mixture is estimated without interaction: alcohols and glycols in water can be two to three times thicker. Enter a measured value where settling matters.'
        : 'The viscosity of the mixture is estimated without interaction: expect ±30–50 %. Enter a measured value where settling matters.',
    });
  }
  const total_mol_m3 = liquids.reduce((sum, liquid) => sum + liquid.amount_mol_m3, 0);
  const value = grunbergNissan(
    liquids.map(({ amount_mol_m3, viscosity_Pa_s }) => ({
      moleFraction: amount_mol_m3 / total_mol_m3,
      viscosity_Pa_s,
    })),
  );
  return { value, caveats };
}
