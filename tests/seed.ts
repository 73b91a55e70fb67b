/**
 * Properties are tried on the same cases in every run, so that a change of the code is the only thing that can change the verdict.
 * `FC_SEED=random npm test` looks for new counterexamples; `FC_SEED=12345` repeats a run that found one.
 */
import fc from "fast-check";

const wanted = process.env.FC_SEED;
if (wanted !== "random") fc.configureGlobal({ seed: wanted === undefined ? 20260 : Number(wanted) });
