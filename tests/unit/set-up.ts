import fc from 'fast-check'

// The same cases on every machine; FC_SEED tries others, and a failure prints its seed.
fc.configureGlobal({ seed: Number(process.env.FC_SEED ?? 20_250_506) })
