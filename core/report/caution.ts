/** Stands on every exported result, in About and in README. */
export const CAUTION =
  'An estimate to choose laboratory trials by, from models with stated limits. Storage tests decide about shelf-life ' +
  'promises; safety data sheets, local codes and qualified staff decide about handling solvents and fine powders.';
