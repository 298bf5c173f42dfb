import type { Formulation } from '../scenario/scenario';

/** Where this estimate is blind, for this formulation. General points first, then those that this recipe raises. */
export function notConsidered(formulation: Formulation, solids: number): readonly string[] {
  const blind = [
    'Wetting and milling: the particles are taken as fully wetted single spheres of one size.',
    'Chemistry on the shelf: crystal growth, dissolution, hydrolysis, microbes, loss of volatile bases.',
    'Bridging by polymer at low coverage, depletion by free polymer or micelles, and competition of binder and dispersant for the surface.',
  ];
  const ions = formulation.salts.some(({ concentration_mM }) => concentration_mM > 0);
  if (formulation.hardness_dH > 0) {
    blind.push(
      'Calcium is counted as screening only; it also binds to carboxylate groups and lowers the zeta potential, often by 10 to 20 mV (common practice): enter a zeta measured in hard water.',
    );
  }
  if (ions && formulation.particles.some(({ charge }) => charge !== null)) {
    blind.push('The zeta potential is taken as entered; it moves with salt and pH.');
  }
  if (formulation.particles.some(({ layer }) => layer !== null)) {
    blind.push('Desorption of the dispersant on dilution or heating, and the change of χ with temperature.');
  }
  if (formulation.medium.measuredViscosity_mPa_s !== null) {
    blind.push(
      'The measured viscosity is taken to slow encounters as well as settling. In a network of thickener particles may meet faster than that; each factor of ten asks for 2.3 kT more barrier.',
    );
  }
  if (solids > 0.3) {
    blind.push(
      'Crowding: above about 30 % by volume every particle has many neighbours at once, and pair energies understate both attraction and attempts.',
    );
  }
  return blind;
}
