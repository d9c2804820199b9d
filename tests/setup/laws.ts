import fc from "fast-check";

/** How often `npm run test:deep` tries each law; an ordinary run tries it a hundred times. */
const DEEP_RUNS = 5_000;

// a law that fails prints its seed and path, with which it fails again
if (process.env.BOOKMATCH_DEEP) fc.configureGlobal({ numRuns: DEEP_RUNS });
