/**
 * Brzinski & Durian, Phys. Rev. Fluids 3 (2018) 124303, abstract (arXiv 1710.09314), read: settling data at low Reynolds
 * number follow (1 − φ)ⁿ on two branches, crossing over at a Péclet number of about 1e8.
 */
export const exponents = {
  brownian: { exponent: 5.6, uncertainty: 0.1 },
  nonBrownian: { exponent: 4.48, uncertainty: 0.04 },
  crossoverPeclet: 1e8,
};
