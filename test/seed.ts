import fc from "fast-check";

/**
 * One seed for every property, so that the gate says the same of the same code. `FAST_CHECK_SEED=<whole number>` looks
 * elsewhere; a failure prints its own seed either way.
 */
fc.configureGlobal({ seed: Number(process.env.FAST_CHECK_SEED ?? 20261201) });
