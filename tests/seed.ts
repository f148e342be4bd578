import fc from 'fast-check'

/**
 * Properties try the same cases each time, so that a red run is red again for whoever looks into it. The long run
 * (`npm run test:long`) draws new ones; a case it finds belongs into a spec of its own.
 */
if (process.env.PROPERTY_SEED !== 'random') fc.configureGlobal({ seed: Number(process.env.PROPERTY_SEED ?? 20261201) })
