import { describe, expect, test } from 'vitest'
import { CARTRIDGES } from '@/content/catalogue/cartridges/all'
import { CartridgeEntry, type OutputField } from '@/lib/catalogue/schema'
import { LISTED_CARTRIDGE_TYPES } from '@/lib/catalogue/terms'
import { nominalFactor } from '@/lib/match/physics/printed-condition'
import { rangesFor } from './ranges-in-practice'

const count = (match: (entry: CartridgeEntry) => boolean) => CARTRIDGES.filter(match).length
const byName = (maker: string, name: string) => CARTRIDGES.find((entry) => entry.maker === maker && entry.name === name)

/** The printed output brought to 5 cm/s peak lateral, at both ends of what its condition may mean. */
function atReference({ low, high, velocity }: OutputField): [number, number] {
  const factor =
    velocity.form === 'atVelocity'
      ? nominalFactor({
          form: 'atVelocity',
          metresPerSecond: velocity.centimetresPerSecond / 100,
          kind: velocity.kind ?? undefined,
          direction: velocity.direction ?? undefined,
        })
      : nominalFactor({ form: velocity.form })
  // Per velocity, the factor is metres per second and the figure is per centimetre per second.
  const unit = velocity.form === 'perVelocity' ? 100 : 1
  const ends = [low, high].filter((end) => end !== null)
  return [Math.min(...ends) * factor.low * unit, Math.max(...ends) * factor.high * unit]
}

describe('what the demo covers', () => {
  test('every leaflet passes the schema and no id comes twice', () => {
    for (const entry of CARTRIDGES) expect(CartridgeEntry.safeParse(entry).error?.issues, entry.id).toBeUndefined()
    expect(new Set(CARTRIDGES.map(({ id }) => id)).size).toBe(CARTRIDGES.length)
  })

  test('enough of every type', () => {
    expect(CARTRIDGES.length).toBeGreaterThanOrEqual(42)
    for (const type of LISTED_CARTRIDGE_TYPES) expect(count((entry) => entry.type === type), type).toBeGreaterThan(0)
    expect(count(({ type, channels }) => type === 'moving-magnet' && channels === 'stereo')).toBeGreaterThanOrEqual(14)
    expect(count(({ type }) => type === 'moving-iron')).toBeGreaterThanOrEqual(6)
    expect(count(({ type, variety }) => type === 'moving-coil' && variety === 'high-output')).toBeGreaterThanOrEqual(4)
    expect(count(({ type, variety }) => type === 'moving-coil' && variety === 'low-output')).toBeGreaterThanOrEqual(12)
    expect(count(({ pins }) => pins === 'strapped')).toBeGreaterThan(0)
    expect(count(({ pins }) => pins === 'two-pin')).toBeGreaterThan(0)
    expect(count(({ groove }) => groove === 'coarse')).toBeGreaterThan(0)
    expect(count(({ variety }) => variety === 'crystal')).toBeGreaterThan(0)
  })

  test('leaflets leave things out, and put things oddly', () => {
    const { outputs, compliances } = {
      outputs: CARTRIDGES.flatMap(({ outputMillivolts }) => outputMillivolts ?? []),
      compliances: CARTRIDGES.flatMap(({ complianceMicrometresPerMillinewton }) => complianceMicrometresPerMillinewton ?? []),
    }
    expect(outputs.some(({ velocity }) => velocity.form === 'perVelocity')).toBe(true)
    expect(outputs.some(({ velocity }) => velocity.form === 'none')).toBe(true)
    expect(outputs.some(({ velocity }) => velocity.form === 'atVelocity' && velocity.kind === null)).toBe(true)
    expect(outputs.some(({ high }) => high === null)).toBe(true)
    expect(outputs.some(({ low, high, nominal }) => nominal === null && low !== null && high !== null && low < high)).toBe(true)
    expect(count(({ loadOhms }) => loadOhms !== null && loadOhms.high === null)).toBeGreaterThan(0)
    expect(new Set(compliances.map(({ measured }) => measured))).toEqual(new Set(['dynamic10Hz', 'dynamic100Hz', 'static', 'unknown']))
    expect(count(({ inductanceMillihenries }) => inductanceMillihenries === null)).toBeGreaterThan(5)
  })

  test('an impedance never stands in for the resistance of a magnet or an iron', () => {
    for (const entry of CARTRIDGES) if (entry.impedanceOhms) expect(entry.coilOhms, entry.id).toBeNull()
    expect(count(({ impedanceOhms, type }) => impedanceOhms !== null && type === 'moving-magnet')).toBeGreaterThan(0)
  })

  test('the Wren prints no inductance, the No. 3 almost nothing, and the Dunlin is too weak for 40 dB', () => {
    const wren = byName('Calloway', 'Wren')
    expect(wren).toMatchObject({ type: 'moving-magnet', inductanceMillihenries: null })
    expect(wren).toMatchObject({ outputMillivolts: { nominal: 5.4 }, coilOhms: { nominal: 700 }, loadPicofarads: { low: 150, high: 300 } })
    const third = byName('Brightwater', 'No. 3')
    expect(third).toMatchObject({ type: 'moving-coil', outputMillivolts: null, coilOhms: null, loadOhms: null, massGrams: null })
    const dunlin = byName('Saltern', 'Dunlin')?.outputMillivolts?.high ?? NaN
    // 40 dB is a hundredfold; below 80 mV out is outside every band of level in use.
    expect(dunlin * 100).toBeLessThan(80)
  })
})

describe('every figure is usual for its type, or is marked odd', () => {
  test.each(CARTRIDGES.map((entry) => [entry.id, entry] as const))('%s', (_, entry) => {
    const usual = rangesFor(entry)
    const odd = new Set<string>()
    const inside = ([low, high]: [number, number], [from, to]: [number, number]) => low >= from * 0.999 && high <= to * 1.001
    const ends = (field: { low: number | null; high: number | null }): [number, number] => [
      field.low ?? field.high ?? NaN,
      field.high ?? field.low ?? NaN,
    ]
    if (usual) {
      const { outputMillivolts, coilOhms, inductanceMillihenries, loadOhms, loadPicofarads } = entry
      if (outputMillivolts && !inside(atReference(outputMillivolts), usual.outputMillivolts)) odd.add('outputMillivolts')
      if (coilOhms && !inside(ends(coilOhms), usual.coilOhms)) odd.add('coilOhms')
      if (inductanceMillihenries && !inside(ends(inductanceMillihenries), usual.inductanceMillihenries)) odd.add('inductanceMillihenries')
      if (loadOhms && ((loadOhms.low ?? 0) > usual.loadOhms[1] || (loadOhms.high ?? Infinity) < usual.loadOhms[0])) odd.add('loadOhms')
      if (loadPicofarads && usual.loadPicofarads && !inside(ends(loadPicofarads), usual.loadPicofarads)) odd.add('loadPicofarads')
    }
    for (const field of odd) expect(entry.odd, `${field} is unusual and says nothing of it`).toHaveProperty(field)
    for (const field of Object.keys(entry.odd)) expect([...odd], `${field} is marked odd and is usual`).toContain(field)
  })
})
