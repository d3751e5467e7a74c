/** One seed for every property, so that a run can be repeated; SEED=<number> tries another. */
import fc from 'fast-check';

fc.configureGlobal({ seed: Number(process.env['SEED'] ?? 20_261_201) });
