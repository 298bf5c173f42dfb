import fc from 'fast-check';

/**
 * The same generated cases every time, so that a red run can be repeated and a green one means the same tomorrow.
 * `FC_SEED=random npx vitest run` looks further.
 */
const wanted = process.env.FC_SEED ?? '20261201';
fc.configureGlobal({ seed: wanted === 'random' ? Date.now() : Number(wanted) });
