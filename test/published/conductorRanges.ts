/**
 * Ranges of compilations, all from memory: silver across vacuum and gold across water after Israelachvili,
 * Intermolecular and Surface Forces, 3rd ed. 2011, chapter 13; graphite after Visser, Adv. Colloid Interface Sci.
 * 3 (1972) 331, and Bergström (1997).
 */
/** In zJ. */
export const ranges = {
  rows: [
    { first: 'silver', medium: 'vacuum', second: 'silver', low_zJ: 380, high_zJ: 500 },
    { first: 'gold', medium: 'water', second: 'gold', low_zJ: 250, high_zJ: 400 },
    { first: 'graphite', medium: 'vacuum', second: 'graphite', low_zJ: 230, high_zJ: 470 },
  ],
} as const;
