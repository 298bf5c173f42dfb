import type { DielectricBody } from './dielectricBody';

/** Between the vibrations and the ultraviolet (λ = 0.94 µm), so that √ε(iξ) is about the optical-limit index. */
const between_rad_s = 2e15;

/**
 * Below this difference of index A is a small difference of large numbers. Covers silica and PMMA in toluene and in
 * esters (up to 0.095) but not silica in water (0.12), where published values agree within a factor of two.
 */
export const nearIndexMatch = 0.1;

/** Index [dimensionless] of a body between its vibrations and its ultraviolet band, √ε at i · 2e15 rad/s. */
export const indexOf = (body: DielectricBody): number => Math.sqrt(body.permittivityAt(between_rad_s));

/** Whether either body all but vanishes optically in the medium. */
export const isNearIndexMatch = (first: DielectricBody, second: DielectricBody, medium: DielectricBody): boolean =>
  [first, second].some((body) => Math.abs(indexOf(body) - indexOf(medium)) < nearIndexMatch);

/** Above this optical-limit index one ultraviolet band no longer stands for the response of a solid in a liquid. */
const twoPointIndexLimit = 1.9;

/** Whether the two-point form is outside its range for either body. */
export const isBeyondTwoPoint = (first: DielectricBody, second: DielectricBody): boolean =>
  [first, second].some(
    ({ opticalLimit }) => opticalLimit !== null && opticalLimit.refractiveIndex > twoPointIndexLimit,
  );
