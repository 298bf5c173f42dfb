/**
 * Shaw, Introduction to Colloid and Surface Chemistry, 4th ed. 1992, text at eq. 8.18, read: the half-life of rapid
 * coagulation is of the order of 1e11/n₀ seconds, n₀ particles per cm³; and (p. 230) rapid coagulation is measured at
 * about half of Smoluchowski's rate.
 */
export const halfLifeRule = { halfLifeTimesCount_s_per_cm3: 1e11 };
export const measuredEfficiency = 0.5;
