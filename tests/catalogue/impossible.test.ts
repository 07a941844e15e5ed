import { expect, test } from 'vitest'
import { CARTRIDGES } from '@/content/catalogue/cartridges/all'
import { EMBER_3 } from '@/content/catalogue/preamps/ember-3'
import { TARN_2 } from '@/content/catalogue/preamps/tarn-2'
import { CartridgeEntry, LeadEntry } from '@/lib/catalogue/schema'
import { PreampEntry, type BoardEntry } from '@/lib/catalogue/schema-preamp'

/** A copy that shares nothing, unlike the content, whose boards share what they have in common. */
const copyOf = (entry: PreampEntry): PreampEntry => PreampEntry.parse(JSON.parse(JSON.stringify(entry)))

/** The Tarn 2 with its second board changed. */
function tarn(change: (board: BoardEntry) => void): unknown {
  const entry = copyOf(TARN_2)
  change(entry.boards[1])
  return entry
}

const sentences = (entry: unknown) =>
  (PreampEntry.safeParse(entry).error?.issues ?? []).map(({ path, message }) => `${path.join('.')}: ${message}`)

test('the unchanged preamp is accepted', () => {
  expect(sentences(tarn(() => undefined))).toEqual([])
})

test('an output limit that differs between gains, with the value that would fit', () => {
  const wrong = tarn(({ gains }) => {
    gains[2].overload[0].millivolts = { low: 79, nominal: 79, high: 79, origin: 'printed' }
  })
  expect(sentences(wrong)).toEqual([
    'boards.1.gains.2.overload: That is more than the output limit, 7.9 V RMS, allows. Did you mean 7.9 mV?',
  ])
  const low = tarn(({ gains }) => {
    gains[0].overload[0].millivolts = { low: 60, nominal: 60, high: 60, origin: 'printed' }
  })
  expect(sentences(low)).toEqual([
    'boards.1.gains.0.overload: The output limit, 7.9 V RMS, is the same at every gain. Did you mean 125 mV?',
  ])
})

test('ids that come twice', () => {
  expect(sentences(tarn((board) => (board.groups[1].id = 'gain')))).toContain('boards.1.groups: "gain" is there twice.')
  expect(sentences(tarn((board) => (board.gains[1].id = '36')))).toContain('boards.1.gains: "36" is there twice.')
  expect(sentences(tarn((board) => (board.id = 'first')))).toContain('boards: Two boards are called "first".')
})

test('groups with members, controls, gains and options that are not there', () => {
  expect(sentences(tarn((board) => (board.groups[3].members = [9])))).toContain('boards.1.groups.3: "Switches" has no member 9.')
  expect(sentences(tarn((board) => (board.groups[3].control = 'knob')))).toContain('boards.1.groups.3: There is no control "knob".')
  expect(sentences(tarn((board) => (board.groups[3].members = [7])))).toContain('boards.1.groups: Two groups use bank 7.')
  const noGain = tarn(({ groups }) => {
    if (groups[0].sets === 'gain') groups[0].options['11'] = { gainId: '72' }
  })
  expect(sentences(noGain)).toContain('boards.1.groups.0: There is no gain "72".')
  const noOption = tarn(({ groups }) => {
    if (groups[0].sets === 'gain') delete groups[0].options['11']
  })
  expect(sentences(noOption)).toContain('boards.1.groups.0: Nothing is said for "Switches" at "11".')
  const tooFew = tarn(({ groups }) => {
    if (groups[1].how === 'parallel') groups[1].resistorsOhms.pop()
  })
  expect(sentences(tooFew)).toContain('boards.1.groups.1: Give one value for each member.')
})

test('a group that waits for a choice that does not exist', () => {
  const entry = copyOf(EMBER_3)
  entry.boards[0].groups[1].onlyWhen = { group: 'input', options: ['dc'] }
  expect(sentences(entry)).toContain('boards.0.groups.1: "Input" has no "dc".')
})

test('exclusions outside the bank, of a switch with itself, and against the delivered state', () => {
  expect(sentences(tarn((board) => (board.exclusions[0].members = [3, 9])))).toContain('boards.1.exclusions.0: "Switches" has 8 members only.')
  expect(sentences(tarn((board) => (board.exclusions[0].members = [3, 3])))).toContain('boards.1.exclusions.0: A switch cannot exclude itself.')
  expect(sentences(tarn((board) => (board.exclusions[0].control = 'knob')))).toContain('boards.1.exclusions.0: "knob" has no numbered members.')
  expect(sentences(tarn((board) => (board.asDelivered = { bank: '00110000' })))).toContain('boards.1.asDelivered.bank: 3 and 4 cannot both be ON.')
})

test('a delivered state that the control cannot have', () => {
  expect(sentences(tarn((board) => (board.asDelivered = {})))).toContain('boards.1.asDelivered: How "Switches" is delivered is not said.')
  expect(sentences(tarn((board) => (board.asDelivered = { bank: '000' })))).toContain('boards.1.asDelivered.bank: "Switches" cannot stand at "000".')
})

test('serial ranges that overlap or run backwards', () => {
  expect(sentences(tarn((board) => (board.serials.from = 18_000)))).toContain('boards.1.serials: These serials overlap board "first".')
  expect(sentences(tarn((board) => (board.serials = { from: 30_000, to: 20_000 })))).toContain(
    'boards.1.serials: The second serial is lower than the first.',
  )
})

test('figures below zero, out of order, or of nothing', () => {
  const figure = (low: number, nominal: number, high: number) => ({ low, nominal, high, origin: 'printed' as const })
  expect(sentences(tarn((board) => (board.outputOhms = figure(-1, 0, 1)))).join()).toContain('This cannot be below zero.')
  expect(sentences(tarn((board) => (board.outputOhms = figure(120, 100, 110)))).join()).toContain('must not fall')
  expect(sentences(tarn((board) => (board.maximumOutputVolts = figure(0, 7.9, 8)))).join()).toContain('always above zero')
})

test('a leaflet line without a number, backwards, or under an unknown name', () => {
  const [wren] = CARTRIDGES
  const refuses = (change: object) => CartridgeEntry.safeParse({ ...wren, ...change }).error?.issues[0].message
  expect(refuses({})).toBeUndefined()
  expect(refuses({ coilOhms: { ...wren.coilOhms, low: null, nominal: null, high: null } })).toBe('Give the lower end, the upper end, or both.')
  expect(refuses({ coilOhms: { ...wren.coilOhms, low: 800, nominal: null, high: 700 } })).toBe('The second value is lower than the first.')
  expect(refuses({ outputVolts: 5 })).toBeDefined()
  expect(refuses({ id: 'Calloway Wren' })).toBe('An id is small letters, digits and single hyphens.')
})

test('a lead whose whole capacitance belongs to two lengths', () => {
  const whole = { low: 110, nominal: 110, high: 110, origin: 'printed' }
  const lead = { id: 'x', maker: 'X', name: 'X', use: 'either', picofaradsPerMetre: null, picofaradsWhole: whole, notes: [] }
  expect(LeadEntry.safeParse({ ...lead, lengthsMetres: [1] }).success).toBe(true)
  expect(LeadEntry.safeParse({ ...lead, lengthsMetres: [1, 2] }).success).toBe(false)
  expect(LeadEntry.safeParse({ ...lead, picofaradsPerMetre: whole, lengthsMetres: [1] }).success).toBe(false)
})
