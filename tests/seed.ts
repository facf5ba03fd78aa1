import fc from 'fast-check'

/** One seed for every run, so that the same commit always gives the same verdict; `SEED=… npm test` explores others. */
export const seed = Number(process.env.SEED ?? 20_261_201)
fc.configureGlobal({ seed })
