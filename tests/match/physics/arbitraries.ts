import fc from 'fast-check'

/** A number from low to high, evenly in the logarithm: quantities here span decades. */
export function logarithmic(low: number, high: number): fc.Arbitrary<number> {
  return fc.double({ min: Math.log(low), max: Math.log(high), noNaN: true }).map(Math.exp)
}

/** Ordinary values, and the ends at which a part is missing. */
const orZero = (arbitrary: fc.Arbitrary<number>) => fc.oneof({ weight: 8, arbitrary }, { weight: 1, arbitrary: fc.constant(0) })
const orInfinity = (arbitrary: fc.Arbitrary<number>) => fc.oneof({ weight: 8, arbitrary }, { weight: 1, arbitrary: fc.constant(Infinity) })

export const hertz = logarithmic(1, 100_000)

/** Coils and loads with every part present. */
export const wholeLoading = fc.record({
  coilOhms: logarithmic(0.5, 5000),
  coilHenries: logarithmic(1e-6, 2),
  loadOhms: logarithmic(10, 1e6),
  loadFarads: logarithmic(1e-12, 1e-7),
})

/** Coils and loads of which any part may be missing, short of a circuit that nothing damps. */
export const anyLoading = fc
  .record({
    coilOhms: orZero(logarithmic(0.1, 10_000)),
    coilHenries: orZero(logarithmic(1e-7, 3)),
    loadOhms: orInfinity(logarithmic(1, 1e7)),
    loadFarads: orZero(logarithmic(1e-13, 1e-6)),
  })
  .filter(({ coilOhms, loadOhms }) => coilOhms > 0 || loadOhms < Infinity)

export const stepUp = fc.record({
  coilOhms: logarithmic(1, 100),
  coilHenries: logarithmic(1e-6, 1e-4),
  loadOhms: logarithmic(1000, 200_000),
  loadFarads: orZero(logarithmic(1e-11, 1e-9)),
  turnsRatio: logarithmic(2, 50),
  primaryOhms: orZero(logarithmic(0.1, 20)),
  secondaryOhms: orZero(logarithmic(10, 3000)),
  primaryHenries: fc.oneof(fc.constant(null), logarithmic(0.05, 20)),
})
